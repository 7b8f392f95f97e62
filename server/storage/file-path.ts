import { join } from 'node:path';
import type { FileKey } from './file-storage';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;
const SHA256 = /^[0-9a-f]{64}$/;

/** Thrown when a key is not made of an id and a hash: nothing else may ever become part of a path. */
export class MalformedFileKey extends Error {
  constructor() {
    super('a stored file is named by a job id and a SHA-256');
  }
}

/** Path of a file below the root: `<job>/<first two>/<hash>`, so that no folder grows past a few hundred names. */
export function filePath(root: string, { jobId, sha256 }: FileKey): string {
  if (!UUID.test(jobId) || !SHA256.test(sha256)) throw new MalformedFileKey();
  return join(root, jobId, sha256.slice(0, 2), sha256);
}
