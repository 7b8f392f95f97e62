import { createHash } from 'node:crypto';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { preparePhoto } from '../../../src/offline/prepare-photo';
import { aHeic } from '../../support/images/heic';
import { hostileFiles } from '../../support/images/hostile';
import { aJpeg } from '../../support/images/make';

const sha256Of = (bytes: Buffer) => createHash('sha256').update(bytes).digest('hex');
const asFile = (bytes: Buffer, type = 'image/jpeg') => new Blob([new Uint8Array(bytes)], { type });

const previewBytes = Buffer.from('a small picture');
let decodedSize: { width: number; height: number } | null;
let drawn: { width: number; height: number } | undefined;

beforeEach(() => {
  decodedSize = { width: 4000, height: 3000 };
  drawn = undefined;
  vi.stubGlobal('createImageBitmap', async (_file: Blob, options: ImageBitmapOptions) => {
    if (!decodedSize) throw new DOMException('not decoded', 'InvalidStateError');
    expect(options.imageOrientation).toBe('from-image');
    return { ...decodedSize, close: () => undefined };
  });
  vi.stubGlobal(
    'OffscreenCanvas',
    class {
      constructor(width: number, height: number) {
        drawn = { width, height };
      }
      getContext = () => ({ fillRect: () => undefined, drawImage: () => undefined });
      convertToBlob = async ({ type }: { type: string }) => new Blob([previewBytes], { type });
    },
  );
});
afterEach(() => vi.unstubAllGlobals());

describe('a photo from the camera', () => {
  test('keeps its bytes under their hash and gets a preview of 1280 with a hash of its own', async () => {
    const bytes = aJpeg();
    const result = await preparePhoto(asFile(bytes, 'application/octet-stream'));
    if (!result.ok) throw new Error(result.code);
    const { photo } = result;
    expect(photo).toMatchObject({
      sha256: sha256Of(bytes),
      type: 'image/jpeg',
      bytes: bytes.length,
      width: 4000,
      height: 3000,
    });
    expect(Buffer.from(await photo.original.arrayBuffer()).equals(bytes)).toBe(true);
    expect(photo.original.type).toBe('image/jpeg');
    expect(photo.preview).toMatchObject({ sha256: sha256Of(previewBytes), width: 1280, height: 960 });
    expect(drawn).toEqual({ width: 1280, height: 960 });
  });

  test('smaller than a preview is drawn in its own size', async () => {
    decodedSize = { width: 64, height: 48 };
    await preparePhoto(asFile(aJpeg()));
    expect(drawn).toEqual({ width: 64, height: 48 });
  });

  test('in HEIC that the browser cannot show is kept without a preview, with the size it states', async () => {
    decodedSize = null;
    const result = await preparePhoto(asFile(aHeic({ quarters: 3 })));
    expect(result).toMatchObject({ ok: true, photo: { type: 'image/heic', width: 3024, height: 4032 } });
    expect(result).not.toHaveProperty('photo.preview');
  });
});

describe('a file that is no photo', () => {
  const foreign = hostileFiles.filter(({ code }) => ['photo.empty', 'photo.too-large'].includes(code));
  test.each(foreign)('$name is refused before it waits in the outbox', async ({ bytes, code }) => {
    expect(await preparePhoto(asFile(bytes))).toEqual({ ok: false, code });
  });

  test('a page named as a photo is refused by its content', async () => {
    expect(await preparePhoto(asFile(Buffer.from('<html></html>')))).toEqual({ ok: false, code: 'photo.not-an-image' });
  });

  test('a JPEG that cannot be decoded is refused as damaged', async () => {
    decodedSize = null;
    expect(await preparePhoto(asFile(aJpeg()))).toEqual({ ok: false, code: 'photo.truncated' });
  });

  test('more than 60 megapixels are refused', async () => {
    decodedSize = { width: 10_000, height: 6_001 };
    expect(await preparePhoto(asFile(aJpeg()))).toEqual({ ok: false, code: 'photo.too-many-pixels' });
  });

  test('a file that has gone from the device is said to be unreadable', async () => {
    const gone = asFile(aJpeg());
    gone.arrayBuffer = () => Promise.reject(new DOMException('gone', 'NotFoundError'));
    expect(await preparePhoto(gone)).toEqual({ ok: false, code: 'photo.unreadable' });
  });
});
