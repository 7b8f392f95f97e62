import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { CachedJob, PointDraft } from './kept';
import type { OutboxEntry } from './outbox-entry';

interface HeadfastDatabase extends DBSchema {
  /** in the order in which they were put: `place` is the key */
  outbox: { key: number; value: OutboxEntry; indexes: { 'by-account': string } };
  /** what the server said of a job, per person */
  jobs: { key: [accountId: string, jobId: string]; value: CachedJob; indexes: { 'by-account': string } };
  /** readings typed for a point that is still shut, per person */
  drafts: { key: [accountId: string, jobId: string, point: string]; value: PointDraft };
}

export type Database = IDBPDatabase<HeadfastDatabase>;

let opened: Promise<Database> | undefined;

/** The device's own database: what is not sent yet, what was read last, what is drafted. Opened once. */
export function database(): Promise<Database> {
  opened ??= openDB<HeadfastDatabase>('headfast', 1, {
    upgrade(db) {
      const outbox = db.createObjectStore('outbox', { keyPath: 'place', autoIncrement: true });
      outbox.createIndex('by-account', 'accountId');
      const jobs = db.createObjectStore('jobs', { keyPath: ['accountId', 'jobId'] });
      jobs.createIndex('by-account', 'accountId');
      db.createObjectStore('drafts', { keyPath: ['accountId', 'jobId', 'point'] });
    },
    terminated: () => (opened = undefined),
  });
  opened.catch(() => (opened = undefined));
  return opened;
}
