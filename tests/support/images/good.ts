import { aHeic, box } from './heic';
import { aJpeg, aPng, withPngChunk, withSegment } from './make';
import { aLossyWebp, aWebp, canvasChunk, losslessChunk, lossyChunk, riff, riffChunk } from './webp';
import { exifBlock } from './exif';

/** An honest photo and what it must be read as. */
export interface GoodImage {
  name: string;
  bytes: Buffer;
  expected: { type: string; width: number; height: number; orientation: number; takenAt?: string };
}

const taken = { takenAt: '2026:03:02 03:10:05', offset: '-06:00' };
const takenAt = '2026-03-02T03:10:05-06:00';

const turned: GoodImage[] = [1, 2, 3, 4, 5, 6, 7, 8].map((orientation) => ({
  name: `a JPEG held in position ${orientation}`,
  bytes: aJpeg(64, 48, { orientation, ...taken, bigEndian: orientation % 2 === 0 }),
  expected: {
    type: 'image/jpeg',
    width: orientation < 5 ? 64 : 48,
    height: orientation < 5 ? 48 : 64,
    orientation,
    takenAt,
  },
}));

const plain = (
  name: string,
  bytes: Buffer,
  type: string,
  width: number,
  height: number,
  orientation = 1,
): GoodImage => ({
  name,
  bytes,
  expected: { type, width, height, orientation },
});

/** Photos as phones, cameras and editors write them; every one of them is taken. */
export const goodImages: readonly GoodImage[] = [
  ...turned,
  plain('a JPEG without EXIF', aJpeg(33, 21), 'image/jpeg', 33, 21),
  plain('a JPEG of one pixel', aJpeg(1, 1), 'image/jpeg', 1, 1),
  plain(
    'a JPEG with a second picture behind its end, as phones store a gain map',
    Buffer.concat([aJpeg(80, 60), aJpeg(20, 15)]),
    'image/jpeg',
    80,
    60,
  ),
  plain(
    'a JPEG with a short film behind its end',
    Buffer.concat([aJpeg(80, 60), box('ftyp', Buffer.from('mp42\0\0\0\0isom')), box('mdat', Buffer.alloc(900, 0xa7))]),
    'image/jpeg',
    80,
    60,
  ),
  plain(
    'a JPEG with the trailer of a phone',
    Buffer.concat([
      aJpeg(80, 60),
      Buffer.from('\0\0\x01\x0a\x0e\0\0\0Image_UTC_Data1772442605000SEFHk\0\0\0SEFT', 'latin1'),
    ]),
    'image/jpeg',
    80,
    60,
  ),
  plain('a JPEG padded with zeros', Buffer.concat([aJpeg(16, 16), Buffer.alloc(512)]), 'image/jpeg', 16, 16),
  plain(
    'a JPEG with an editor description',
    withSegment(
      aJpeg(16, 16),
      0xe1,
      Buffer.from('http://ns.adobe.com/xap/1.0/\0<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF/></x:xmpmeta>'),
    ),
    'image/jpeg',
    16,
    16,
  ),
  plain(
    'a JPEG with a damaged EXIF block',
    withSegment(aJpeg(16, 16), 0xe1, Buffer.from('Exif\0\0II*\0\xff\xff\xff\xff\xff\xff\xff\xff', 'latin1')),
    'image/jpeg',
    16,
    16,
  ),
  plain('a PNG', aPng(40, 30), 'image/png', 40, 30),
  plain(
    'a PNG turned by EXIF',
    withPngChunk(aPng(40, 30), 'eXIf', exifBlock({ orientation: 6 })),
    'image/png',
    30,
    40,
    6,
  ),
  plain('a lossless WebP', aWebp(), 'image/webp', 1, 1),
  plain('a lossy WebP', aLossyWebp(), 'image/webp', 32, 24),
  plain('a lossy WebP of a phone', riff(lossyChunk(320, 240)), 'image/webp', 320, 240),
  plain(
    'a WebP with EXIF',
    riff(canvasChunk(320, 240, 0x08), lossyChunk(320, 240), riffChunk('EXIF', exifBlock({ orientation: 8 }))),
    'image/webp',
    240,
    320,
    8,
  ),
  plain('a WebP with its padding', Buffer.concat([riff(losslessChunk(9, 7)), Buffer.alloc(1)]), 'image/webp', 9, 7),
  plain('a HEIC', aHeic(), 'image/heic', 4032, 3024),
  plain('a HEIC turned a quarter', aHeic({ quarters: 3 }), 'image/heic', 3024, 4032, 6),
  plain('a HEIC of the general brand', aHeic({ brands: ['mif1', 'mif1', 'heic'] }), 'image/heic', 4032, 3024),
  {
    name: 'a HEIC with the time it was taken',
    bytes: aHeic({ exif: { orientation: 6, ...taken, bigEndian: true } }),
    expected: { type: 'image/heic', width: 4032, height: 3024, orientation: 1, takenAt },
  },
];
