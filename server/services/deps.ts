import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';
import type { Config } from '../config';
import type { Keys } from './keys';

/** What every route and use case works with; tests hand in their own clock and ids. */
export interface AppDeps {
  dataSource: DataSource;
  config: Config;
  keys: Keys;
  clock: () => Date;
  /** random ids that sort by time: UUIDv7 */
  ids: () => string;
  log: Logger;
}
