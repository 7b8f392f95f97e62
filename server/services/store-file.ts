import { byteLimitOf, RECORDER_TYPE, type FileKind, type FileType } from '../../shared/photos/limits';
import type { FileRefusal } from '../../shared/photos/refusals';
import type { FileStorage, IncomingFile } from '../storage/file-storage';
import { inspectImage } from './inspect-image';
import { inspectRecorderFile } from './inspect-recorder-file';

/** A file as the job knows it. Recorder files have no width and height. */
export interface FileFacts {
  sha256: string;
  type: FileType;
  bytes: number;
  width: number | null;
  height: number | null;
}

/** Where a job's files and those who sent them are written down. */
export interface JobFileRegister {
  /** Writes the file down once per job and its sender once per file; again changes nothing. */
  register(jobId: string, file: FileFacts, accountId: string): Promise<void>;
}

export interface FileToStore {
  jobId: string;
  /** The hash under which the sender named it, lower-case hex. */
  sha256: string;
  kind: FileKind;
  stream: AsyncIterable<Uint8Array>;
  /** The length that the sender announced, in bytes, if it did. */
  declaredLength: number | undefined;
  accountId: string;
}

export type StoreFileResult = { ok: true; file: FileFacts } | { ok: false; code: FileRefusal };

/**
 * Takes a file into a job: the bytes are always read, hashed and judged, also when the job already has them.
 * What is refused leaves nothing behind; failures of the medium or the database are thrown.
 */
export async function storeFile(
  { storage, register }: { storage: FileStorage; register: JobFileRegister },
  sent: FileToStore,
): Promise<StoreFileResult> {
  const limit = byteLimitOf(sent.kind);
  if (sent.declaredLength !== undefined && sent.declaredLength > limit) return tooLarge(sent.kind);
  const incoming = await storage.begin();
  try {
    const result = await incoming.receive(sent.stream, limit);
    if (!result.ok) return tooLarge(sent.kind);
    const { bytes, sha256 } = result.received;
    if (sent.declaredLength !== undefined && bytes !== sent.declaredLength) return refuse('file.incomplete');
    // What was hurt on its way is told as that, before anything in it is judged.
    if (sha256 !== sent.sha256) return refuse('file.hash-mismatch');
    const judged = await judge(sent.kind, incoming, bytes);
    if (typeof judged === 'string') return refuse(judged);
    const file = { sha256, bytes, ...judged };
    await incoming.keep(sent.jobId);
    await register.register(sent.jobId, file, sent.accountId);
    return { ok: true, file };
  } finally {
    await incoming.discard();
  }
}

type Judged = Pick<FileFacts, 'type' | 'width' | 'height'> | FileRefusal;

async function judge(kind: FileKind, incoming: IncomingFile, bytes: number): Promise<Judged> {
  const content = bytes === 0 ? Buffer.alloc(0) : await incoming.read();
  if (kind === 'recorder') {
    return inspectRecorderFile(content) ?? { type: RECORDER_TYPE, width: null, height: null };
  }
  const verdict = await inspectImage(content);
  return verdict.ok
    ? { type: verdict.image.type, width: verdict.image.width, height: verdict.image.height }
    : verdict.code;
}

function tooLarge(kind: FileKind): StoreFileResult {
  return refuse(kind === 'photo' ? 'photo.too-large' : 'recorder.too-large');
}

function refuse(code: FileRefusal): StoreFileResult {
  return { ok: false, code };
}
