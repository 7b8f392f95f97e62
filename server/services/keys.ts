import { randomBytes, randomUUID } from 'node:crypto';
import { closeSync, fsyncSync, linkSync, mkdirSync, openSync, readFileSync, rmSync, writeSync } from 'node:fs';
import path from 'node:path';

/** Secrets that live outside the database: whoever takes the database alone can test no PIN and forge no cookie. */
export interface Keys {
  session: string;
  pin: Buffer;
}

const isCode = (error: unknown, code: string): boolean =>
  error instanceof Error && 'code' in error && error.code === code;

/** Reads a key of 32 bytes, or makes it at the first start: mode 0600, on disk before anything is built on it. */
function readOrMake(folder: string, name: string): Buffer {
  const file = path.join(folder, name);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  for (;;) {
    try {
      const key = Buffer.from(readFileSync(file, 'utf8').trim(), 'hex');
      if (key.length !== 32)
        throw new Error(`${name} in the folder of keys is damaged: 64 hexadecimal digits are expected.`);
      return key;
    } catch (error) {
      if (!isCode(error, 'ENOENT')) throw error;
    }
    // a number of the process would do on one machine; two containers share a folder and are both process 1
    const draft = `${file}.${randomUUID()}`;
    const handle = openSync(draft, 'wx', 0o600);
    writeSync(handle, `${randomBytes(32).toString('hex')}\n`);
    fsyncSync(handle);
    closeSync(handle);
    try {
      linkSync(draft, file);
    } catch (error) {
      // another process was first: its key counts
      if (!isCode(error, 'EEXIST')) throw error;
    } finally {
      rmSync(draft);
    }
  }
}

/** The installation's keys, made when they are missing. */
export const readKeys = (folder: string): Keys => ({
  session: readOrMake(folder, 'session-key').toString('hex'),
  pin: readOrMake(folder, 'pin-key'),
});
