import { MOST_PARTS, type PixelSize, type StructureResult } from './structure';

interface Box {
  type: string;
  start: number;
  body: number;
  end: number;
}

/** Walks a HEIC's boxes (ISO/IEC 14496-12 and 23008-12): sizes stand in `ispe`, turning in `irot`. */
export function walkHeic(bytes: Buffer): StructureResult {
  const boxes = boxesIn(bytes, 0, bytes.length);
  if (!boxes) return 'photo.truncated';
  const meta = boxes.find((box) => box.type === 'meta');
  const hasPixels = boxes.some((box) => box.type === 'mdat') || bytes.includes('idat', meta?.body);
  if (!meta || !hasPixels) return 'photo.truncated';
  const inMeta = boxesIn(bytes, meta.body + 4, meta.end); // `meta` is a full box: version and flags come first
  const properties = inMeta?.find((box) => box.type === 'iprp');
  const container = properties && boxesIn(bytes, properties.body, properties.end)?.find((box) => box.type === 'ipco');
  const list = container && boxesIn(bytes, container.body, container.end);
  if (!list) return 'photo.truncated';
  const sizes: PixelSize[] = [];
  for (const box of list.filter((each) => each.type === 'ispe')) {
    if (box.end - box.body < 12) return 'photo.truncated';
    sizes.push({ width: bytes.readUInt32BE(box.body + 4), height: bytes.readUInt32BE(box.body + 8) });
  }
  if (sizes.length === 0) return 'photo.truncated';
  const exif = exifIn(bytes);
  return {
    end: bytes.length,
    headerEnd: meta.end,
    sizes,
    orientation: turnOf(bytes, list),
    texts: boxes.filter((box) => box.type !== 'mdat').map((box) => bytes.subarray(box.body, box.end)),
    ...(exif && { exif }),
  };
}

/** The boxes that fill a stretch exactly, or null when one overflows it. */
function boxesIn(bytes: Buffer, from: number, to: number): Box[] | null {
  const boxes: Box[] = [];
  for (let at = from; at < to;) {
    if (at + 8 > to || boxes.length > MOST_PARTS) return null;
    const type = bytes.toString('latin1', at + 4, at + 8);
    let size = bytes.readUInt32BE(at);
    let body = at + 8;
    if (size === 1) {
      if (at + 16 > to) return null;
      const large = bytes.readBigUInt64BE(at + 8);
      if (large > BigInt(to)) return null;
      size = Number(large);
      body = at + 16;
    } else if (size === 0) size = to - at; // runs to the end
    if (size < body - at || at + size > to) return null;
    boxes.push({ type, start: at, body, end: at + size });
    at += size;
  }
  return boxes;
}

/** `irot` counts quarter turns anticlockwise; EXIF's numbers name the same turns. */
function turnOf(bytes: Buffer, properties: Box[]): number {
  const turn = properties.find((box) => box.type === 'irot' && box.end > box.body);
  const quarters = turn ? (bytes[turn.body] ?? 0) & 3 : 0;
  return [1, 8, 3, 6][quarters] ?? 1;
}

/** The EXIF item lies among the coded data; its prefix and byte order mark are found by their letters. */
function exifIn(bytes: Buffer): Buffer | undefined {
  for (const order of ['MM\0*', 'II*\0']) {
    const at = bytes.indexOf(`Exif\0\0${order}`, 0, 'latin1');
    if (at >= 0) return bytes.subarray(at + 6, at + 6 + 65_536);
  }
  return undefined;
}
