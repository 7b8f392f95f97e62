import type { DataSource } from 'typeorm';
import { appendOnlyTables } from './ledger/append-only-tables';

/** Tables that the application never sees. */
const ownersTables = new Set(['migrations']);

/**
 * Brings the tables up to date and says anew, table by table, what the application's account may do: everything but
 * changing the schema, and on event tables reading and adding only. The triggers stop the owner's hand too; the grants
 * stop TRUNCATE, which passes triggers by.
 * @param owner a connection of the account that owns the tables
 * @param app name of the application's account
 */
export async function migrateDatabase(owner: DataSource, app: string): Promise<void> {
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
