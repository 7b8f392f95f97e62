import { toDecimal } from '../units/decimal';
import type { Text } from '../locales/text';
import { onCircle, type Drawing, type Point, type Primitive } from './primitives';

export interface PlanViewInput {
  boltHoles: number;
  /** offsets from the straightedge to the substructure at both ends, inches */
  offsetAIn: number | null;
  offsetBIn: number | null;
  /** length between the measuring points, inches */
  lengthIn: number | null;
  /** two-hole error, degrees, positive when end A is farther out: counter-clockwise here; null before it is known */
  rotationDeg: number | null;
  /** the named direction in words; null before the tool pusher has named it */
  direction: Text | null;
  /** degrees clockwise from 12 o'clock to the named direction; null when it has no fixed bearing */
  bearingDeg: number | null;
  /** anything on it is outside a limit */
  outside: boolean;
}

const width = 360;
const height = 320;
const centre: Point = { x: 166, y: 170 };
const flange = 104;
const boltCircle = 85;
const bore = 50;
/** a real error of half a degree cannot be seen; the drawing leans ten times as far and says so */
const exaggeration = 10;
const beamTop = 24;

const beam = (y: number): Primitive[] => [
  { kind: 'hatch', x: 6, y, width: width - 12, height: 12, tone: 'soft' },
  { kind: 'line', from: { x: 6, y }, to: { x: width - 6, y }, line: 'thin', tone: 'ink' },
  { kind: 'line', from: { x: 6, y: y + 12 }, to: { x: width - 6, y: y + 12 }, line: 'thin', tone: 'ink' },
];

const holes = (count: number, lean: number): Primitive[] =>
  Array.from({ length: count }, (_, index) => onCircle(centre, boltCircle, lean + (360 / count) * (index + 0.5))).map(
    (at): Primitive => ({ kind: 'circle', at, radius: 6, line: 'thin', tone: 'ink', fill: 'sheet' }),
  );

/** The straightedge lies on the two holes nearest the beam and leans with the flange. */
const straightedge = (input: PlanViewInput, lean: number): Primitive[] => {
  const half = 116;
  const y = centre.y - boltCircle * Math.cos(Math.PI / input.boltHoles);
  const drop = half * Math.tan((lean * Math.PI) / 180);
  const ends = [
    { x: centre.x - half, y: y - drop },
    { x: centre.x + half, y: y + drop },
  ] as const;
  const offset = (end: Point, value: number | null): Primitive[] =>
    value === null
      ? []
      : [
          {
            kind: 'dimension',
            from: { x: end.x, y: beamTop + 12 },
            to: end,
            label: { amount: toDecimal(value), unit: 'in' },
            tone: 'ink',
          },
        ];
  return [
    { kind: 'line', from: ends[0], to: ends[1], line: 'thick', tone: 'straw' },
    ...offset({ x: ends[0].x + 12, y: ends[0].y }, input.offsetAIn),
    ...offset({ x: ends[1].x - 12, y: ends[1].y }, input.offsetBIn),
    ...(input.lengthIn === null
      ? []
      : [
          {
            kind: 'label' as const,
            // clear of flange and straightedge, however they lean
            at: { x: 10, y: height - 24 },
            text: {
              key: 'drawing.plan.straightedge',
              params: { length: { quantity: toDecimal(input.lengthIn), unit: 'in' } },
            },
            anchor: 'start' as const,
            size: 'small' as const,
            tone: 'soft' as const,
          },
        ]),
  ];
};

const valve = (input: PlanViewInput, lean: number): Primitive[] => {
  if (input.bearingDeg === null && input.direction === null) return [];
  const degrees = (input.bearingDeg ?? 90) + lean;
  const at = onCircle(centre, flange + 46, degrees);
  // at the side the words stand above the arrow's shaft, clear of the flange's edge
  const besides = (tip: Point): number =>
    tip.y > centre.y + 60
      ? height - 24
      : Math.abs(tip.x - centre.x) > 60
        ? Math.min(tip.y + flange * 0.62, height - 26)
        : tip.y + 26;
  return [
    {
      kind: 'arrow',
      from: onCircle(centre, flange, degrees),
      to: onCircle(centre, flange + 40, degrees),
      tone: 'ink',
      heavy: true,
    },
    ...(input.direction
      ? [
          {
            kind: 'label' as const,
            at: { x: at.x > centre.x + 60 ? width - 8 : Math.min(Math.max(at.x, 8), width - 8), y: besides(at) },
            text: input.direction,
            anchor:
              at.x > centre.x + 60 ? ('end' as const) : at.x < centre.x - 60 ? ('start' as const) : ('middle' as const),
            size: 'normal' as const,
            tone: 'ink' as const,
          },
        ]
      : []),
  ];
};

/**
 * The flange from above with its bolt circle, the straightedge through two holes, both offsets to the substructure and
 * the valve on its bearing. End A is the left one: where it is farther out, it is drawn farther out. The lean is drawn ten times as large as it is.
 */
export const planView = (input: PlanViewInput): Drawing => {
  const lean = Math.max(Math.min((0 - (input.rotationDeg ?? 0)) * exaggeration, 20), -20);
  const error: Primitive[] =
    input.rotationDeg === null
      ? []
      : [
          {
            kind: 'label',
            at: { x: centre.x, y: centre.y + 7 },
            text: { amount: toDecimal(Math.abs(input.rotationDeg), 2), unit: 'deg' },
            anchor: 'middle',
            size: 'large',
            tone: input.outside ? 'oxide' : 'ink',
            name: 'rotation',
          },
        ];
  return {
    width,
    height,
    primitives: [
      ...beam(beamTop),
      {
        kind: 'label',
        at: { x: 10, y: 17 },
        text: { key: 'drawing.plan.substructure' },
        anchor: 'start',
        size: 'small',
        tone: 'soft',
      },
      ...beam(height - 18),
      { kind: 'circle', at: centre, radius: flange, line: 'thick', tone: 'ink', fill: 'metal' },
      { kind: 'circle', at: centre, radius: boltCircle, line: 'centre', tone: 'soft', fill: 'none' },
      { kind: 'circle', at: centre, radius: bore + 14, line: 'thin', tone: 'ink', fill: 'none' },
      { kind: 'circle', at: centre, radius: bore + 8, line: 'thin', tone: 'ink', fill: 'none' },
      { kind: 'circle', at: centre, radius: bore, line: 'thick', tone: 'ink', fill: 'sheet' },
      ...holes(input.boltHoles, lean),
      ...straightedge(input, lean),
      ...valve(input, lean),
      ...error,
    ],
    alternative: [
      input.direction
        ? { key: 'drawing.plan.faces', params: { direction: input.direction } }
        : { key: 'drawing.plan.no-direction' },
      ...(input.offsetAIn === null || input.offsetBIn === null
        ? []
        : [
            {
              key: 'drawing.plan.offsets',
              params: {
                a: { quantity: toDecimal(input.offsetAIn), unit: 'in' },
                b: { quantity: toDecimal(input.offsetBIn), unit: 'in' },
              },
            },
          ]),
      ...(input.rotationDeg === null
        ? []
        : [
            {
              key: 'drawing.plan.rotation',
              params: { rotation: { quantity: toDecimal(Math.abs(input.rotationDeg), 2), unit: 'deg' } },
            },
          ]),
    ],
  };
};
