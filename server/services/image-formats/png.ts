import { crc32 } from 'node:zlib';
import { MOST_PARTS, type PixelSize, type StructureResult } from './structure';

const SIGNATURE_LENGTH = 8;
const TEXT_CHUNKS = ['tEXt', 'iTXt', 'zTXt'];

/** Walks a PNG's chunks, checking each length and checksum, to its IEND (W3C PNG, third edition, chapter 5). */
export function walkPng(bytes: Buffer): StructureResult {
  const texts: Buffer[] = [];
  let size: PixelSize | undefined;
  let exif: Buffer | undefined;
  let hasPixels = false;
  let at = SIGNATURE_LENGTH;
  for (let parts = 0; parts < MOST_PARTS && at + 12 <= bytes.length; parts += 1) {
    const length = bytes.readUInt32BE(at);
    const type = bytes.toString('latin1', at + 4, at + 8);
    const end = at + 12 + length;
    if (end > bytes.length || !/^[A-Za-z]{4}$/.test(type)) return 'photo.truncated';
    const body = bytes.subarray(at + 8, at + 8 + length);
    // The header comes first, once, and is 13 bytes long; a second one could state another size.
    if ((type === 'IHDR') !== (at === SIGNATURE_LENGTH)) return 'photo.truncated';
    if (crc32(bytes.subarray(at + 4, end - 4)) !== bytes.readUInt32BE(end - 4)) return 'photo.truncated';
    if (type === 'IHDR') {
      if (length !== 13) return 'photo.truncated';
      size = { width: body.readUInt32BE(0), height: body.readUInt32BE(4) };
    } else if (type === 'IDAT') hasPixels ||= length > 0;
    else if (type === 'eXIf') exif = body;
    else if (type === 'IEND') {
      if (!size || !hasPixels) return 'photo.truncated';
      return { end, headerEnd: 33, sizes: [size], texts, ...(exif && { exif }) };
    } else if (TEXT_CHUNKS.includes(type)) texts.push(body);
    at = end;
  }
  return 'photo.truncated';
}
