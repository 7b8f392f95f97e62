import { readConfig } from './config';
import { makeDataSource } from './data-source';
import { migrateDatabase } from './migrate-database';
import { runEntry } from './run-entry';

runEntry(async () => {
  const config = readConfig(process.env);
  const owner = await makeDataSource(config, 'owner').initialize();
  try {
    await migrateDatabase(owner, config.database.user);
  } finally {
    await owner.destroy();
  }
});
