import type { Text } from '../locales/text';

/** Line kinds of ISO 128-2: thick outlines, thin edges, dashed hidden, chain-dotted centre lines. */
export type LineKind = 'thick' | 'thin' | 'dashed' | 'centre' | 'dotted';
/** What a mark means; the theme gives it a colour, print gives it black. */
export type Tone = 'ink' | 'soft' | 'hairline' | 'straw' | 'purple' | 'blue' | 'oxide' | 'within';

/** A number to be printed in the reader's own units, or a sentence, or words that are the same in every language. */
export type Label =
  { amount: string; unit: string; /** without the unit: it stands beside the drawing */ bare?: true } | Text | string;

export interface Point {
  x: number;
  y: number;
}

export type Primitive =
  | { kind: 'line'; from: Point; to: Point; line: LineKind; tone: Tone }
  | { kind: 'path'; d: string; line: LineKind; tone: Tone; fill: Tone | 'metal' | 'sheet' | 'none' }
  | { kind: 'circle'; at: Point; radius: number; line: LineKind; tone: Tone; fill: Tone | 'metal' | 'sheet' | 'none' }
  | { kind: 'hatch'; x: number; y: number; width: number; height: number; tone: Tone }
  | { kind: 'arrow'; from: Point; to: Point; tone: Tone; heavy: boolean }
  | { kind: 'dimension'; from: Point; to: Point; label: Label; tone: Tone }
  | {
      kind: 'label';
      at: Point;
      text: Label;
      anchor: 'start' | 'middle' | 'end';
      size: 'small' | 'normal' | 'large';
      tone: Tone;
      name?: string;
    };

/** A drawing before it is rendered: the same primitives make the screen and the printed page. Units of the view box. */
export interface Drawing {
  width: number;
  height: number;
  primitives: Primitive[];
  /** the same numbers in words, for who does not see it */
  alternative: Text[];
}

/** A point on a circle by degrees clockwise from 12 o'clock, seen from above. */
export const onCircle = (centre: Point, radius: number, degrees: number): Point => {
  const angle = (degrees * Math.PI) / 180;
  return { x: centre.x + radius * Math.sin(angle), y: centre.y - radius * Math.cos(angle) };
};
