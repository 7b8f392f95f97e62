import { describe, expect, test } from 'vitest';
import { inspectImage } from '../../../server/services/inspect-image';
import { goodImages } from '../../support/images/good';
import { hostileFiles } from '../../support/images/hostile';

describe('an honest photo', () => {
  test.each(goodImages)('$name is taken with its upright size', async ({ bytes, expected }) => {
    expect(await inspectImage(bytes)).toEqual({ ok: true, image: expected });
  });
});

describe('a hostile file', () => {
  test('the corpus holds more than forty different files', () => {
    expect(new Set(hostileFiles.map(({ bytes }) => bytes.toString('base64'))).size).toBe(hostileFiles.length);
    expect(new Set(hostileFiles.map(({ name }) => name)).size).toBe(hostileFiles.length);
    expect(hostileFiles.length).toBeGreaterThan(40);
  });

  test.each(hostileFiles)('$name is refused: $code', async ({ bytes, code }) => {
    expect(await inspectImage(bytes)).toEqual({ ok: false, code });
  });
});

describe('any file', () => {
  test('cut anywhere, a photo is refused and never breaks the reader', async () => {
    for (const { bytes, name } of goodImages.filter(({ name }) => !/behind|trailer|padd|padding/.test(name))) {
      for (let length = 0; length < bytes.length; length += Math.max(1, Math.floor(bytes.length / 60))) {
        const verdict = await inspectImage(bytes.subarray(0, length));
        expect(verdict.ok, `${name} cut at ${length}`).toBe(false);
      }
    }
  });

  test('with any byte changed, a photo is judged and never breaks the reader', async () => {
    for (const { bytes } of goodImages) {
      for (let at = 0; at < Math.min(bytes.length, 700); at += 7) {
        const changed = Buffer.from(bytes);
        changed.writeUInt8(changed.readUInt8(at) ^ 0xff, at);
        expect(typeof (await inspectImage(changed)).ok).toBe('boolean');
      }
    }
  });
});
