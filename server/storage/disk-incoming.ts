import { createHash } from 'node:crypto';
import { open, readFile, rm } from 'node:fs/promises';
import { durableRename } from './durable-rename';
import { filePath } from './file-path';
import type { FileKey, IncomingFile, Received, ReceiveResult } from './file-storage';

/** A file being received on disk, below the same root as its later place, so that a rename can move it there. */
export class DiskIncoming implements IncomingFile {
  private received: Received | undefined;
  private kept = false;

  constructor(
    private readonly root: string,
    private readonly path: string,
  ) {}

  async receive(source: AsyncIterable<Uint8Array>, limitBytes: number): Promise<ReceiveResult> {
    const hash = createHash('sha256');
    let bytes = 0;
    const file = await open(this.path, 'wx', 0o600);
    try {
      for await (const chunk of source) {
        bytes += chunk.length;
        if (bytes > limitBytes) return { ok: false, code: 'too-large' };
        hash.update(chunk);
        await writeAll(file, chunk);
      }
      await file.sync();
    } finally {
      await file.close();
    }
    this.received = { bytes, sha256: hash.digest('hex') };
    return { ok: true, received: this.received };
  }

  read(): Promise<Buffer> {
    return readFile(this.path);
  }

  /** The same bytes already there are replaced by themselves, which also mends a copy that went bad. */
  async keep(jobId: string): Promise<FileKey> {
    if (!this.received) throw new Error('only a file that was received to its end can be kept');
    const key = { jobId, sha256: this.received.sha256 };
    await durableRename(this.path, filePath(this.root, key));
    this.kept = true;
    return key;
  }

  async discard(): Promise<void> {
    if (!this.kept) await rm(this.path, { force: true });
  }
}

async function writeAll(file: Awaited<ReturnType<typeof open>>, chunk: Uint8Array): Promise<void> {
  for (let at = 0; at < chunk.length;) {
    const { bytesWritten } = await file.write(chunk, at);
    at += bytesWritten;
  }
}
