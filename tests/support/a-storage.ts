import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { DiskStorage } from '../../server/storage/disk-storage';

/** A storage of its own below the system's folder for passing things. */
export interface StorageForTest {
  storage: DiskStorage;
  root: string;
  /** Every file in it, as paths below the root. */
  files(): Promise<string[]>;
  remove(): Promise<void>;
}

export async function aStorage(): Promise<StorageForTest> {
  const root = await mkdtemp(join(tmpdir(), 'headfast-files-'));
  let made = 0;
  return {
    root,
    storage: new DiskStorage(root, () => `part-${(made += 1)}`),
    files: async () => {
      const entries = await readdir(root, { recursive: true, withFileTypes: true });
      return entries.filter((e) => e.isFile()).map((e) => join(e.parentPath, e.name).slice(root.length + 1));
    },
    remove: () => rm(root, { recursive: true, force: true }),
  };
}
