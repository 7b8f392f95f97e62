import { deflateSync, gzipSync } from 'node:zlib';
import type { PhotoRefusal } from '../../../shared/photos/refusals';
import { aHeic, box } from './heic';
import { aJpeg, aPng, pngChunk, withJpegSize, withPngChunk, withPngSize, withSegment } from './make';
import { aWebp, canvasChunk, losslessChunk, lossyChunk, riff, riffChunk } from './webp';
import { aZip } from './zip';

/** A file that must be turned away, and under which name. */
export interface HostileFile {
  name: string;
  bytes: Buffer;
  code: PhotoRefusal;
}

const text = (words: string) => Buffer.from(words, 'utf8');
const jpeg = aJpeg(64, 48);
const png = aPng(40, 30);
const webp = riff(canvasChunk(64, 48), lossyChunk(64, 48));
const heic = aHeic();
const page = text('<!DOCTYPE html><html><body><script>alert(1)</script></body></html>');
const pdf = text('%PDF-1.7\n1 0 obj\n<< /Type /Catalog >>\nendobj\ntrailer << /Root 1 0 R >>\n%%EOF\n');
const zip = aZip('notes.txt', 'tally');

const many = (code: PhotoRefusal, files: Record<string, Buffer>): HostileFile[] =>
  Object.entries(files).map(([name, bytes]) => ({ name, bytes, code }));

/** Files that are no photo, whatever their name says. */
const foreign = many('photo.not-an-image', {
  'a drawing in SVG': text(
    '<svg xmlns="http://www.w3.org/2000/svg" onload="alert(1)"><rect width="9" height="9"/></svg>',
  ),
  'a drawing in SVG behind an XML declaration': text('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"/>'),
  'a page': page,
  'a script': text('alert(document.cookie);'),
  'a server script': text('<?php echo "x"; ?>'),
  'a PDF': pdf,
  'a zip': zip,
  'a compressed file': gzipSync(text('tally')),
  'a tar': Buffer.concat([Buffer.alloc(257), text('ustar\0'), Buffer.alloc(249)]),
  'plain text': text('cut height north 14 3/8\n'),
  'a GIF': Buffer.from('47494638396101000100800000000000ffffff2c00000000010001000002024401003b', 'hex'),
  'a BMP': Buffer.concat([
    text('BM'),
    Buffer.from('46000000000000003600000028000000010000000100000001001800', 'hex'),
    Buffer.alloc(24),
  ]),
  'a TIFF': Buffer.from('49492a0008000000000000000000', 'hex'),
  'an icon': Buffer.from('00000100010001010000010018003000000016000000', 'hex'),
  'a program of Linux': Buffer.concat([Buffer.from('7f454c46020101', 'hex'), Buffer.alloc(57)]),
  'a program of Windows': Buffer.concat([text('MZ'), Buffer.alloc(62)]),
  'a sound': Buffer.concat([text('RIFF'), Buffer.from([36, 0, 0, 0]), text('WAVEfmt '), Buffer.alloc(28)]),
  'a film': Buffer.concat([box('ftyp', text('mp42\0\0\0\0isom')), box('mdat', Buffer.alloc(64))]),
  'an AVIF': aHeic({ brands: ['avif', 'mif1', 'avif'] }),
  'a HEIC sequence': aHeic({ brands: ['hevc', 'msf1', 'hevc'] }),
  'a moving WebP': riff(canvasChunk(64, 48, 2), riffChunk('ANIM', Buffer.alloc(6)), riffChunk('ANMF', losslessChunk())),
  'a JPEG behind a page': Buffer.concat([page, jpeg]),
  'a JPEG behind a space': Buffer.concat([text(' '), jpeg]),
  'a JPEG in base 64': text(jpeg.toString('base64')),
  'zeros alone': Buffer.alloc(4096),
  'one byte': Buffer.from([0xff]),
  'a PNG with line ends changed on the way': Buffer.from(png.toString('latin1').replaceAll('\r\n', '\n'), 'latin1'),
});

