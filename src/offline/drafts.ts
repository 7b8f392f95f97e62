import type { RecordEntry } from '../../shared/contracts/commands';
import { database } from './database';

export async function draftOf(accountId: string, jobId: string, point: string): Promise<RecordEntry[]> {
  return (await (await database()).get('drafts', [accountId, jobId, point]))?.entries ?? [];
}

/** Puts one answer into the draft, in place of an earlier one for the same field. */
export async function draft(
  accountId: string,
  jobId: string,
  point: string,
  entry: RecordEntry,
): Promise<RecordEntry[]> {
  const write = (await database()).transaction('drafts', 'readwrite', { durability: 'strict' });
  const before = (await write.store.get([accountId, jobId, point]))?.entries ?? [];
  const entries = [...before.filter((one) => one.field !== entry.field), entry];
  await write.store.put({ accountId, jobId, point, entries });
  await write.done;
  return entries;
}

export async function dropDraft(accountId: string, jobId: string, point: string): Promise<void> {
  await (await database()).delete('drafts', [accountId, jobId, point]);
}
