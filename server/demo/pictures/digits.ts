import type { Canvas, Colour } from './canvas';

/** Which of the seven bars are lit: top, upper left, upper right, middle, lower left, lower right, bottom. */
const bars: Record<string, string> = {
  '0': '1110111',
  '1': '0010010',
  '2': '1011101',
  '3': '1011011',
  '4': '0111010',
  '5': '1101011',
  '6': '1101111',
  '7': '1010010',
  '8': '1111111',
  '9': '1111011',
  '-': '0001000',
};

/** Writes a number as an instrument's display does. `size` is the height of a digit. */
export function writeDigits(
  canvas: Canvas,
  text: string,
  left: number,
  top: number,
  size: number,
  colour: Colour,
): void {
  const [wide, bar, half] = [size * 0.5, Math.max(2, size * 0.12), size / 2];
  let x = left;
  for (const sign of text) {
    if (sign === '.') {
      canvas.rect(x - bar * 0.4, top + size - bar, bar, bar, colour);
      x += bar * 1.4;
      continue;
    }
    const places: [number, number, number, number][] = [
      [x, top, wide, bar],
      [x, top, bar, half],
      [x + wide - bar, top, bar, half],
      [x, top + half - bar / 2, wide, bar],
      [x, top + half, bar, half],
      [x + wide - bar, top + half, bar, half],
      [x, top + size - bar, wide, bar],
    ];
    places.forEach((place, index) => bars[sign]?.[index] === '1' && canvas.rect(...place, colour));
    x += wide + bar * 1.6;
  }
}
