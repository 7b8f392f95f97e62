import { describe, expect, it } from 'vitest';
import { fieldAfter, nextSteps } from '../../../src/components/hold-point/next-step';
import type { Verdict } from '../../../shared/hold-points/verdict';
import { reviewPoint } from '../../../shared/job/review';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';

const gone = { act: 'final-cut', begun: '2026-09-14T11:50:00.000Z', ended: '2026-09-14T11:55:00.000Z' };
const measured: ReadingSpecs = {
  'fluid.below-weld': 60,
  'fluid.no-water': 'yes',
  'string.a': 0,
  'string.b': 0,
  'cut.12': 8,
  'cut.3': 8,
  'cut.6': 8,
  'cut.9': 8,
  visual: 'yes',
};
const earlier = [
  {
    kind: 'height-takeoff' as const,
    readings: { 'string.a': 0, 'string.b': 0, 'stub-top': -2, 'takeoff.first': 14, 'takeoff.second': 14 },
  },
];

const at = (spec: {
  readings?: ReadingSpecs;
  acts?: (typeof gone | { act: string; begun: string })[];
  photos?: boolean;
}) => {
  const { state, point } = aPointContext({ kind: 'final-cut', earlier, readings: spec.readings, acts: spec.acts });
  const photo = (shot: string) => ({ shot, setAside: null, late: false }) as never;
  const shown = spec.photos ? { ...point, photos: ['wraparound-on-mark', 'finished-cut'].map(photo) } : point;
  return { review: reviewPoint(state, shown), point: shown };
};
const free = (): readonly Verdict[] => [];
const stop = (about: string[]): Verdict =>
  ({ limit: 'gas-fresh', kind: 'stop', outcome: 'outside', about, basis: [] }) as unknown as Verdict;

describe('the next step at an open point', () => {
  it('begins the work as soon as nothing stands in its way, and offers the first reading beside it', () => {
    const { review, point } = at({});
    expect(nextSteps(review, point, free)).toEqual({
      main: { kind: 'begin-act', act: 'final-cut' },
      other: { kind: 'field', field: 'fluid.below-weld' },
    });
  });

  it('reads the air again when it has grown too old for fire, with the first reading beside it', () => {
    const { review, point } = at({});
    expect(nextSteps(review, point, () => [stop(['gas.cellar.oxygen'])])).toEqual({
      main: { kind: 'site', what: 'air' },
      other: { kind: 'field', field: 'fluid.below-weld' },
    });
  });

  it('goes on with the readings while something else keeps the work from beginning', () => {
    const { review, point } = at({});
    expect(nextSteps(review, point, () => [stop([])]).main).toEqual({ kind: 'field', field: 'fluid.below-weld' });
  });

  it('takes the older of two readings again that have both grown too old', () => {
    const { review, point } = at({
      readings: {
        'cut.12': { value: 8, at: '2026-09-14T11:10:00.000Z' },
        'cut.3': { value: 8, at: '2026-09-14T11:00:00.000Z' },
      },
    });
    const main = nextSteps(review, point, () => [stop(['cut.12', 'cut.3'])]).main;
    expect(main).toEqual({ kind: 'field', field: 'cut.3' });
  });

  it('asks first for the missing reading that keeps the work from beginning', () => {
    const { review, point } = at({});
    expect(nextSteps(review, point, () => [stop(['string.b'])]).main).toEqual({ kind: 'field', field: 'string.b' });
  });

  it('ends what runs before anything else', () => {
    const { review, point } = at({ acts: [{ act: 'final-cut', begun: gone.begun }] });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'end-act', act: 'final-cut' });
  });

  it('asks for a photo when every reading is there', () => {
    const { review, point } = at({ acts: [gone], readings: measured });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'shot', shot: 'wraparound-on-mark' });
  });

  it('presents what is complete and within', () => {
    const { review, point } = at({ acts: [gone], readings: measured, photos: true });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'present', outside: 0 });
  });

  it('measures again what is outside and may be presented as it is', () => {
    const { review, point } = at({ acts: [gone], readings: { ...measured, 'cut.6': 8.1875 }, photos: true });
    const { main, other } = nextSteps(review, point, free);
    expect(main).toEqual({ kind: 'measure-again', field: 'cut.12' });
    expect(other).toMatchObject({ kind: 'present' });
  });

  it('never presents what is outside a stop', () => {
    const { review, point } = at({ acts: [gone], readings: { ...measured, 'string.a': 0 }, photos: true });
    const stopped = { ...review, stops: [stop(['cut.3'])] };
    expect(nextSteps(stopped, point, free)).toEqual({ main: { kind: 'measure-again', field: 'cut.3' }, other: null });
  });
});

describe('the entry', () => {
  it('goes on to the next reading that is missing, then back to those passed over', () => {
    const { review } = at({ readings: { 'cut.12': 8 } });
    expect(fieldAfter(review, 'cut.12')).toBe('cut.3');
    expect(fieldAfter(review, 'visual')).toBe('fluid.below-weld');
  });

  it('ends when nothing is missing', () => {
    const { review } = at({ readings: measured });
    expect(fieldAfter(review, 'visual')).toBeUndefined();
  });
});
