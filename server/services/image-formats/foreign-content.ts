/** Markup, scripts and documents that have no business in or behind a photo. */
const FOREIGN_TEXT =
  /<(?:html|script|body|iframe|svg|object|embed)[\s>/]|<!doctype\s+html|<\?php[\s]|<\?xml-stylesheet|%PDF-\d|javascript:/i;

/** Scripts and markup alone: names that editors never write into a photo's own metadata. */
const SCRIPT_IN_METADATA = /<(?:html|script|iframe)[\s>/]|<!doctype\s+html|<\?php[\s]/i;

/** Programs and archives that start right behind the image. */
const FOREIGN_STARTS = ['Rar!\x1a\x07', "7z\xbc\xaf'\x1c", '\x7fELF', 'PK\x03\x04', '#!/', '*/', 'GIF8'];

const END_OF_DIRECTORY = 'PK\x05\x06';
const END_OF_DIRECTORY_LENGTH = 22;
const LONGEST_COMMENT = 65_535;

/**
 * Is the file something else as well: a zip, a page, a script, a PDF? Bytes behind the image alone are no reason:
 * phones append depth maps, further pictures and short films, and an original is kept as it is.
 */
export function hasForeignContent(bytes: Buffer, end: number, texts: readonly Buffer[]): boolean {
  const head = bytes.toString('latin1', 0, 1024); // where PDF readers look for their header
  if (/%PDF-\d/.test(head)) return true;
  const tail = bytes.toString('latin1', end);
  if (FOREIGN_STARTS.some((start) => tail.startsWith(start)) || FOREIGN_TEXT.test(tail)) return true;
  if (texts.some((text) => SCRIPT_IN_METADATA.test(text.toString('latin1')))) return true;
  return endsAsZip(bytes);
}

/** A zip is read from its end: a directory record whose comment runs exactly to the last byte. */
function endsAsZip(bytes: Buffer): boolean {
  const tail = bytes.subarray(Math.max(0, bytes.length - END_OF_DIRECTORY_LENGTH - LONGEST_COMMENT));
  let at = tail.indexOf(END_OF_DIRECTORY, 0, 'latin1');
  while (at >= 0 && at + END_OF_DIRECTORY_LENGTH <= tail.length) {
    if (at + END_OF_DIRECTORY_LENGTH + tail.readUInt16LE(at + 20) === tail.length) return true;
    at = tail.indexOf(END_OF_DIRECTORY, at + 1, 'latin1');
  }
  return false;
}
