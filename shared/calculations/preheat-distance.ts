import { convert } from '../units/convert';
import { LIMITS } from './limits-data';
import { mustBe, type Outcome } from './outcome';

export const preheatDistanceInfo = {
  id: 'preheat-distance',
  version: 1,
  formula: 'AWS D1.1: the greater of t and 3 in; ISO 13916: 4t up to 50 mm, over 50 mm thick 75 mm',
  source: 'AWS D1.1; ISO 13916 (over 50 mm thick: from memory)',
  range: '0 < t ≤ 12 in',
} as const;

export type PreheatRule = 'aws-d1.1' | 'iso-13916';

const THICK_MM = 50;

const isoMm = (thicknessMm: number): number =>
  thicknessMm > THICK_MM
    ? LIMITS.preheatDistanceIsoThick.value
    : Math.min(4 * thicknessMm, LIMITS.preheatDistanceIso.value);

/**
 * How far from the joint the preheat is measured, in inches and millimetres, for the thicker part in inches. The job
 * says which rule. AWS gives a least distance, ISO the distance itself.
 */
export const preheatDistance = (joint: {
  thicknessIn: number;
  rule: PreheatRule;
}): Outcome<{ distanceIn: number; distanceMm: number }> => {
  const refused = mustBe('thicknessIn', joint.thicknessIn, { above: 0, atMost: 12 });
  if (refused) return refused;
  const distanceIn =
    joint.rule === 'aws-d1.1'
      ? Math.max(joint.thicknessIn, LIMITS.preheatDistanceAws.value)
      : convert(isoMm(convert(joint.thicknessIn, 'in', 'mm')), 'mm', 'in');
  return { ok: true, distanceIn, distanceMm: convert(distanceIn, 'in', 'mm') };
};
