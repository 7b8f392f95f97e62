/** What a camera writes: little-endian or big-endian TIFF with orientation and, if wanted, the time. */
export interface ExifToWrite {
  orientation?: number;
  /** `2026:03:02 03:10:05` */
  takenAt?: string;
  /** `-06:00` */
  offset?: string;
  bigEndian?: boolean;
}

interface Entry {
  tag: number;
  type: 2 | 3 | 4;
  value: string | number;
}

/** A TIFF block: IFD0 with the orientation, and an Exif IFD with the time. */
export function exifBlock({ orientation, takenAt, offset, bigEndian = false }: ExifToWrite): Buffer {
  const exif: Entry[] = [];
  if (takenAt) exif.push({ tag: 0x9003, type: 2, value: `${takenAt}\0` });
  if (offset) exif.push({ tag: 0x9011, type: 2, value: `${offset}\0` });
  const main: Entry[] = [];
  if (orientation !== undefined) main.push({ tag: 0x0112, type: 3, value: orientation });
  const mainLength = directoryLength(main.length + (exif.length > 0 ? 1 : 0));
  if (exif.length > 0) main.push({ tag: 0x8769, type: 4, value: 8 + mainLength });
  const head = Buffer.alloc(8);
  head.write(bigEndian ? 'MM' : 'II', 'latin1');
  u16(head, 42, 2, bigEndian);
  u32(head, 8, 4, bigEndian);
  const parts = [head, directory(main, 8, bigEndian)];
  if (exif.length > 0) parts.push(directory(exif, 8 + mainLength, bigEndian));
  return Buffer.concat(parts);
}

const directoryLength = (entries: number) => 2 + entries * 12 + 4;

function directory(entries: readonly Entry[], at: number, bigEndian: boolean): Buffer {
  const table = Buffer.alloc(directoryLength(entries.length));
  const texts: Buffer[] = [];
  let textAt = at + table.length;
  u16(table, entries.length, 0, bigEndian);
  entries.forEach(({ tag, type, value }, i) => {
    const slot = 2 + i * 12;
    u16(table, tag, slot, bigEndian);
    u16(table, type, slot + 2, bigEndian);
    u32(table, typeof value === 'string' ? value.length : 1, slot + 4, bigEndian);
    if (typeof value === 'string') {
      const text = Buffer.from(value, 'latin1');
      if (text.length <= 4) text.copy(table, slot + 8);
      else {
        u32(table, textAt, slot + 8, bigEndian);
        texts.push(text);
        textAt += text.length;
      }
    } else if (type === 3) u16(table, value, slot + 8, bigEndian);
    else u32(table, value, slot + 8, bigEndian);
  });
  return Buffer.concat([table, ...texts]);
}

function u16(into: Buffer, value: number, at: number, bigEndian: boolean): void {
  if (bigEndian) into.writeUInt16BE(value, at);
  else into.writeUInt16LE(value, at);
}

function u32(into: Buffer, value: number, at: number, bigEndian: boolean): void {
  if (bigEndian) into.writeUInt32BE(value, at);
  else into.writeUInt32LE(value, at);
}
