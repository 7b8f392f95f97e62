import { createHash } from 'node:crypto';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { storeFile, type FileFacts, type FileToStore } from '../../../server/services/store-file';
import en from '../../../shared/locales/en/file-refusals';
import { hasWords } from '../../../shared/locales/say';
import { refusalMessageKey } from '../../../shared/photos/refusals';
import { aStorage, type StorageForTest } from '../../support/a-storage';
import { goodImages } from '../../support/images/good';
import { hostileFiles } from '../../support/images/hostile';
import { aJpeg } from '../../support/images/make';

const JOB = '0195f1c2-7a00-7000-8000-00000000a001';
const WELDER = '0195f1c2-7a00-7000-8000-00000000b001';

let house: StorageForTest;
let registered: { jobId: string; file: FileFacts; accountId: string }[];
beforeEach(async () => {
  house = await aStorage();
  registered = [];
});
afterEach(() => house.remove());

const sha256Of = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');

async function* stream(bytes: Buffer): AsyncGenerator<Buffer> {
  for (let at = 0; at < bytes.length; at += 65_536) yield bytes.subarray(at, at + 65_536);
}

function send(bytes: Buffer, change: Partial<FileToStore> = {}) {
  return storeFile(
    {
      storage: house.storage,
      register: { register: async (jobId, file, accountId) => void registered.push({ jobId, file, accountId }) },
    },
    {
      jobId: JOB,
      sha256: sha256Of(bytes),
      kind: 'photo',
      stream: stream(bytes),
      declaredLength: bytes.length,
      accountId: WELDER,
      ...change,
    },
  );
}

describe('a photo', () => {
  test.each(goodImages)('$name is kept byte for byte and written down', async ({ bytes, expected }) => {
    const sha256 = sha256Of(bytes);
    const { type, width, height } = expected;
    const file = { sha256, type, bytes: bytes.length, width, height };
    expect(await send(bytes)).toEqual({ ok: true, file });
    expect(registered).toEqual([{ jobId: JOB, file, accountId: WELDER }]);
    const kept = await house.storage.open({ jobId: JOB, sha256 });
    expect(Buffer.concat(await kept!.stream.toArray()).equals(bytes)).toBe(true);
  });

  test.each(hostileFiles)('$name is refused in words and leaves nothing behind', async ({ bytes, code }) => {
    expect(await send(bytes)).toEqual({ ok: false, code });
    expect(await house.files()).toEqual([]);
    expect(registered).toEqual([]);
    expect(hasWords({ errors: en }, refusalMessageKey(code))).toBe(true);
  });

  test('under a foreign hash is refused and leaves nothing behind', async () => {
    expect(await send(aJpeg(), { sha256: 'a'.repeat(64) })).toEqual({ ok: false, code: 'file.hash-mismatch' });
    expect(await house.files()).toEqual([]);
  });

  test('shorter than announced is refused as not whole', async () => {
    const bytes = aJpeg();
    expect(await send(bytes, { declaredLength: bytes.length + 1 })).toEqual({ ok: false, code: 'file.incomplete' });
    expect(await house.files()).toEqual([]);
  });

  test('announced as too large is refused before a byte is read', async () => {
    async function* untouched(): AsyncGenerator<Buffer> {
      yield Buffer.alloc(1);
      throw new Error('the stream was read');
    }
    expect(await send(aJpeg(), { declaredLength: 15_000_001, stream: untouched() })).toEqual({
      ok: false,
      code: 'photo.too-large',
    });
  });

  test('sent without a length is stopped at the limit', async () => {
    const bytes = Buffer.concat([aJpeg(), Buffer.alloc(15_000_000)]);
    expect(await send(bytes, { declaredLength: undefined })).toEqual({ ok: false, code: 'photo.too-large' });
    expect(await house.files()).toEqual([]);
  });

  test('sent twice is one file', async () => {
    const first = await send(aJpeg());
    expect(await send(aJpeg())).toEqual(first);
    expect(await house.files()).toHaveLength(1);
  });

  test('is not left behind half when its sender breaks off', async () => {
    async function* broken(): AsyncGenerator<Buffer> {
      yield aJpeg().subarray(0, 200);
      throw new Error('the line went down');
    }
    await expect(send(aJpeg(), { stream: broken() })).rejects.toThrow('the line went down');
    expect(await house.files()).toEqual([]);
  });
});

describe('a recorder file', () => {
  const sendRecorder = (bytes: Buffer) => send(bytes, { kind: 'recorder' });

  test.each([
    ['commas', 'time,psi\r\n03:10:05,2000\r\n03:10:06,1999\r\n'],
    ['semicolons and decimal commas', 'Zeit;bar\n03:10:05;137,9\n03:10:06;137,8\n'],
    ['tabs and lines of explanation in front', 'Recorder R-7\nJob Tallgrass 14-2H\n\ntime\tpsi\n1\t2000\n2\t1999\n'],
    ['a byte order mark', '\ufefftime,psi\n1,2000\n'],
  ])('with %s is taken', async (_what, content) => {
    const bytes = Buffer.from(content);
    expect(await sendRecorder(bytes)).toEqual({
      ok: true,
      file: { sha256: sha256Of(bytes), type: 'text/csv', bytes: bytes.length, width: null, height: null },
    });
  });

  test.each([
    ['nothing', Buffer.alloc(0), 'recorder.empty'],
    ['a photo', aJpeg(), 'recorder.not-text'],
    ['text in UTF-16', Buffer.from('\ufefftime,psi\n1,2000\n', 'utf16le'), 'recorder.not-text'],
    ['a null byte', Buffer.from('time,psi\n1,20\u000000\n'), 'recorder.not-text'],
    ['prose', Buffer.from('The pressure held.\nIt fell by nothing.\n'), 'recorder.not-a-table'],
    ['a page', Buffer.from('<html>\n<p>a,b</p>\n<p>1,2</p>\n</html>\n'), 'recorder.not-a-table'],
    ['more than 5 MB', Buffer.alloc(5_000_001, '1,2\n'), 'recorder.too-large'],
  ])('that holds %s is refused', async (_what, bytes, code) => {
    expect(await sendRecorder(bytes)).toEqual({ ok: false, code });
    expect(await house.files()).toEqual([]);
  });
});