/** Photos that break off or whose parts do not fit. */
const truncated = many('photo.truncated', {
  'the first bytes of a JPEG': jpeg.subarray(0, 4),
  'a JPEG cut in its header': jpeg.subarray(0, 100),
  'a JPEG cut in its picture': jpeg.subarray(0, jpeg.length - 40),
  'a JPEG without its end': jpeg.subarray(0, jpeg.length - 2),
  'a JPEG with a segment longer than the file': Buffer.concat([Buffer.from('ffd8ffe1fffe', 'hex'), Buffer.alloc(64)]),
  'a JPEG with a segment of no length': Buffer.concat([Buffer.from('ffd8ffe00000', 'hex'), jpeg.subarray(2)]),
  'a JPEG that ends before it begins': Buffer.from('ffd8ffd9', 'hex'),
  'a JPEG with two sizes': withSecondFrame(jpeg),
  'a PNG signature alone': png.subarray(0, 8),
  'a PNG cut in its picture': png.subarray(0, png.length - 30),
  'a PNG without its end': png.subarray(0, png.length - 12),
  'a PNG with a chunk longer than the file': withLength(png, 33, 0x7fffffff),
  'a PNG with a flipped bit': flipped(png, 60),
  'a PNG without a picture': Buffer.concat([png.subarray(0, 33), pngChunk('IEND', Buffer.alloc(0))]),
  'a PNG with two headers': withPngChunk(png, 'IHDR', png.subarray(16, 29)),
  'a WebP cut in its picture': webp.subarray(0, webp.length - 9),
  'a WebP that says it is longer': withLittleLength(webp, 4, webp.length + 400),
  'a WebP with a chunk longer than the file': withLittleLength(aWebp(), 16, 4000),
  'a WebP without a picture': riff(canvasChunk(64, 48)),
  'a WebP with a picture larger than its canvas': riff(canvasChunk(64, 48), lossyChunk(4000, 3000)),
  'a HEIC cut in its data': heic.subarray(0, heic.length - 10),
  'a HEIC with a box longer than the file': withLength(heic, 0x18, 0x00ffffff),
  'a JPEG of a hundred thousand empty segments': Buffer.concat([
    Buffer.from('ffd8', 'hex'),
    Buffer.alloc(400_000, Buffer.from('ffe00002', 'hex')),
    jpeg.subarray(2),
  ]),
  'a HEIC of a hundred thousand empty boxes': Buffer.concat([
    heic,
    Buffer.alloc(800_000, Buffer.from('0000000866726565', 'hex')),
  ]),
  'a PNG of fifty thousand empty chunks': Buffer.concat([
    png.subarray(0, 33),
    ...Array<Buffer>(50_000).fill(pngChunk('vpAg', Buffer.alloc(0))),
    png.subarray(33),
  ]),
  'a WebP of fifty thousand empty chunks': riff(
    canvasChunk(64, 48),
    ...Array<Buffer>(50_000).fill(riffChunk('NONE', Buffer.alloc(0))),
    lossyChunk(64, 48),
  ),
  'a HEIC without properties': Buffer.concat([
    heic.subarray(0, 24),
    box('meta', Buffer.alloc(4)),
    box('mdat', Buffer.alloc(9)),
  ]),
});

/** Headers that would unpack to more than any phone's picture. */
const bombs = many('photo.too-many-pixels', {
  'a JPEG of 65,500 by 65,500': withJpegSize(jpeg, 65_500, 65_500),
  'a JPEG just above the limit': withJpegSize(jpeg, 10_000, 6_001),
  'a PNG of 50,000 by 50,000': withPngSize(png, 50_000, 50_000),
  'a PNG of the largest size there is': withPngSize(png, 0x7fffffff, 0x7fffffff),
  'a PNG header that promises the world and ends': withPngSize(png, 100_000, 100_000).subarray(0, 40),
  'a PNG of zeros that unpacks a thousandfold': Buffer.concat([
    withPngSize(png, 30_000, 30_000).subarray(0, 33),
    pngChunk('IDAT', deflateSync(Buffer.alloc(4_000_000))),
    pngChunk('IEND', Buffer.alloc(0)),
  ]),
  'a WebP canvas of 16 million by 16 million': riff(canvasChunk(0xffffff, 0xffffff), lossyChunk(64, 48)),
  'a WebP picture of 16,383 by 16,383': riff(lossyChunk(16_383, 16_383)),
  'a WebP picture that outgrows its canvas': riff(canvasChunk(64, 48), losslessChunk(16_384, 16_384)),
  'a HEIC of 40,000 by 40,000': aHeic({ width: 40_000, height: 40_000 }),
});

const sizeless = many('photo.no-size', {
  'a JPEG of no height': withJpegSize(jpeg, 64, 0),
  'a PNG of no width': withPngSize(png, 0, 30),
  'a WebP of no size': riff(lossyChunk(0, 0)),
  'a HEIC of no size': aHeic({ width: 0, height: 0 }),
});

