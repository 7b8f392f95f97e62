import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { checkPromises } from '../../server/data-source';
import { appendOnlyTables } from '../../server/ledger/append-only-tables';
import { migrateDatabase } from '../../server/migrate-database';
import { aDatabase } from '../support/test-database';
import type { TestDatabase } from '../support/test-database';

describe('the database', () => {
  let database: TestDatabase;
  beforeAll(async () => {
    database = await aDatabase();
  });
  afterAll(() => database.drop());

  it('has exactly the tables that the entities describe', async () => {
    const { upQueries } = await database.owner.driver.createSchemaBuilder().log();
    expect(upQueries.map((each) => each.query)).toEqual([]);
  });

  it('is migrated again without a change', async () => {
    const done = () =>
      database.owner.query<{ name: string }[]>('SELECT id, timestamp, name FROM migrations ORDER BY id');
    const before = await done();
    expect(before).toHaveLength(database.owner.migrations.length);
    await migrateDatabase(database.owner, database.config.database.user);
    expect(await done()).toEqual(before);
  });

  it('commits to disk, keeps time in UTC and reads what is committed, on every connection', async () => {
    await checkPromises(database.app);
    const levels = await Promise.all(
      Array.from({ length: 8 }, () =>
        database.app.query<{ level: string }[]>('SELECT @@tx_isolation AS level, SLEEP(0.05)'),
      ),
    );
    expect(new Set(levels.flat().map((row) => row.level))).toEqual(new Set(['READ-COMMITTED']));
  });

  it.each(appendOnlyTables)('lets the application add to %s and never change it', async (table) => {
    for (const statement of [`UPDATE ${table} SET seq = 0`, `DELETE FROM ${table}`, `TRUNCATE TABLE ${table}`]) {
      await expect(database.app.query(statement), statement).rejects.toThrow(/command denied/);
    }
    await expect(database.app.query(`SELECT * FROM ${table}`)).resolves.toEqual([]);
    await expect(database.app.query(`DROP TABLE ${table}`)).rejects.toThrow(/command denied/);
  });

  it.each(appendOnlyTables)('stops even the owner from changing a row of %s', async (table) => {
    const triggers = await database.owner.query<{ act: string }[]>(
      'SELECT EVENT_MANIPULATION AS act FROM information_schema.TRIGGERS WHERE TRIGGER_SCHEMA = DATABASE() AND EVENT_OBJECT_TABLE = ?',
      [table],
    );
    expect(triggers.map((each) => each.act).toSorted()).toEqual(['DELETE', 'UPDATE']);
  });

  it('shows the application neither the migrations nor a way to alter anything', async () => {
    await expect(database.app.query('SELECT * FROM migrations')).rejects.toThrow(/command denied/);
    await expect(database.app.query('ALTER TABLE accounts ADD COLUMN x int')).rejects.toThrow(/command denied/);
    await expect(database.app.query('CREATE TABLE x (id int)')).rejects.toThrow(/command denied/);
    await expect(database.app.query('SELECT * FROM mysql.user')).rejects.toThrow(/command denied/);
  });
});
