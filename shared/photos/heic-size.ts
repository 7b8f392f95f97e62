/**
 * The upright size that a HEIC states, for browsers that cannot show one: its properties are found by their letters
 * near the start of the file. Pixels; null when nothing is stated. The server walks the whole structure.
 */
export function heicSizeOf(head: Uint8Array): { width: number; height: number } | null {
  const view = new DataView(head.buffer, head.byteOffset, head.byteLength);
  let largest = { width: 0, height: 0 };
  let lying = false;
  for (let at = 4; at + 16 <= head.length; at += 1) {
    if (head[at] !== 0x69) continue; // i
    const name = String.fromCharCode(...head.subarray(at, at + 4));
    if (name === 'ispe') {
      const size = { width: view.getUint32(at + 8), height: view.getUint32(at + 12) };
      if (size.width * size.height > largest.width * largest.height) largest = size;
    } else if (name === 'irot') lying ||= ((head[at + 4] ?? 0) & 1) === 1;
  }
  if (largest.width === 0) return null;
  return lying ? { width: largest.height, height: largest.width } : largest;
}
