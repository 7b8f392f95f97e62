import { createHash } from 'node:crypto';
import { mkdir, utimes, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { sweepUploads } from '../../../server/services/sweep-uploads';
import { MalformedFileKey } from '../../../server/storage/file-path';
import { aStorage, type StorageForTest } from '../../support/a-storage';

const JOB = '0195f1c2-7a00-7000-8000-00000000a001';
const words = Buffer.from('bolt hole north, 14 3/8');
const hash = createHash('sha256').update(words).digest('hex');

let house: StorageForTest;
beforeEach(async () => {
  house = await aStorage();
});
afterEach(() => house.remove());

async function* inPieces(bytes: Buffer, size = 5): AsyncGenerator<Buffer> {
  for (let at = 0; at < bytes.length; at += size) yield bytes.subarray(at, at + size);
}

async function keepWords(): Promise<void> {
  const incoming = await house.storage.begin();
  await incoming.receive(inPieces(words), 1000);
  await incoming.keep(JOB);
  await incoming.discard();
}

test('a kept file lies under its job and its hash and reads back byte for byte', async () => {
  await keepWords();
  expect(await house.files()).toEqual([join(JOB, hash.slice(0, 2), hash)]);
  const found = await house.storage.open({ jobId: JOB, sha256: hash });
  expect(found?.bytes).toBe(words.length);
  expect(Buffer.concat(await found!.stream.toArray())).toEqual(words);
});

test('keeping the same bytes twice changes nothing', async () => {
  await keepWords();
  await keepWords();
  expect(await house.files()).toHaveLength(1);
});

test('a file that was not kept is nobody’s and leaves nothing behind', async () => {
  const incoming = await house.storage.begin();
  await incoming.receive(inPieces(words), 1000);
  expect(await house.storage.has({ jobId: JOB, sha256: hash })).toBe(false);
  await incoming.discard();
  expect(await house.files()).toEqual([]);
});

test('receiving stops at the limit without reading on', async () => {
  let given = 0;
  async function* endless(): AsyncGenerator<Buffer> {
    for (;;) {
      given += 1;
      yield Buffer.alloc(1000);
    }
  }
  const incoming = await house.storage.begin();
  expect(await incoming.receive(endless(), 10_000)).toEqual({ ok: false, code: 'too-large' });
  expect(given).toBe(11);
  await incoming.discard();
  expect(await house.files()).toEqual([]);
});

test('a sender that breaks off is passed on and can be cleared away', async () => {
  async function* broken(): AsyncGenerator<Buffer> {
    yield words;
    throw new Error('the line went down');
  }
  const incoming = await house.storage.begin();
  await expect(incoming.receive(broken(), 1000)).rejects.toThrow('the line went down');
  await expect(incoming.keep(JOB)).rejects.toThrow();
  await incoming.discard();
  expect(await house.files()).toEqual([]);
});

test.each([
  ['a step up', '../../../etc', hash],
  ['a step up in the hash', JOB, `../${hash.slice(3)}`],
  ['capital letters', JOB, hash.toUpperCase()],
  ['a hash too short', JOB, hash.slice(1)],
  ['a line end behind the hash', JOB, `${hash}\n`],
  ['a null byte', `${JOB}\0`, hash],
  ['nothing', '', ''],
])('no path is made of %s', async (_what, jobId, sha256) => {
  await expect(house.storage.open({ jobId, sha256 })).rejects.toThrow(MalformedFileKey);
  await expect(house.storage.has({ jobId, sha256 })).rejects.toThrow(MalformedFileKey);
});

test('what nobody sent is not there', async () => {
  expect(await house.storage.open({ jobId: JOB, sha256: hash })).toBeNull();
});

test('at boot, halves older than a day are swept and nothing else', async () => {
  await keepWords();
  const folder = join(house.root, 'incoming');
  await mkdir(folder, { recursive: true });
  const now = new Date('2026-03-03T12:00:00Z');
  const at = async (name: string, time: string) => {
    await writeFile(join(folder, name), 'half');
    await utimes(join(folder, name), new Date(time), new Date(time));
  };
  await at('old.part', '2026-03-02T11:59:00Z');
  await at('young.part', '2026-03-02T12:01:00Z');
  expect(await sweepUploads(house.storage, now)).toBe(1);
  expect((await house.files()).sort()).toEqual(
    [join(JOB, hash.slice(0, 2), hash), join('incoming', 'young.part')].sort(),
  );
});
