import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { contextOf, type PointContext } from '../../../shared/hold-points/context';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, noon, type ReadingSpecs } from '../../support/a-point';
import { barring, computedAs, ruling, verdictOn } from '../../support/verdicts';

const takeoff: ReadingSpecs = {
  'string.a': '0',
  'string.b': '0',
  'takeoff.first': '14',
  'takeoff.second': '14',
  'mark.first': '8',
  'mark.second': '8',
  'stub-top': '-3',
};

const fourAt = (at12: number, at3 = at12, at6 = at12, at9 = at12): ReadingSpecs => ({
  'cut.12': at12,
  'cut.3': at3,
  'cut.6': at6,
  'cut.9': at9,
});

interface Cut {
  cut?: ReadingSpecs;
  readings?: ReadingSpecs;
  before?: ReadingSpecs;
  plan?: PlanOverrides;
}

const point = ({ cut = {}, readings = {}, before = {}, plan }: Cut) =>
  aPointContext({
    kind: 'final-cut',
    readings: { 'string.a': '0', 'string.b': '0', ...cut, ...readings },
    earlier: [{ kind: 'height-takeoff', readings: { ...takeoff, ...before } }],
    plan: aPlan(plan),
  });

describe('final cut', () => {
  it('works out the cut of the drawing: low by 7/64, an eighth apart, low side towards 5 o’clock', () => {
    const context = point({ cut: fourAt(8.0625, 8.125, 8.1875, 8.0625) });
    expect(computedAs(context, 'mean')).toBe(8.109375);
    expect(computedAs(context, 'spread')).toBe(0.125);
    expect(computedAs(context, 'low-side')).toBeCloseTo(153.43, 2);
    expect(computedAs(context, 'lands-mean')).toBe(5.890625);
    expect(computedAs(context, 'lands-high')).toBe(5.9375);
    expect(computedAs(context, 'allowance-used')).toBe(5.109375);
    expect(ruling(context, 'cut-low')).toBe('outside hold');
    expect(ruling(context, 'cut-spread')).toBe('outside hold');
    expect(verdictOn(context, 'cut-low')).toMatchObject({
      by: { value: '0.046875' },
      text: { params: { size: { quantity: '0.109375' }, allowed: { quantity: '0.0625' } } },
    });
  });

  it('has no low side and no tilt on a flat cut', () => {
    expect(computedAs(point({ cut: fourAt(8) }), 'tilt')).toBe(0);
    expect(computedAs(point({ cut: fourAt(8) }), 'low-side')).toBeUndefined();
  });

  it('passes up to an eighth high, and holds more', () => {
    expect(ruling(point({ cut: fourAt(7.875) }), 'cut-high')).toBe('within hold');
    expect(ruling(point({ cut: fourAt(7.874) }), 'cut-high')).toBe('outside hold');
    expect(ruling(point({ cut: fourAt(7.874) }), 'cut-low')).toBe('within hold');
  });

  it('passes up to a sixteenth low, and holds more', () => {
    expect(ruling(point({ cut: fourAt(8.0625) }), 'cut-low')).toBe('within hold');
    expect(ruling(point({ cut: fourAt(8.063) }), 'cut-low')).toBe('outside hold');
    expect(ruling(point({ cut: fourAt(8.063) }), 'cut-high')).toBe('within hold');
  });

  it('passes a spread of a sixteenth, and holds more', () => {
    expect(ruling(point({ cut: fourAt(8, 8.0625) }), 'cut-spread')).toBe('within hold');
    expect(ruling(point({ cut: fourAt(8, 8.063) }), 'cut-spread')).toBe('outside hold');
  });

  it('says nothing about the cut before all four places are read', () => {
    const three = point({ cut: { 'cut.12': '9', 'cut.3': '9', 'cut.6': '9' } });
    expect(['cut-high', 'cut-low', 'cut-spread'].map((limit) => ruling(three, limit))).toEqual([
      'silent',
      'silent',
      'silent',
    ]);
  });

  it('measures from the string as it stands now, and says that it has moved', () => {
    const moved = point({ cut: fourAt(9), readings: { 'string.a': '1', 'string.b': '1' } });
    expect(computedAs(moved, 'mark')).toBe(9);
    expect(ruling(moved, 'cut-low')).toBe('within hold');
    expect(ruling(moved, 'string-moved')).toBe('outside advice');
    expect(ruling(point({ readings: { 'string.a': '0.0625', 'string.b': '0.0625' } }), 'string-moved')).toBe(
      'within advice',
    );
  });

  it('goes by the head as two tapes measured it', () => {
    const longer = point({ cut: fourAt(8.25), before: { 'takeoff.first': '14.25', 'takeoff.second': '14.25' } });
    expect(ruling(longer, 'cut-low')).toBe('within hold');
    expect(computedAs(longer, 'lands-mean')).toBe(6);
  });

  it('holds fluid nearer than two feet and water that can reach the weld', () => {
    expect(ruling(point({ readings: { 'fluid.below-weld': '24' } }), 'fluid.below-weld')).toBe('within hold');
    expect(ruling(point({ readings: { 'fluid.below-weld': '23.99' } }), 'fluid.below-weld')).toBe('outside hold');
    expect(ruling(point({ readings: { 'fluid.no-water': 'no' } }), 'fluid.no-water')).toBe('outside hold');
    expect(ruling(point({ readings: { visual: 'no' } }), 'visual')).toBe('outside hold');
  });

  it('stops on heights that nothing can be worked out from', () => {
    expect(ruling(point({ cut: fourAt(20_000) }), 'cut-usable')).toBe('outside stop');
  });
});

describe('before the final cut', () => {
  const reopenedAfter = (context: PointContext): PointContext => {
    const { readings, photos, acts, concessions } = context.point;
    const earlier = { readings, photos, acts, concessions, presentation: null, release: null };
    return contextOf(context.state, { ...context.point, readings: {}, acts: [], superseded: [earlier] });
  };

  it('lets the torch be lit while the stub stands above the mark', () => {
    expect(barring(point({}), 'final-cut')).toEqual([]);
    expect(barring(point({ before: { 'stub-top': '-8' } }), 'final-cut')).toEqual([]);
  });

  it('stops when the stub ends below the mark or is not known', () => {
    expect(barring(point({ before: { 'stub-top': '-8.1' } }), 'final-cut')).toEqual(['stub-stands-above-mark']);
    expect(barring(aPointContext({ kind: 'final-cut' }), 'final-cut')).toEqual(['stub-stands-above-mark']);
  });

  it('lets a high cut be cut again, never a low one', () => {
    expect(barring(point({ cut: fourAt(7.5) }), 'final-cut')).toEqual([]);
    expect(barring(point({ cut: fourAt(8.2) }), 'final-cut')).toEqual(['no-second-cut']);
  });

  it('remembers a low cut over a reopening', () => {
    expect(barring(reopenedAfter(point({ cut: fourAt(8.2) })), 'final-cut')).toEqual(['no-second-cut']);
  });

  it('does not ask for the torch again only because the point was reopened', () => {
    const cut = aPointContext({ kind: 'final-cut', acts: [{ act: 'final-cut', begun: noon, ended: noon }] });
    const acts = (context: PointContext) => definitionOf('final-cut').acts(context);
    expect(acts(aPointContext({ kind: 'final-cut' }))).toEqual([{ key: 'final-cut', flame: true, required: true }]);
    expect(acts(reopenedAfter(cut))).toEqual([{ key: 'final-cut', flame: true, required: false }]);
  });
});
