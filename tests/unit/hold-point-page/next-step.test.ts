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
  photos?: string[];
}) => {
  const { state, point } = aPointContext({ kind: 'final-cut', earlier, readings: spec.readings, acts: spec.acts });
  const photo = (shot: string) => ({ shot, setAside: null, late: false }) as never;
  const shown = { ...point, photos: (spec.photos ?? []).map(photo) };
  return { review: reviewPoint(state, shown), point: shown };
};
const both = ['wraparound-on-mark', 'finished-cut'];
/** What is read and photographed before the torch is lit. */
const before = {
  readings: { 'fluid.below-weld': 60, 'fluid.no-water': 'yes', 'string.a': 0, 'string.b': 0 },
  photos: ['wraparound-on-mark'],
};
const free = (): readonly Verdict[] => [];
const stop = (about: string[]): Verdict =>
  ({ limit: 'gas-fresh', kind: 'stop', outcome: 'outside', about, basis: [] }) as unknown as Verdict;

describe('the next step at an open point', () => {
  it('reads and photographs first what comes before the work', () => {
    const { review, point } = at({});
    expect(nextSteps(review, point, free)).toEqual({ main: { kind: 'field', field: 'fluid.below-weld' }, other: null });
    const read = at({ readings: before.readings });
    const main = nextSteps(read.review, read.point, free).main;
    expect(main).toEqual({ kind: 'shot', shot: 'wraparound-on-mark' });
  });

  it('begins the work when its turn has come, with nothing beside it that only comes after', () => {
    const { review, point } = at(before);
    expect(nextSteps(review, point, free)).toEqual({ main: { kind: 'begin-act', act: 'final-cut' }, other: null });
  });

  it('reads the air again when it has grown too old for fire', () => {
    const { review, point } = at(before);
    expect(nextSteps(review, point, () => [stop(['gas.cellar.oxygen'])])).toEqual({
      main: { kind: 'site', what: 'air' },
      other: null,
    });
  });

  it('says that it waits while something that cannot be put right here keeps the work from beginning', () => {
    const { review, point } = at(before);
    expect(nextSteps(review, point, () => [stop([])]).main).toEqual({ kind: 'blocked' });
  });

  it('offers what can be read meanwhile beside work that runs', () => {
    const { review, point } = at({ ...before, acts: [{ act: 'final-cut', begun: gone.begun }] });
    expect(nextSteps(review, point, free).other).toEqual({ kind: 'field', field: 'cut.12' });
  });

  it('takes the older of two readings again that have both grown too old', () => {
    const { review, point } = at({
      ...before,
      readings: {
        ...before.readings,
        'cut.12': { value: 8, at: '2026-09-14T11:10:00.000Z' },
        'cut.3': { value: 8, at: '2026-09-14T11:00:00.000Z' },
      },
    });
    const main = nextSteps(review, point, () => [stop(['cut.12', 'cut.3'])]).main;
    expect(main).toEqual({ kind: 'field', field: 'cut.3' });
  });

  it('asks first for the missing reading that keeps the work from beginning', () => {
    const { review, point } = at(before);
    expect(nextSteps(review, point, () => [stop(['cut.3'])]).main).toEqual({ kind: 'field', field: 'cut.3' });
  });

  it('ends what runs before anything else', () => {
    const { review, point } = at({ acts: [{ act: 'final-cut', begun: gone.begun }] });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'end-act', act: 'final-cut' });
  });

  it('asks for a photo when every reading is there', () => {
    const { review, point } = at({ ...before, acts: [gone], readings: measured });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'shot', shot: 'finished-cut' });
  });

  it('presents what is complete and within', () => {
    const { review, point } = at({ acts: [gone], readings: measured, photos: both });
    expect(nextSteps(review, point, free).main).toEqual({ kind: 'present', outside: 0 });
  });

  it('measures again what is outside and may be presented as it is', () => {
    const { review, point } = at({ acts: [gone], readings: { ...measured, 'cut.6': 8.1875 }, photos: both });
    const { main, other } = nextSteps(review, point, free);
    expect(main).toEqual({ kind: 'measure-again', field: 'cut.12' });
    expect(other).toMatchObject({ kind: 'present' });
  });

  it('never presents what is outside a stop', () => {
    const { review, point } = at({ acts: [gone], readings: { ...measured, 'string.a': 0 }, photos: both });
    const stopped = { ...review, stops: [stop(['cut.3'])] };
    expect(nextSteps(stopped, point, free)).toEqual({ main: { kind: 'measure-again', field: 'cut.3' }, other: null });
  });
});

describe('work that may be passed over', () => {
  const takeoff = (readings: ReadingSpecs) => {
    const { state, point } = aPointContext({ kind: 'height-takeoff', readings });
    return { review: reviewPoint(state, point), point };
  };
  const nameplate = { 'nameplate.serial': 'HD-1', 'nameplate.size': '11', 'nameplate.pressure': 3000 };
  const found: ReadingSpecs = { ...nameplate, 'takeoff.first': 14, 'takeoff.second': 14, 'string.a': 0, 'string.b': 0 };

  it('is offered beside what comes after it, once what comes before it is read', () => {
    const early = takeoff({});
    expect(nextSteps(early.review, early.point, free).other).toBeNull();
    const { review, point } = takeoff(found);
    const { main, other } = nextSteps(review, point, free);
    expect(main).toEqual({ kind: 'field', field: 'mark.first' });
    expect(other).toEqual({ kind: 'begin-act', act: 'conductor-cut' });
  });

  it('is offered no longer when the work has gone on without it', () => {
    const { review, point } = takeoff({ ...found, 'mark.first': 8 });
    expect(nextSteps(review, point, free).other).toBeNull();
  });
});

describe('the entry', () => {
  it('goes on to the next reading that is missing, then back to those passed over', () => {
    const { review, point } = at({ ...before, acts: [gone], readings: { ...before.readings, 'cut.12': 8 } });
    expect(fieldAfter(review, point, 'cut.12')).toBe('cut.3');
    expect(fieldAfter(review, point, 'visual')).toBe('cut.3');
  });

  it('ends before a photo or work whose turn has come', () => {
    const { review, point } = at({ readings: before.readings });
    expect(fieldAfter(review, point, 'string.b')).toBeUndefined();
  });

  it('ends when nothing is missing', () => {
    const { review, point } = at({ readings: measured });
    expect(fieldAfter(review, point, 'visual')).toBeUndefined();
  });
});
