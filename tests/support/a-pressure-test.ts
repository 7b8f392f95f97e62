import type { JobPlan, TestTerms } from '../../shared/job/plan';
import { aPlan, type PlanOverrides } from './a-plan';
import { aPointContext, type ReadingSpecs } from './a-point';

/** Plans and readings of a pressure test that holds, for tests to spoil. */
export const kind = 'pressure-test-held' as const;
export const at = (clock: string): string => `2026-09-14T${clock}:00.000Z`;

type HoldReading = [clock: string, pressure: number, temperature?: number];
/** A hold of a quarter of an hour from noon, with these readings of the gauge. */
export const held = (...readings: HoldReading[]): ReadingSpecs => ({
  'hold.start': at('12:00'),
  'hold.end': at('12:15'),
  ...(Object.fromEntries(
    readings.flatMap(([clock, pressure, temperature], index) => [
      [`hold-readings.${index + 1}.at`, at(clock)],
      [`hold-readings.${index + 1}.pressure`, pressure],
      ...(temperature === undefined ? [] : [[`hold-readings.${index + 1}.temperature`, temperature]]),
    ]),
  ) as ReadingSpecs),
});
export const steady = held(['12:00', 1550], ['12:08', 1545], ['12:15', 1540]);

/** A test at so many psi on casing that collapses at 2570 psi, under a flange and a seal of 3000 psi. */
export const planOf = (test: Partial<TestTerms> = {}, own: PlanOverrides = {}): JobPlan =>
  aPlan({ ...own, terms: { ...own.terms, test } });
/** The point with the test planned and read so. */
export const tested = (readings: ReadingSpecs = {}, plan: JobPlan = planOf()) =>
  aPointContext({ kind, plan, readings });
