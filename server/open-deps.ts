import { v7 } from 'uuid';
import { pino } from 'pino';
import { makeDataSource, openDataSource } from './data-source';
import type { Config } from './config';
import type { AppDeps } from './services/deps';
import { readKeys } from './services/keys';

/** Everything real that the server works with: database, keys, clock, ids, log. */
export async function openDeps(config: Config): Promise<AppDeps> {
  return {
    config,
    keys: readKeys(config.keysDir),
    dataSource: await openDataSource(makeDataSource(config)),
    clock: () => new Date(),
    ids: () => v7(),
    log: pino({ level: config.logLevel, base: null, timestamp: pino.stdTimeFunctions.isoTime }),
  };
}
