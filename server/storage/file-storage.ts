import type { Readable } from 'node:stream';

/** Names one stored file: the job it belongs to and the SHA-256 of its bytes in lower-case hex. */
export interface FileKey {
  jobId: string;
  sha256: string;
}

/** What came in, once the sender has ended. */
export interface Received {
  bytes: number;
  /** Computed while the bytes passed, lower-case hex. */
  sha256: string;
}

export type ReceiveResult = { ok: true; received: Received } | { ok: false; code: 'too-large' };

/** A file on its way in. It exists for nobody until it is kept; what is not kept must be discarded. */
export interface IncomingFile {
  /** Writes the stream through, flushed to the medium at its end; stops as soon as the limit is passed. */
  receive(source: AsyncIterable<Uint8Array>, limitBytes: number): Promise<ReceiveResult>;
  /** The bytes as they were written, read back. */
  read(): Promise<Buffer>;
  /** Makes the file readable under its hash, durably. Keeping the same bytes twice changes nothing. */
  keep(jobId: string): Promise<FileKey>;
  /** Leaves nothing behind. After `keep` it does nothing. */
  discard(): Promise<void>;
}

export interface StoredFile {
  bytes: number;
  stream: Readable;
}

/**
 * Where the bytes of photos, recorder files and certificates lie. Addresses are contents: nothing is ever
 * overwritten with other bytes. Failures of the medium are thrown; a file that is not there is null.
 */
export interface FileStorage {
  begin(): Promise<IncomingFile>;
  open(key: FileKey): Promise<StoredFile | null>;
  has(key: FileKey): Promise<boolean>;
  /** Removes what a crash left half received before the given time; answers how many. */
  sweep(before: Date): Promise<number>;
}
