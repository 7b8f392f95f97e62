import type { DataSource, EntityManager } from 'typeorm';

const tries = 5;

const codeOf = (error: unknown): unknown =>
  typeof error === 'object' && error !== null && 'code' in error ? error.code : undefined;

/**
 * Whether the same work, begun again, finds another world: it was chosen to give way in a deadlock, or the same command
 * arrived twice and the other one has left its receipt by now.
 */
const isWorthAnotherTry = (error: unknown): boolean =>
  codeOf(error) === 'ER_LOCK_DEADLOCK' || codeOf(error) === 'ER_DUP_ENTRY';

/** Runs work in one READ COMMITTED transaction, from its beginning again when it had to give way. */
export async function inTransaction<T>(
  dataSource: DataSource,
  work: (manager: EntityManager) => Promise<T>,
): Promise<T> {
  for (let tried = 1; ; tried += 1) {
    try {
      return await dataSource.transaction('READ COMMITTED', work);
    } catch (error) {
      if (tried >= tries || !isWorthAnotherTry(error)) throw error;
    }
  }
}
