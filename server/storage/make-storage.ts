import { DiskStorage } from './disk-storage';
import type { FileStorage } from './file-storage';

/** The storage that the configuration asks for: a disk below its folder for uploads. */
export function makeStorage(config: { uploadsDir: string }, ids: () => string): FileStorage {
  return new DiskStorage(config.uploadsDir, ids);
}
