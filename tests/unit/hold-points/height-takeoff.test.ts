import { describe, expect, it } from 'vitest';
import { definitionOf } from '../../../shared/hold-points/definitions';
import { takeoffOf } from '../../../shared/hold-points/takeoff-of';
import { aPlan, type PlanOverrides } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { barring, computedAs, fieldKeys, ruling, verdictOn } from '../../support/verdicts';

const asPlanned: ReadingSpecs = {
  'nameplate.serial': 'H-4471',
  'nameplate.size': '11',
  'nameplate.pressure': '3000',
  'string.a': '0',
  'string.b': '0',
  'takeoff.first': '14',
  'takeoff.second': '14',
  'mark.first': '8',
  'mark.second': '8',
  'stub-top': '-3',
  'conductor-top': '-40',
  collar: '40',
  'plumb.x': '0',
  'plumb.y': '0',
};

const point = (readings: ReadingSpecs = {}, plan?: PlanOverrides) =>
  aPointContext({ kind: 'height-takeoff', readings: { ...asPlanned, ...readings }, plan: aPlan(plan) });
const nothingRead = (plan?: PlanOverrides) => aPointContext({ kind: 'height-takeoff', plan: aPlan(plan) });

describe('height takeoff', () => {
  it('finds nothing outside on a job that is as planned', () => {
    const verdicts = definitionOf('height-takeoff').judge(point());
    expect(verdicts.length).toBeGreaterThan(8);
    expect(verdicts.filter((verdict) => verdict.outcome === 'outside')).toEqual([]);
  });

  it('says nothing while nothing is read', () => {
    expect(definitionOf('height-takeoff').judge(nothingRead())).toEqual([]);
  });

  it('works out cut elevation, mark, what is left, where the datum lands and the room under the base', () => {
    const context = point();
    expect(computedAs(context, 'cut-elevation')).toBe(-8);
    expect(computedAs(context, 'mark')).toBe(8);
    expect(computedAs(context, 'left-to-cut')).toBe(5);
    expect(computedAs(context, 'lands-at')).toBe(6);
    expect(computedAs(context, 'room-below-base')).toBe(22);
  });

  it('gives the lowest height that may be cut before anything is read', () => {
    expect(computedAs(nothingRead(), 'lowest-cut')).toBe(-5);
    expect(computedAs(nothingRead(), 'mark')).toBeUndefined();
    const [said] = definitionOf('height-takeoff').beforeAct!(
      nothingRead(),
      'conductor-cut',
      '2026-09-14T12:00:00.000Z',
    );
    expect(said).toMatchObject({ limit: 'lowest-cut', kind: 'advice', outcome: 'within' });
    expect(said?.text).toEqual({ key: 'limits.lowest-cut.within', params: { lowest: { quantity: '-5', unit: 'in' } } });
  });

  it('keeps the lowest cut by the drawing when the head measures longer', () => {
    const longer = point({ 'takeoff.first': '14.5', 'takeoff.second': '14.5' });
    expect(computedAs(longer, 'lowest-cut')).toBe(-5);
    expect(computedAs(longer, 'mark')).toBe(8.5);
  });

  it.each([
    ['0', '12', undefined, undefined, 6],
    ['0', '12', '120', '30', 3],
    ['4', '4', undefined, undefined, 4],
  ])('takes the string between stakes at %s and %s', (a, b, apart, fromA, height) => {
    const between: ReadingSpecs = apart ? { 'string.apart': apart, 'string.from-a': fromA! } : {};
    expect(takeoffOf(point({ 'string.a': a, 'string.b': b, ...between }))?.stringHeightIn).toBe(height);
  });

  it('stops on a casing that does not stand between the stakes', () => {
    expect(ruling(point({ 'string.apart': '120', 'string.from-a': '120' }), 'string-height')).toBe('within stop');
    expect(ruling(point({ 'string.apart': '120', 'string.from-a': '121' }), 'string-height')).toBe('outside stop');
  });

  it.each([
    ['face', 'takeoff', -8],
    ['outlet', 'takeoff', 0],
    ['base', 'socket', 16],
  ] as const)('with the %s as datum tapes the %s and lands the datum on target', (datum, taped, cut) => {
    const context = point({ 'mark.first': String(-cut), 'mark.second': String(-cut) }, { terms: { datum } });
    expect(fieldKeys(context)).toContain(`${taped}.first`);
    expect(computedAs(context, 'cut-elevation')).toBe(cut);
    expect(computedAs(context, 'lands-at')).toBe(6);
    expect(takeoffOf(context)?.baseElevationIn).toBe(cut - 10);
  });

  it('cuts lower by the stand-off', () => {
    expect(computedAs(point({}, { terms: { standOffIn: '0.25' } }), 'cut-elevation')).toBe(-8.25);
  });
});

