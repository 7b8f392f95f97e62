import { createHash } from 'node:crypto';
import type { DataSource } from 'typeorm';

/** How many tries in a row are free, and how the wait grows after them: it doubles from `firstMs` up to `longestMs`. */
export interface AttemptLimit {
  free: number;
  firstMs: number;
  longestMs: number;
}

export const attemptLimits = {
  signInAccount: { free: 5, firstMs: 30_000, longestMs: 15 * 60_000 },
  signInAddress: { free: 30, firstMs: 10_000, longestMs: 15 * 60_000 },
  signing: { free: 6, firstMs: 60_000, longestMs: 60 * 60_000 },
} as const satisfies Record<string, AttemptLimit>;
export type AttemptKind = keyof typeof attemptLimits;

/** Tries that lie a day back are forgotten. */
const forgottenAfterMs = 24 * 3_600_000;

const bucketOf = (kind: AttemptKind, whom: string) => createHash('sha256').update(`${kind}\n${whom}`).digest('hex');

/**
 * Takes one try before the secret is looked at, so that a hundred at once are counted as a hundred.
 * @returns null when it may be made, otherwise the seconds to wait
 */
export async function takeAttempt(db: DataSource, kind: AttemptKind, whom: string, now: Date): Promise<number | null> {
  const bucket = bucketOf(kind, whom);
  const { free, firstMs, longestMs } = attemptLimits[kind];
  const forgotten = new Date(now.getTime() - forgottenAfterMs);
  await db.query('INSERT IGNORE INTO attempt_throttles (bucket, failures, last_at) VALUES (?, 0, ?)', [bucket, now]);
  const taken: { affectedRows: number } = await db.query(
    `UPDATE attempt_throttles
        SET failures = IF(last_at < ?, 1, failures + 1),
            locked_until = IF(failures > ?, ? + INTERVAL LEAST(?, ? * POW(2, LEAST(CAST(failures AS SIGNED) - ? - 1, 20))) * 1000 MICROSECOND, NULL),
            last_at = ?
      WHERE bucket = ? AND (locked_until IS NULL OR locked_until <= ?)`,
    [forgotten, free, now, longestMs, firstMs, free, now, bucket, now],
  );
  if (taken.affectedRows > 0) return null;
  const [row] = await db.query<{ locked_until: Date | null }[]>(
    'SELECT locked_until FROM attempt_throttles WHERE bucket = ?',
    [bucket],
  );
  return Math.max(1, Math.ceil(((row?.locked_until?.getTime() ?? now.getTime()) - now.getTime()) / 1000));
}

/** The secret was right: what was counted against this account is forgotten. */
export async function forgetAttempts(db: DataSource, kind: AttemptKind, whom: string): Promise<void> {
  // the row stays: another try at this very moment counts on it
  await db.query('UPDATE attempt_throttles SET failures = 0, locked_until = NULL WHERE bucket = ?', [
    bucketOf(kind, whom),
  ]);
}

/** The secret was right: only this one try is given back, for a counter that many people share. */
export async function giveBackAttempt(db: DataSource, kind: AttemptKind, whom: string): Promise<void> {
  await db.query(
    'UPDATE attempt_throttles SET failures = GREATEST(failures, 1) - 1, locked_until = NULL WHERE bucket = ?',
    [bucketOf(kind, whom)],
  );
}
