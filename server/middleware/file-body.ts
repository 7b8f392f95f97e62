import type { Request } from 'express';
import { RECORDER_TYPE, type FileKind } from '../../shared/photos/limits';
import { Problem } from './problem';

/** Past this many bytes nobody listens on: the line is cut. */
const PATIENCE_BYTES = 64_000_000;

/** What a request brings as its bytes: a recorder's file when it says so, a photo otherwise. */
export function kindOfBody(req: Request): FileKind {
  if (req.headers['content-encoding'] !== undefined) throw new Problem(415, 'request.wrong-type');
  if (req.is(RECORDER_TYPE)) return 'recorder';
  if (req.headers['content-type'] === undefined || req.is(['image/*', 'application/octet-stream'])) return 'photo';
  throw new Problem(415, 'request.wrong-type');
}

/** The announced length in bytes; undefined when the body comes in chunks. */
export function lengthOfBody(req: Request): number | undefined {
  const length = req.headers['content-length'];
  return length === undefined ? undefined : Number(length);
}

/** The bytes as they come in. The request outlives a reader that stops early, so that it can still be answered. */
export function bytesOfBody(req: Request): AsyncIterable<Buffer> {
  return req.iterator({ destroyOnReturn: false });
}

/** Lets a refused body run out, within reason, so that the sender gets to read why. */
export async function drainBody(req: Request): Promise<void> {
  let left = PATIENCE_BYTES;
  for await (const chunk of bytesOfBody(req)) {
    left -= (chunk as Buffer).length;
    if (left < 0) return void req.destroy();
  }
}
