import { readConfig } from './config';
import { makeDataSource, openDataSource } from './data-source';
import { runEntry } from './run-entry';
import { rebuildProjections } from './services/rebuild-projections';

runEntry(async () => {
  const dataSource = await openDataSource(makeDataSource(readConfig(process.env)));
  try {
    const jobs = await rebuildProjections(dataSource);
    process.stdout.write(`The lists were made again from the events of ${jobs} jobs.\n`);
  } finally {
    await dataSource.destroy();
  }
});
