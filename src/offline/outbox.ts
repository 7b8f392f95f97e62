import { database } from './database';
import { itemId, type EntryRefusal, type OutboxEntry, type OutboxItem } from './outbox-entry';

/** Where entries lie until the server has given its verdict. The sender knows no more of it than this. */
export interface OutboxShelf {
  put(accountId: string, jobId: string, items: readonly OutboxItem[], createdAt: string): Promise<void>;
  /** one person's entries, the oldest first */
  of(accountId: string): Promise<OutboxEntry[]>;
  take(place: number): Promise<void>;
  refuse(place: number, refused: EntryRefusal): Promise<void>;
  /** puts another item in an entry's place, waiting again: the order of the line stays */
  replace(place: number, item: OutboxItem): Promise<void>;
}

/** Strict: the promise resolves when the entry is on the disk, not when the system means to write it. */
const strict = { durability: 'strict' } as const;

/** The shelf in IndexedDB. All items of one call are kept or none is. */
export const outboxShelf: OutboxShelf = {
  async put(accountId, jobId, items, createdAt) {
    const write = (await database()).transaction('outbox', 'readwrite', strict);
    for (const item of items) {
      const entry = { ...item, id: itemId(item), accountId, jobId, createdAt, state: 'waiting', refused: null };
      await write.store.add(entry as OutboxEntry);
    }
    await write.done;
  },

  async of(accountId) {
    const found = await (await database()).getAllFromIndex('outbox', 'by-account', accountId);
    return found.sort((a, b) => a.place - b.place);
  },

  async take(place) {
    const write = (await database()).transaction('outbox', 'readwrite', strict);
    await write.store.delete(place);
    await write.done;
  },

  async refuse(place, refused) {
    await change(place, (entry) => ({ ...entry, state: 'refused', refused }));
  },

  async replace(place, item) {
    await change(
      place,
      (entry) => ({ ...entry, ...item, id: itemId(item), state: 'waiting', refused: null }) as OutboxEntry,
    );
  },
};

async function change(place: number, by: (entry: OutboxEntry) => OutboxEntry): Promise<void> {
  const write = (await database()).transaction('outbox', 'readwrite', strict);
  const entry = await write.store.get(place);
  if (entry !== undefined) await write.store.put(by(entry));
  await write.done;
}
