import { exifBlock, type ExifToWrite } from './exif';

/** One ISO box. */
export function box(type: string, ...bodies: Buffer[]): Buffer {
  const body = Buffer.concat(bodies);
  const head = Buffer.alloc(8);
  head.writeUInt32BE(body.length + 8, 0);
  head.write(type, 4, 'latin1');
  return Buffer.concat([head, body]);
}

const fullBox = (type: string, ...bodies: Buffer[]) => box(type, Buffer.alloc(4), ...bodies);

function sizeBox(width: number, height: number): Buffer {
  const body = Buffer.alloc(8);
  body.writeUInt32BE(width, 0);
  body.writeUInt32BE(height, 4);
  return fullBox('ispe', body);
}

export interface HeicToMake {
  width?: number;
  height?: number;
  /** Anticlockwise quarter turns. */
  quarters?: number;
  exif?: ExifToWrite;
  brands?: string[];
}

/** The skeleton of a HEIC as phones write it: brands, one picture's properties, and coded data of no meaning. */
export function aHeic({
  width = 4032,
  height = 3024,
  quarters,
  exif,
  brands = ['heic', 'mif1', 'heic'],
}: HeicToMake = {}): Buffer {
  const [major = 'heic', ...compatible] = brands;
  const properties = [sizeBox(width, height)];
  if (quarters !== undefined) properties.push(box('irot', Buffer.from([quarters])));
  const coded = exif ? Buffer.concat([Buffer.from('\0\0\0\x06Exif\0\0', 'latin1'), exifBlock(exif)]) : Buffer.alloc(0);
  return Buffer.concat([
    box('ftyp', Buffer.from(major), Buffer.alloc(4), ...compatible.map((brand) => Buffer.from(brand))),
    fullBox('meta', fullBox('hdlr', Buffer.from('\0\0\0\0pict')), box('iprp', box('ipco', ...properties))),
    box('mdat', coded, Buffer.alloc(64, 0x5a)),
  ]);
}
