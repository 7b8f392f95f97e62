/** Lossless WebP of one colour, 1 × 1: the smallest picture that decoders take. */
const ONE_PIXEL = Buffer.from([
  0x2f, 0x00, 0x00, 0x00, 0x00, 0x07, 0x10, 0xfd, 0x8f, 0xfe, 0x07, 0x22, 0xa2, 0xff, 0x01, 0x00,
]);

export function riffChunk(type: string, body: Buffer): Buffer {
  const head = Buffer.alloc(8);
  head.write(type, 'latin1');
  head.writeUInt32LE(body.length, 4);
  return Buffer.concat([head, body, Buffer.alloc(body.length % 2)]);
}

/** Frames chunks as a WebP file with the right length. */
export function riff(...chunks: Buffer[]): Buffer {
  const body = Buffer.concat([Buffer.from('WEBP'), ...chunks]);
  const head = Buffer.alloc(8);
  head.write('RIFF', 'latin1');
  head.writeUInt32LE(body.length, 4);
  return Buffer.concat([head, body]);
}

/** A lossless picture chunk that states the given size. */
export function losslessChunk(width = 1, height = 1): Buffer {
  const body = Buffer.from(ONE_PIXEL);
  body.writeUInt32LE((((width - 1) & 0x3fff) | (((height - 1) & 0x3fff) << 14)) >>> 0, 1);
  return riffChunk('VP8L', body);
}

/** A lossy key frame header that states the given size, with a few bytes behind it. */
export function lossyChunk(width: number, height: number): Buffer {
  const body = Buffer.alloc(24, 0x11);
  Buffer.from([0x30, 0x01, 0x00, 0x9d, 0x01, 0x2a]).copy(body);
  body.writeUInt16LE(width, 6);
  body.writeUInt16LE(height, 8);
  return riffChunk('VP8 ', body);
}

/** The extended header: flags and the size of the canvas. */
export function canvasChunk(width: number, height: number, flags = 0): Buffer {
  const body = Buffer.alloc(10);
  body[0] = flags;
  body.writeUIntLE(width - 1, 4, 3);
  body.writeUIntLE(height - 1, 7, 3);
  return riffChunk('VP8X', body);
}

export const aWebp = () => riff(losslessChunk());

/** A lossy picture of 32 × 24 as a browser's own encoder wrote it. */
const CODED = 'MAMAnQEqIAAYAD7RYqpPqCWkIigIAQAaCWkAAC6XjG2GAAD+83Lh1l16ndRTQAAA';

export const aLossyWebp = () => riff(riffChunk('VP8 ', Buffer.from(CODED, 'base64')));
