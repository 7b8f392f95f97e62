import { MAX_RECORDER_BYTES } from '../../shared/photos/limits';
import type { RecorderRefusal } from '../../shared/photos/refusals';

const FIRST_LINES = 20;
const SEPARATORS = [',', ';', '\t'];
/** Control characters that no text file carries; tab, line feed and carriage return are left out. */
// eslint-disable-next-line no-control-regex
const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

/**
 * Judges a pressure recorder's file: UTF-8 text whose first lines form a table with a number in it.
 * What the columns mean is the reader's matter. Answers null when it is taken.
 */
export function inspectRecorderFile(bytes: Buffer): RecorderRefusal | null {
  if (bytes.length === 0) return 'recorder.empty';
  if (bytes.length > MAX_RECORDER_BYTES) return 'recorder.too-large';
  const text = utf8(bytes);
  if (text === null || CONTROL.test(text)) return 'recorder.not-text';
  const lines = text.slice(0, 65_536).split(/\r\n|\n|\r/, FIRST_LINES + 1);
  const filled = lines.slice(0, FIRST_LINES).filter((line) => line.trim() !== '');
  return isTable(filled) ? null : 'recorder.not-a-table';
}

/** Two lines in a row with the same separators, the second with a number; markup never counts as a table. */
function isTable(lines: readonly string[]): boolean {
  if (lines[0]?.trimStart().startsWith('<')) return false;
  return SEPARATORS.some((separator) =>
    lines.some((line, i) => {
      const next = lines[i + 1];
      if (next === undefined) return false;
      const columns = line.split(separator).length;
      return columns > 1 && columns === next.split(separator).length && /\d/.test(next);
    }),
  );
}

function utf8(bytes: Buffer): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}