describe('two tapes on the head', () => {
  const tapes = (first: string, second: string, third?: string) =>
    point({ 'takeoff.first': first, 'takeoff.second': second, ...(third ? { 'takeoff.third': third } : {}) });

  it('agree up to a sixteenth', () => {
    expect(ruling(tapes('14', '14.0625'), 'takeoff.agree')).toBe('within hold');
    expect(ruling(tapes('14', '14.063'), 'takeoff.agree')).toBe('outside hold');
  });

  it('are settled by a third, and the one that stands alone stays out', () => {
    const settled = tapes('14', '14.25', '14.03125');
    expect(ruling(settled, 'takeoff.agree')).toBe('within hold');
    expect(takeoffOf(settled)).toMatchObject({ by: 'tape', takeoffIn: 14.015625 });
    expect(verdictOn(settled, 'takeoff.drawing')?.about).toEqual(['takeoff.first', 'takeoff.third']);
  });

  it('are not settled by a third exactly between them', () => {
    const open = tapes('14', '14.125', '14.0625');
    expect(ruling(open, 'takeoff.agree')).toBe('outside hold');
    expect(takeoffOf(open)).toMatchObject({ by: 'drawing', takeoffIn: 14 });
  });

  it('give the takeoff in force once they agree, and the drawing gives it until then', () => {
    expect(computedAs(tapes('14.0625', '14.0625'), 'takeoff-by-tape')).toBe(14.0625);
    expect(computedAs(tapes('14.0625', '14.0625'), 'takeoff-by-drawing')).toBeUndefined();
    expect(computedAs(nothingRead(), 'takeoff-by-drawing')).toBe(14);
  });

  it('may differ from the drawing by an eighth', () => {
    expect(ruling(tapes('14.125', '14.125'), 'takeoff.drawing')).toBe('within hold');
    expect(ruling(tapes('13.875', '13.875'), 'takeoff.drawing')).toBe('within hold');
    expect(ruling(tapes('14.126', '14.126'), 'takeoff.drawing')).toBe('outside hold');
    expect(ruling(tapes('13.874', '13.874'), 'takeoff.drawing')).toBe('outside hold');
  });

  it('are held against the drawing by the worse of the two while they disagree', () => {
    expect(verdictOn(tapes('14', '14.5'), 'takeoff.drawing')).toMatchObject({
      outcome: 'outside',
      measured: { value: '14.5', unit: 'in' },
    });
  });
});

describe('the mark', () => {
  const marked = (first: string, second = first) => point({ 'mark.first': first, 'mark.second': second });

  it('stands within a sixteenth of the computed one', () => {
    expect(ruling(marked('8.0625'), 'mark.computed')).toBe('within hold');
    expect(ruling(marked('7.9375'), 'mark.computed')).toBe('within hold');
    expect(ruling(marked('8.063'), 'mark.computed')).toBe('outside hold');
    expect(ruling(marked('7.937'), 'mark.computed')).toBe('outside hold');
  });

  it('is read alike by both within a sixteenth', () => {
    expect(ruling(marked('8', '8.0625'), 'mark.agree')).toBe('within hold');
    expect(ruling(marked('8', '8.07'), 'mark.agree')).toBe('outside hold');
  });

  it('rests on the string too, so that reading it again voids a concession', () => {
    expect(verdictOn(marked('8.5'), 'mark.computed')?.basis).toContain('height-takeoff/string.a/0');
  });

  it('names the setting as the source, and the job once the programme replaced it', () => {
    const own = point({ 'mark.first': '8.2', 'mark.second': '8.2' }, { terms: { settings: { markAgreesIn: '0.25' } } });
    expect(verdictOn(own, 'mark.computed')).toMatchObject({
      outcome: 'within',
      source: { kind: 'job', ref: 'markAgreesIn' },
    });
    expect(verdictOn(marked('8'), 'mark.computed')?.source).toEqual({ kind: 'common-practice', ref: 'markAgreesIn' });
  });
});

describe('what stands in the cellar', () => {
  it('leaves three inches of stub above the mark, and stops the cut below it', () => {
    const stub = (top: string) => point({ 'stub-top': top });
    expect(ruling(stub('-5'), 'stub-above-mark')).toBe('within hold');
    expect(ruling(stub('-5.01'), 'stub-above-mark')).toBe('outside hold');
    expect(ruling(stub('-8'), 'stub-below-mark')).toBe('within stop');
    expect(ruling(stub('-8.01'), 'stub-below-mark')).toBe('outside stop');
    expect(barring(stub('-8'), 'rough-cut')).toEqual([]);
    expect(barring(stub('-8.01'), 'rough-cut')).toEqual(['stub-below-mark']);
    expect(barring(stub('-8.01'), 'conductor-cut')).toEqual([]);
  });

  it('keeps collar and centraliser out of socket and weld room', () => {
    expect(ruling(point({ collar: '22' }), 'collar')).toBe('within stop');
    expect(ruling(point({ collar: '21.99' }), 'collar')).toBe('outside stop');
    expect(ruling(point({ collar: '21.75' }, { terms: { standOffIn: '0.25' } }), 'collar')).toBe('within stop');
  });

  it('advises on less than twelve inches under the base', () => {
    expect(ruling(point({ 'conductor-top': '-30' }), 'room-below-base')).toBe('within advice');
    expect(ruling(point({ 'conductor-top': '-29.99' }), 'room-below-base')).toBe('outside advice');
  });

  it('stops on a length that nothing can be worked out from', () => {
    expect(ruling(point({ 'stub-top': '20000' }), 'stub-usable')).toBe('outside stop');
  });

  it('stops on another head than the job’s, however its size is written', () => {
    const plan: PlanOverrides = { head: { nominalSize: '13-5/8' } };
    expect(ruling(point({ 'nameplate.size': '13 5/8"' }, plan), 'nameplate.size')).toBe('within stop');
    expect(ruling(point({ 'nameplate.size': '13-3/8' }, plan), 'nameplate.size')).toBe('outside stop');
    expect(ruling(point({ 'nameplate.pressure': '3000' }), 'nameplate.pressure')).toBe('within stop');
    expect(ruling(point({ 'nameplate.pressure': '5000' }), 'nameplate.pressure')).toBe('outside stop');
  });
});
