import type { Text } from '../locales/text';
import { toDecimal } from '../units/decimal';
import type { Tone } from './primitives';
import { onCircle, type Drawing, type Point, type Primitive } from './primitives';

export type Quarter = '12' | '3' | '6' | '9';
export const quarterDegrees: Record<Quarter, number> = { '12': 0, '3': 90, '6': 180, '9': 270 };

export interface QuadrantClockInput {
  /** readings at the clock positions, in `unit`; what is not read yet is left out */
  values: Partial<Record<Quarter, number>>;
  unit: string;
  /** degrees clockwise from 12 o'clock to the low side; null when there is none or it is level */
  lowSideDegrees: number | null;
  /** positions that are outside their limit */
  outside?: readonly Quarter[];
}

const width = 360;
const height = 196;
const centre: Point = { x: 180, y: 102 };
const radius = 62;

/** Where number and clock hour stand, so that they never touch the circle or each other. */
const places: Record<
  Quarter,
  { hour: Point; value: Point; anchor: 'start' | 'middle' | 'end'; hourAnchor: 'start' | 'middle' | 'end' }
> = {
  '12': { hour: { x: 180, y: 13 }, value: { x: 180, y: 33 }, anchor: 'middle', hourAnchor: 'middle' },
  '3': { hour: { x: 256, y: 90 }, value: { x: 256, y: 112 }, anchor: 'start', hourAnchor: 'start' },
  '6': { hour: { x: 140, y: 190 }, value: { x: 180, y: 190 }, anchor: 'middle', hourAnchor: 'end' },
  '9': { hour: { x: 104, y: 90 }, value: { x: 104, y: 112 }, anchor: 'end', hourAnchor: 'end' },
};

const quarters: readonly Quarter[] = ['12', '3', '6', '9'];

const lowSide = (degrees: number): Primitive[] => {
  const tip = onCircle(centre, radius - 6, degrees);
  // in the nearest corner between two numbers, so that words never cover a reading
  const corner = (Math.floor((((degrees % 360) + 360) % 360) / 90) + 0.5) * 90;
  const free = onCircle(centre, radius + 14, corner);
  const anchor = free.x > centre.x ? 'start' : 'end';
  return [
    { kind: 'arrow', from: centre, to: tip, tone: 'oxide', heavy: false },
    { kind: 'label', at: free, text: { key: 'drawing.clock.low-side' }, anchor, size: 'small', tone: 'oxide' },
  ];
};

/**
 * The clock face of a quadrant reading: the casing from above, 12 o'clock towards the V-door, a number at each quarter
 * and an arrow to the low side.
 */
export const quadrantClock = ({ values, unit, lowSideDegrees, outside = [] }: QuadrantClockInput): Drawing => {
  const numbers = quarters.flatMap((quarter): Primitive[] => {
    const { hour, value, anchor, hourAnchor } = places[quarter];
    const reading = values[quarter];
    const tone: Tone = outside.includes(quarter) ? 'oxide' : 'ink';
    return [
      { kind: 'label', at: hour, text: quarter, anchor: hourAnchor, size: 'small', tone: 'soft' },
      {
        kind: 'label',
        at: value,
        text: reading === undefined ? '–' : { amount: toDecimal(reading), unit, bare: true },
        anchor,
        size: 'large',
        tone: reading === undefined ? 'soft' : tone,
        name: quarter,
      },
    ];
  });
  return {
    width,
    height,
    primitives: [
      { kind: 'circle', at: centre, radius, line: 'thick', tone: 'ink', fill: 'sheet' },
      { kind: 'circle', at: centre, radius: radius - 6, line: 'thin', tone: 'ink', fill: 'none' },
      ...quarters.map((quarter): Primitive => ({
        kind: 'line',
        from: onCircle(centre, radius - 6, quarterDegrees[quarter]),
        to: onCircle(centre, radius + 4, quarterDegrees[quarter]),
        line: 'thin',
        tone: 'ink',
      })),
      ...numbers,
      ...(lowSideDegrees === null ? [] : lowSide(lowSideDegrees)),
    ],
    alternative: [
      ...quarters.map((quarter): Text =>
        values[quarter] === undefined
          ? { key: 'drawing.clock.not-read', params: { quarter } }
          : { key: 'drawing.clock.reads', params: { quarter, value: { quantity: toDecimal(values[quarter]), unit } } },
      ),
      ...(lowSideDegrees === null
        ? []
        : [
            {
              key: 'drawing.clock.low-side-at',
              params: { degrees: { quantity: toDecimal(lowSideDegrees, 0), unit: 'deg' } },
            },
          ]),
    ],
  };
};
