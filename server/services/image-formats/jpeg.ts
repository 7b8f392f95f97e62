import { MOST_PARTS, type PixelSize, type StructureResult } from './structure';

const APP0 = 0xe0;
const APP1 = 0xe1;
const COMMENT = 0xfe;
const START_OF_SCAN = 0xda;
const END_OF_IMAGE = 0xd9;
/** Start of frame: C0 to CF but for the tables DHT (C4) and DAC (CC) and the reserved C8. */
const isFrame = (marker: number) => marker >= 0xc0 && marker <= 0xcf && ![0xc4, 0xc8, 0xcc].includes(marker);
/** Markers without a length: TEM, the restarts and a start of image. */
const isBare = (marker: number) => marker === 0x01 || (marker >= 0xd0 && marker <= 0xd8);

/** Walks a JPEG's segments and scans to its end of image (ITU-T T.81, annex B). */
export function walkJpeg(bytes: Buffer): StructureResult {
  const sizes: PixelSize[] = [];
  const texts: Buffer[] = [];
  let exif: Buffer | undefined;
  let headerEnd = 0;
  let scans = 0;
  let parts = 0;
  let at = 2;
  while (at + 1 < bytes.length) {
    if (bytes[at] !== 0xff) return 'photo.truncated';
    const marker = bytes[at + 1] ?? 0;
    if (marker === 0xff) {
      at += 1;
      continue;
    }
    at += 2;
    parts += 1;
    if (parts > MOST_PARTS) return 'photo.truncated';
    if (marker === END_OF_IMAGE) {
      if (scans === 0 || sizes.length === 0) return 'photo.truncated';
      return { end: at, headerEnd, sizes, texts, ...(exif && { exif }) };
    }
    if (isBare(marker)) continue;
    if (at + 2 > bytes.length) return 'photo.truncated';
    const length = bytes.readUInt16BE(at);
    if (length < 2 || at + length > bytes.length) return 'photo.truncated';
    const body = bytes.subarray(at + 2, at + length);
    at += length;
    if (isFrame(marker)) {
      if (body.length < 6) return 'photo.truncated';
      sizes.push({ height: body.readUInt16BE(1), width: body.readUInt16BE(3) });
      headerEnd ||= at;
    } else if (marker === COMMENT || (marker >= APP0 && marker <= 0xef)) {
      texts.push(body);
      if (marker === APP1 && !exif && body.subarray(0, 6).toString('latin1') === 'Exif\0\0') exif = body.subarray(6);
      // A first segment as long as the letters for "comment opens": the rest of the file reads as a script.
      if (marker === APP0 && length === 0x2f2a) return 'photo.polyglot';
    } else if (marker === START_OF_SCAN) {
      if (sizes.length === 0) return 'photo.truncated';
      scans += 1;
      at = endOfScan(bytes, at);
    }
  }
  return 'photo.truncated';
}

/** Offset of the next marker behind entropy-coded data: stuffed zeros and restarts belong to the scan. */
function endOfScan(bytes: Buffer, start: number): number {
  let at = bytes.indexOf(0xff, start);
  while (at >= 0 && at + 1 < bytes.length) {
    const next = bytes[at + 1] ?? 0;
    if (next !== 0x00 && next !== 0xff && !(next >= 0xd0 && next <= 0xd7)) return at;
    at = bytes.indexOf(0xff, next === 0xff ? at + 1 : at + 2);
  }
  return bytes.length;
}
