import type { PhotoType } from './limits';

/** How many bytes from the start `photoTypeOf` wants to see. */
export const SIGNATURE_BYTES = 64;

/** The brands of a still picture in HEIC; sequences and other codecs are not taken. */
const HEIC_MAJOR = ['heic', 'heix', 'mif1'];
const HEIC_CODED = ['heic', 'heix'];

/**
 * What a file is by its first bytes, never by its name: one of the four kinds of photo, or null.
 * The whole file is judged by the server; this is enough to turn away at the phone what is plainly no photo.
 */
export function photoTypeOf(head: Uint8Array): PhotoType | null {
  if (startsWith(head, 0, [0xff, 0xd8, 0xff])) return 'image/jpeg';
  if (startsWith(head, 0, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return 'image/png';
  if (fourLetters(head, 0) === 'RIFF' && fourLetters(head, 8) === 'WEBP') return 'image/webp';
  if (isHeic(head)) return 'image/heic';
  return null;
}

function isHeic(head: Uint8Array): boolean {
  if (fourLetters(head, 4) !== 'ftyp') return false;
  const major = fourLetters(head, 8);
  if (!HEIC_MAJOR.includes(major)) return false;
  const boxEnd = Math.min(head.length, ((head[2] ?? 0) << 8) | (head[3] ?? 0));
  const brands = [major];
  for (let at = 16; at + 4 <= boxEnd; at += 4) brands.push(fourLetters(head, at));
  return brands.some((brand) => HEIC_CODED.includes(brand));
}

function startsWith(bytes: Uint8Array, at: number, wanted: readonly number[]): boolean {
  return wanted.every((byte, i) => bytes[at + i] === byte);
}

function fourLetters(bytes: Uint8Array, at: number): string {
  return String.fromCharCode(...bytes.subarray(at, at + 4));
}
