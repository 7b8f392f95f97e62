import { crc32 } from 'node:zlib';
import jpeg from 'jpeg-js';
import { PNG } from 'pngjs';
import { exifBlock, type ExifToWrite } from './exif';

/** A real JPEG of the given size, coded by an encoder: a slope of grey with a mark in its upper left corner. */
export function aJpeg(width = 64, height = 48, exif?: ExifToWrite): Buffer {
  const coded = Buffer.from(jpeg.encode({ data: pixels(width, height), width, height }, 80).data);
  return exif ? withExif(coded, exif) : coded;
}

/** Puts an APP1 segment right behind the start of image, as cameras do. */
export function withExif(image: Buffer, exif: ExifToWrite): Buffer {
  const block = Buffer.concat([Buffer.from('Exif\0\0', 'latin1'), exifBlock(exif)]);
  return withSegment(image, 0xe1, block);
}

/** Puts a segment of any marker right behind the start of image. */
export function withSegment(image: Buffer, marker: number, body: Buffer): Buffer {
  const head = Buffer.from([0xff, marker, 0, 0]);
  head.writeUInt16BE(body.length + 2, 2);
  return Buffer.concat([image.subarray(0, 2), head, body, image.subarray(2)]);
}

/** Overwrites the size in a JPEG's frame header; the pixels behind it stay as they are. */
export function withJpegSize(image: Buffer, width: number, height: number): Buffer {
  const changed = Buffer.from(image);
  const frame = changed.indexOf(Buffer.from([0xff, 0xc0]));
  changed.writeUInt16BE(height, frame + 5);
  changed.writeUInt16BE(width, frame + 7);
  return changed;
}

/** A real PNG of the given size. */
export function aPng(width = 40, height = 30): Buffer {
  const image = new PNG({ width, height });
  pixels(width, height).copy(image.data);
  return PNG.sync.write(image);
}

/** One chunk with its right checksum. */
export function pngChunk(type: string, body: Buffer): Buffer {
  const named = Buffer.concat([Buffer.from(type, 'latin1'), body]);
  const framed = Buffer.alloc(named.length + 8);
  framed.writeUInt32BE(body.length, 0);
  named.copy(framed, 4);
  framed.writeUInt32BE(crc32(named), named.length + 4);
  return framed;
}

/** Puts a chunk behind the header of a PNG. */
export function withPngChunk(image: Buffer, type: string, body: Buffer): Buffer {
  return Buffer.concat([image.subarray(0, 33), pngChunk(type, body), image.subarray(33)]);
}

/** Overwrites the size in a PNG's header and mends its checksum. */
export function withPngSize(image: Buffer, width: number, height: number): Buffer {
  const header = Buffer.from(image.subarray(16, 29));
  header.writeUInt32BE(width, 0);
  header.writeUInt32BE(height, 4);
  return Buffer.concat([image.subarray(0, 8), pngChunk('IHDR', header), image.subarray(33)]);
}

function pixels(width: number, height: number): Buffer {
  const data = Buffer.alloc(width * height * 4);
  for (let i = 0; i < width * height; i += 1) {
    const x = i % width;
    const y = Math.floor(i / width);
    const mark = x < width / 4 && y < height / 4 ? 255 : 0;
    data.writeUInt32BE(((((x * 7) & 0xff) << 24) | (((y * 5) & 0xff) << 16) | (mark << 8) | 0xff) >>> 0, i * 4);
  }
  return data;
}
