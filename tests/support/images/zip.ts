import { crc32 } from 'node:zlib';

/** A zip of one stored file, as an unpacker reads it. */
export function aZip(name: string, content: string): Buffer {
  const title = Buffer.from(name);
  const body = Buffer.from(content);
  const facts = Buffer.alloc(26);
  facts.writeUInt16LE(20, 0);
  facts.writeUInt32LE(crc32(body), 10);
  facts.writeUInt32LE(body.length, 14);
  facts.writeUInt32LE(body.length, 18);
  facts.writeUInt16LE(title.length, 22);
  const local = Buffer.concat([Buffer.from('PK\x03\x04'), facts, title, body]);
  const entry = Buffer.concat([Buffer.from('PK\x01\x02\x14\0'), facts, Buffer.alloc(14), title]);
  const end = Buffer.alloc(22);
  end.write('PK\x05\x06', 'latin1');
  end.writeUInt16LE(1, 8);
  end.writeUInt16LE(1, 10);
  end.writeUInt32LE(entry.length, 12);
  end.writeUInt32LE(local.length, 16);
  return Buffer.concat([local, entry, end]);
}
