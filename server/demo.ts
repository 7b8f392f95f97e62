import { readConfig } from './config';
import { loadDemo } from './demo/load-demo';
import { openDeps } from './open-deps';
import { runEntry } from './run-entry';

runEntry(async () => {
  const config = readConfig(process.env);
  if (!config.demo) return;
  const deps = await openDeps(config);
  try {
    const loaded = await loadDemo(deps);
    if (loaded) process.stdout.write('The demo was loaded.\n');
  } finally {
    await deps.dataSource.destroy();
  }
});
