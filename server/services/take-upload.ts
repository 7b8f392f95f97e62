import type { DataSource } from 'typeorm';

const WINDOW_MS = 10 * 60_000;

/** A shift without a signal on three jobs, originals and previews, arrives in one go and must not be held up. */
export const UPLOADS_PER_WINDOW = 1200;

/**
 * Counts one upload of an account, in the database so that every copy of the server counts alike.
 * @returns null when it may go on, otherwise the seconds until the next window
 */
export async function takeUpload(dataSource: DataSource, accountId: string, now: Date): Promise<number | null> {
  const start = new Date(Math.floor(now.getTime() / WINDOW_MS) * WINDOW_MS);
  await dataSource.query(
    `INSERT INTO upload_counts (account_id, window_start, files) VALUES (?, ?, 1)
     ON DUPLICATE KEY UPDATE files = IF(window_start = VALUES(window_start), files + 1, 1), window_start = VALUES(window_start)`,
    [accountId, start],
  );
  const [row] = await dataSource.query<{ files: number | string }[]>(
    'SELECT files FROM upload_counts WHERE account_id = ?',
    [accountId],
  );
  if (Number(row?.files ?? 0) <= UPLOADS_PER_WINDOW) return null;
  return Math.max(1, Math.ceil((start.getTime() + WINDOW_MS - now.getTime()) / 1000));
}
