import type { DataSource } from 'typeorm';
import { appendOnlyTables } from './ledger/append-only-tables';

/** A process that starts waits this long for another that is migrating, in seconds. */
const patienceS = 120;

/** Tables that the application never sees. */
const ownersTables = new Set(['migrations']);

/**
 * Brings the tables up to date and says anew, table by table, what the application's account may do: everything but
 * changing the schema, and on event tables reading and adding only. The triggers stop the owner's hand too; the grants
 * stop TRUNCATE, which passes triggers by. Of two processes that start at once the second waits and finds it done.
 * @param owner a connection of the account that owns the tables
 * @param app name of the application's account
 */
export async function migrateDatabase(owner: DataSource, app: string): Promise<void> {
  const line = owner.createQueryRunner();
  const [{ name }] = (await line.query("SELECT CONCAT(DATABASE(), '.migration') AS name")) as [{ name: string }];
  try {
    const [{ got }] = (await line.query('SELECT GET_LOCK(?, ?) AS got', [name, patienceS])) as [
      { got: number | string },
    ];
    if (Number(got) !== 1) throw new Error('another process is still bringing the tables up to date');
    await migrate(owner, app);
  } finally {
    await line.query('DO RELEASE_LOCK(?)', [name]);
    await line.release();
  }
}

async function migrate(owner: DataSource, app: string): Promise<void> {
  await owner.runMigrations({ transaction: 'each' });
  const tables = await owner.query<{ name: string }[]>(
    "SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_TYPE = 'BASE TABLE'",
  );
  for (const { name } of tables) {
    await revokeAll(owner, name, app);
    if (ownersTables.has(name)) continue;
    const rights = appendOnlyTables.includes(name) ? 'SELECT, INSERT' : 'SELECT, INSERT, UPDATE, DELETE';
    await owner.query(`GRANT ${rights} ON \`${name}\` TO ?@'127.0.0.1'`, [app]);
  }
  for (const name of appendOnlyTables) {
    if (tables.some((table) => table.name === name)) await refuseChanges(owner, name);
  }
}

/** What was granted under an older list is taken back first; that there was nothing is no failure. */
async function revokeAll(owner: DataSource, table: string, app: string): Promise<void> {
  const granted = await owner.query<unknown[]>(
    'SELECT 1 FROM information_schema.TABLE_PRIVILEGES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME = ? AND GRANTEE = ?',
    [table, `'${app}'@'127.0.0.1'`],
  );
  if (granted.length > 0) await owner.query(`REVOKE ALL PRIVILEGES ON \`${table}\` FROM ?@'127.0.0.1'`, [app]);
}

async function refuseChanges(owner: DataSource, table: string): Promise<void> {
  for (const act of ['UPDATE', 'DELETE'] as const) {
    await owner.query(
      `CREATE OR REPLACE TRIGGER ${table}_no_${act.toLowerCase()} BEFORE ${act} ON \`${table}\` FOR EACH ROW
       SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'Events are added, never changed.'`,
    );
  }
}
