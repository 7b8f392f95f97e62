import type { FileStorage } from '../storage/file-storage';

const A_DAY_MS = 24 * 60 * 60 * 1000;

/** At boot: removes what a crash left half received more than a day ago. Answers how many files went. */
export function sweepUploads(storage: FileStorage, now: Date): Promise<number> {
  return storage.sweep(new Date(now.getTime() - A_DAY_MS));
}
