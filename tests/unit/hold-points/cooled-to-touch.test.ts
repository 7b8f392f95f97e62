import { describe, expect, it } from 'vitest';
import { coolingCurve, coolingFitOf } from '../../../shared/hold-points/cooling';
import type { JobPlan } from '../../../shared/job/plan';
import { aPlan } from '../../support/a-plan';
import { aPointContext, type ReadingSpecs } from '../../support/a-point';
import { computedOf, expectPlainLimits, expectWords, fieldsOf, judged } from '../../support/judged';

const kind = 'cooled-to-touch' as const;
const at = (clock: string): string => `2026-09-14T${clock}:00.000Z`;
const read = (...points: [clock: string, temperature: number][]): ReadingSpecs =>
  Object.fromEntries(
    points.flatMap(([clock, temperature], index) => [
      [`cooling.${index + 1}.at`, at(clock)],
      [`cooling.${index + 1}.temperature`, temperature],
    ]),
  );
const cooled = (own: ReadingSpecs = {}, plan: JobPlan = aPlan()) =>
  aPointContext({ kind, plan, readings: { ambient: 72, ...own } });

describe('cooled to touch', () => {
  it('fits the cooling and tells when it can be touched', () => {
    const fit = coolingFitOf(cooled(read(['12:00', 375], ['12:15', 215])));
    expect(fit).toMatchObject({ ok: true, ambientF: 72, startAt: at('12:00'), touchF: 120 });
    if (!fit.ok) return;
    expect(fit.kPerMin).toBeCloseTo(0.050059, 6);
    expect(fit.touchAfterMin).toBeCloseTo(36.807, 3);
    expect(fit.touchAt).toMatch(/^2026-09-14T12:36:48/);
    expect(computedOf(cooled(read(['12:00', 375], ['12:15', 215])))).toMatchObject({ 'cooling-constant': '0.050059' });
  });

  it('starts the fit again when the cover comes off', () => {
    const points = read(['11:00', 450], ['11:30', 440], ['12:00', 375], ['12:15', 215]);
    const fit = coolingFitOf(cooled({ ...points, 'cover-off': at('12:00') }));
    expect(fit).toMatchObject({ ok: true, startAt: at('12:00') });
    expect(fit.ok && fit.used.map((point) => point.row)).toEqual([3, 4]);
  });

  it('takes readings in the order of their times, not of their rows', () => {
    const fit = coolingFitOf(cooled(read(['12:15', 215], ['12:00', 375])));
    expect(fit.ok && fit.touchAfterMin).toBeCloseTo(36.807, 3);
    expect(judged(cooled(read(['12:40', 118], ['12:00', 375])), 'cooled-last')).toBe('stop within');
  });

  it('says why there is no fit', () => {
    expect(coolingFitOf(cooled())).toEqual({ ok: false, reason: 'too-few-readings' });
    expect(coolingFitOf(cooled(read(['12:00', 375])))).toEqual({ ok: false, reason: 'too-few-readings' });
    expect(coolingFitOf(cooled(read(['12:00', 200], ['12:10', 210])))).toEqual({ ok: false, reason: 'not-cooling' });
    expect(coolingFitOf(cooled({ ...read(['12:00', 375], ['12:15', 215]), ambient: 121 }))).toEqual({
      ok: false,
      reason: 'target-never-reached',
    });
  });

  it('draws its curve down to touch', () => {
    const fit = coolingFitOf(cooled(read(['12:00', 375], ['12:15', 215])));
    const curve = fit.ok ? coolingCurve(fit, 4) : [];
    expect(curve).toHaveLength(5);
    expect(curve[0]?.minute).toBe(0);
    expect(curve.at(-1)?.temperatureF).toBeCloseTo(120, 9);
    expect(curve.at(-1)?.minute).toBeCloseTo(36.807, 3);
  });

  it.each([
    [120, 'stop within'],
    [120.1, 'stop outside'],
  ])('a last reading of %s °F is a %s', (temperature, expected) => {
    expect(judged(cooled(read(['12:00', 375], ['13:00', temperature])), 'cooled-last')).toBe(expected);
  });

  it('takes the touch temperature of the job’s programme', () => {
    const plan = aPlan({ terms: { settings: { touchF: '100' } } });
    expect(judged(cooled(read(['12:00', 375], ['13:00', 110]), plan), 'cooled-last')).toBe('stop outside');
  });

  it('stops at a crack and does not let it be called repaired', () => {
    expect(judged(cooled({ 'look.crack.state': 'present' }), 'look.crack.state')).toBe('stop outside');
    expect(judged(cooled({ 'look.crack.state': 'none' }), 'look.crack.state')).toBe('stop within');
    const crack = fieldsOf(cooled()).find((field) => field.key === 'look.crack.state');
    expect(crack?.of).toEqual({ type: 'choice', choices: ['none', 'present'] });
    expect(judged(cooled({ 'look.porosity.state': 'present' }), 'look.porosity.state')).toBe('hold outside');
  });

  it('holds a weld that was quenched', () => {
    expect(judged(cooled({ quenched: 'yes' }), 'quenched')).toBe('hold outside');
    expect(judged(cooled({ quenched: 'no' }), 'quenched')).toBe('hold within');
  });

  it('asks for the surface examination only where the programme does, and stops when it failed', () => {
    const plan = aPlan({ procedure: { surfaceExam: 'magnetic-particle' } });
    expect(judged(cooled({ 'surface-exam': 'fail' }, plan), 'surface-exam')).toBe('stop outside');
    expect(judged(cooled({ 'surface-exam': 'pass' }, plan), 'surface-exam')).toBe('stop within');
    expect(fieldsOf(cooled()).map((field) => field.key)).not.toContain('surface-exam');
  });

  it('holds the head as built against the limits of the valve orientation', () => {
    const asBuilt = { 'as-built.height': 6.26, 'as-built.level.x': 0.25, 'as-built.level.y': 0 };
    expect(judged(cooled(asBuilt), 'as-built.datum-height')).toBe('hold outside');
    expect(judged(cooled(asBuilt), 'as-built.tilt')).toBe('hold within');
  });

  it('has words for all that it shows', () => {
    const plan = aPlan({ procedure: { surfaceExam: 'penetrant' } });
    const looks = Object.fromEntries(
      ['porosity', 'slag', 'overlap', 'arc-strike', 'crack'].map((one) => [`look.${one}.state`, 'present']),
    );
    const context = cooled(
      { ...read(['12:00', 375], ['12:15', 215]), ...looks, quenched: 'yes', 'surface-exam': 'fail' },
      plan,
    );
    expectWords(context);
    expectPlainLimits(context);
  });
});
