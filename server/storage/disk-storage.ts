import { mkdir, open, readdir, rm, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { DiskIncoming } from './disk-incoming';
import { filePath } from './file-path';
import type { FileKey, FileStorage, IncomingFile, StoredFile } from './file-storage';

const INCOMING = 'incoming';
const PART = '.part';

/** Files on a local disk or a mounted volume below one root folder, which is never served by itself. */
export class DiskStorage implements FileStorage {
  constructor(
    private readonly root: string,
    private readonly newId: () => string,
  ) {}

  async begin(): Promise<IncomingFile> {
    const folder = join(this.root, INCOMING);
    await mkdir(folder, { recursive: true, mode: 0o700 });
    return new DiskIncoming(this.root, join(folder, `${this.newId()}${PART}`));
  }

  async open(key: FileKey): Promise<StoredFile | null> {
    const file = await open(filePath(this.root, key), 'r').catch(nullWhenMissing);
    if (!file) return null;
    const { size } = await file.stat();
    return { bytes: size, stream: file.createReadStream() };
  }

  async has(key: FileKey): Promise<boolean> {
    return (await stat(filePath(this.root, key)).catch(nullWhenMissing)) !== null;
  }

  async sweep(before: Date): Promise<number> {
    const folder = join(this.root, INCOMING);
    const names = (await readdir(folder).catch(nullWhenMissing)) ?? [];
    let removed = 0;
    for (const name of names.filter((each) => each.endsWith(PART))) {
      const path = join(folder, name);
      const found = await stat(path).catch(nullWhenMissing);
      if (!found || found.mtime >= before) continue;
      await rm(path, { force: true });
      removed += 1;
    }
    return removed;
  }
}

function nullWhenMissing(error: NodeJS.ErrnoException): null {
  if (error.code === 'ENOENT') return null;
  throw error;
}