/** Photos that are something else at the same time. */
const polyglots = many('photo.polyglot', {
  'a JPEG that is a zip': Buffer.concat([jpeg, zip]),
  'a JPEG that is a zip with a gap': Buffer.concat([jpeg, Buffer.alloc(99), zip]),
  'a JPEG that is a page': Buffer.concat([jpeg, page]),
  'a JPEG with a script in its comment': withSegment(
    jpeg,
    0xfe,
    text('<script src="//example.invalid/x.js"></script>'),
  ),
  'a JPEG with a script in its camera data': withSegment(jpeg, 0xe1, text('Exif\0\0<ScRiPt >alert(1)</script>')),
  'a JPEG that is a PDF from its comment on': withSegment(jpeg, 0xfe, pdf),
  'a JPEG with a PDF behind it': Buffer.concat([jpeg, pdf]),
  'a JPEG with a server script behind it': Buffer.concat([jpeg, text('<?php system($_GET["c"]); ?>')]),
  'a JPEG with a drawing behind it': Buffer.concat([jpeg, text('<svg onload="alert(1)">')]),
  'a JPEG with a packed archive behind it': Buffer.concat([
    jpeg,
    Buffer.from('526172211a0700', 'hex'),
    Buffer.alloc(40),
  ]),
  'a JPEG with a program behind it': Buffer.concat([jpeg, Buffer.from('7f454c46', 'hex'), Buffer.alloc(60)]),
  'a JPEG that is a script': Buffer.concat([
    withSegment(jpeg, 0xe0, Buffer.alloc(0x2f2a - 2, 0x20)),
    text('*/=alert(1)/*'),
  ]),
  'a PNG that is a zip': Buffer.concat([png, zip]),
  'a PNG that is a page': Buffer.concat([png, page]),
  'a PNG with a script in its text': withPngChunk(png, 'tEXt', text('Comment\0<script>alert(1)</script>')),
  'a PNG with a zip in a chunk of its own': withZipChunk(png),
  'a PNG with another photo behind it': Buffer.concat([png, jpeg]),
  'a WebP that is a zip': Buffer.concat([webp, zip]),
  'a WebP with a page in a chunk': riff(canvasChunk(64, 48), lossyChunk(64, 48), riffChunk('XMP ', page)),
  'a HEIC that is a zip': Buffer.concat([heic, zip]),
  'a HEIC with a page in a free box': Buffer.concat([heic, box('free', page)]),
  'a HEIC with a zip in a free box': Buffer.concat([heic, box('free', zip)]),
});

/** Every file that must never lie in the storage folder. */
export const hostileFiles: readonly HostileFile[] = [
  { name: 'an empty file', bytes: Buffer.alloc(0), code: 'photo.empty' },
  {
    name: 'a JPEG of one byte too many',
    bytes: Buffer.concat([jpeg, Buffer.alloc(15_000_001 - jpeg.length)]),
    code: 'photo.too-large',
  },
  ...foreign,
  ...truncated,
  ...bombs,
  ...sizeless,
  ...polyglots,
];

function withSecondFrame(image: Buffer): Buffer {
  const start = image.indexOf(Buffer.from([0xff, 0xc0]));
  const frame = image.subarray(start, start + 2 + image.readUInt16BE(start + 2));
  const second = Buffer.from(frame);
  second.writeUInt16BE(4000, 5);
  second.writeUInt16BE(3000, 7);
  return Buffer.concat([image.subarray(0, start), frame, second, image.subarray(start + frame.length)]);
}

function withLength(image: Buffer, at: number, length: number): Buffer {
  const changed = Buffer.from(image);
  changed.writeUInt32BE(length, at);
  return changed;
}

function withLittleLength(image: Buffer, at: number, length: number): Buffer {
  const changed = Buffer.from(image);
  changed.writeUInt32LE(length, at);
  return changed;
}

function flipped(image: Buffer, at: number): Buffer {
  const changed = Buffer.from(image);
  changed.writeUInt8(changed.readUInt8(at) ^ 1, at);
  return changed;
}

/** The zip's comment is made to cover the rest of the PNG, so that it opens as both. */
function withZipChunk(image: Buffer): Buffer {
  const comment = 4 + 12; // the chunk's checksum and the end chunk
  const body = Buffer.from(zip);
  body.writeUInt16LE(comment, body.length - 2);
  return Buffer.concat([image.subarray(0, -12), pngChunk('vpAg', body), image.subarray(-12)]);
}
