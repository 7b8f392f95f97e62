import type { WireEvent } from '../api/job';
import { database } from './database';

/** What is kept of a job on this device, so that it opens without a signal; empty when nothing is. */
export async function cachedEvents(accountId: string, jobId: string): Promise<WireEvent[]> {
  const found = await (await database()).get('jobs', [accountId, jobId]);
  return found?.events ?? [];
}

export async function cacheEvents(accountId: string, jobId: string, events: WireEvent[]): Promise<void> {
  await (await database()).put('jobs', { accountId, jobId, events });
}

/** Signing out clears what was read; what is unsent and drafted stays for its owner. */
export async function forgetJobs(accountId: string): Promise<void> {
  const write = (await database()).transaction('jobs', 'readwrite');
  for (const key of await write.store.index('by-account').getAllKeys(accountId)) await write.store.delete(key);
  await write.done;
}
