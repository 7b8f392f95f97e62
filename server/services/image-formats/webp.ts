import { MOST_PARTS, type PixelSize, type StructureResult } from './structure';

/** Walks a WebP's RIFF chunks (RFC 9649); the canvas and every picture in it state a size. */
export function walkWebp(bytes: Buffer): StructureResult {
  if (bytes.length < 20) return 'photo.truncated';
  const end = 8 + bytes.readUInt32LE(4);
  if (end > bytes.length || end < 20) return 'photo.truncated';
  const sizes: PixelSize[] = [];
  const texts: Buffer[] = [];
  let exif: Buffer | undefined;
  let hasPixels = false;
  for (let at = 12, parts = 0; at < end; parts += 1) {
    if (at + 8 > end || parts > MOST_PARTS) return 'photo.truncated';
    const type = bytes.toString('latin1', at, at + 4);
    const length = bytes.readUInt32LE(at + 4);
    if (at + 8 + length > end) return 'photo.truncated';
    const body = bytes.subarray(at + 8, at + 8 + length);
    if (type === 'VP8 ' || type === 'VP8L' || type === 'VP8X') {
      const size = type === 'VP8 ' ? lossySize(body) : type === 'VP8L' ? losslessSize(body) : canvasSize(body);
      if (!size) return 'photo.truncated';
      sizes.push(size);
      hasPixels ||= type !== 'VP8X';
    } else if (type === 'ANMF' || type === 'ANIM') {
      return 'photo.not-an-image'; // moving pictures are no evidence of a reading
    } else if (type === 'EXIF') {
      // Some writers put JPEG's prefix in front of the TIFF block.
      exif = body.subarray(0, 6).toString('latin1') === 'Exif\0\0' ? body.subarray(6) : body;
      texts.push(body);
    } else if (type !== 'ALPH') texts.push(body);
    at += 8 + length + (length % 2);
  }
  if (!hasPixels) return 'photo.truncated';
  return { end, headerEnd: 30, sizes, texts, ...(exif && { exif }) };
}

function canvasSize(body: Buffer): PixelSize | null {
  if (body.length < 10) return null;
  return { width: 1 + body.readUIntLE(4, 3), height: 1 + body.readUIntLE(7, 3) };
}

function lossySize(body: Buffer): PixelSize | null {
  if (body.length < 10 || body.readUIntBE(3, 3) !== 0x9d012a) return null;
  return { width: body.readUInt16LE(6) & 0x3fff, height: body.readUInt16LE(8) & 0x3fff };
}

function losslessSize(body: Buffer): PixelSize | null {
  if (body.length < 5 || body[0] !== 0x2f) return null;
  const bits = body.readUInt32LE(1);
  return { width: 1 + (bits & 0x3fff), height: 1 + ((bits >>> 14) & 0x3fff) };
}
