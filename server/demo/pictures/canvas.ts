import { writePng } from './png';

export type Colour = readonly [red: number, green: number, blue: number];

export const width = 640;
export const height = 480;

type Box = readonly [left: number, top: number, right: number, bottom: number];

const clamp = (part: number): number => Math.min(255, Math.max(0, part));

/** A small picture, drawn by painting every pixel that lies within a shape. Lengths in pixels, y grows downwards. */
export class Canvas {
  private readonly pixels = Buffer.alloc(width * height * 3);

  /** Steel, earth or sky in one colour, with the grain that a camera sees in the dark; `seed` changes it. */
  constructor(ground: Colour, seed: number) {
    let grain = (seed + 1) * 7919;
    this.paint([0, 0, width, height], () => {
      grain = (grain * 1_103_515_245 + 12_345) % 2_147_483_648;
      const shift = (grain % 17) - 8;
      return [clamp(ground[0] + shift), clamp(ground[1] + shift), clamp(ground[2] + shift)];
    });
  }

  private paint([left, top, right, bottom]: Box, colour: (x: number, y: number) => Colour | null): this {
    const [endX, endY] = [Math.min(width - 1, Math.ceil(right)), Math.min(height - 1, Math.ceil(bottom))];
    for (let y = Math.max(0, Math.floor(top)); y <= endY; y += 1) {
      for (let x = Math.max(0, Math.floor(left)); x <= endX; x += 1) {
        const found = colour(x, y);
        if (found) this.pixels.set(found, (y * width + x) * 3);
      }
    }
    return this;
  }

  rect(left: number, top: number, wide: number, high: number, colour: Colour): this {
    return this.paint([left, top, left + wide - 1, top + high - 1], () => colour);
  }

  /** A ring between two radii; a disc when the inner one is 0. */
  ring(cx: number, cy: number, inner: number, outer: number, colour: Colour): this {
    return this.paint([cx - outer, cy - outer, cx + outer, cy + outer], (x, y) => {
      const distance = Math.hypot(x - cx, y - cy);
      return distance >= inner && distance <= outer ? colour : null;
    });
  }

  line(x1: number, y1: number, x2: number, y2: number, thick: number, colour: Colour): this {
    const length = Math.hypot(x2 - x1, y2 - y1);
    const box: Box = [
      Math.min(x1, x2) - thick,
      Math.min(y1, y2) - thick,
      Math.max(x1, x2) + thick,
      Math.max(y1, y2) + thick,
    ];
    return this.paint(box, (x, y) => {
      const along = ((x - x1) * (x2 - x1) + (y - y1) * (y2 - y1)) / length ** 2;
      const across = Math.abs((x - x1) * (y2 - y1) - (y - y1) * (x2 - x1)) / length;
      return along >= 0 && along <= 1 && across <= thick / 2 ? colour : null;
    });
  }

  png(): Buffer {
    return writePng(width, height, this.pixels);
  }
}
