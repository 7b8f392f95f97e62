import { voidPressureLimit, type VoidPressureLimit } from '../calculations/void-pressure-limit';
import type { JobPlan } from '../job/plan';
import { answer } from './computing';

/** A rating that a test pressure can go over; `collapse-share` is the setting's part of the casing's collapse. */
export type PressureBound = 'flange' | 'collapse' | 'collapse-share' | 'seal';

export interface PressureLimits {
  /** rated working pressure of the flange, API 6A */
  flangePsi: number;
  /** the casing under outside pressure, API TR 5C3 */
  collapsePsi: number;
  /** what the job's setting allows of it */
  collapseSharePsi: number;
  /** null where there is no seal or its rating was not entered */
  sealPsi: number | null;
  /** the lowest of them and which it is */
  safe: VoidPressureLimit | undefined;
  /** the bounds that the job's own test pressure is over; over flange or collapse it may never be pumped */
  targetOver: PressureBound[];
}

/** What the void behind the seal may be tested to, and what the planned test pressure is over. Pressures in psi. */
export const pressureLimitsOf = (plan: Pick<JobPlan, 'head' | 'casing' | 'terms'>): PressureLimits => {
  const { head, casing, terms } = plan;
  const sharePct = Number(terms.settings.collapseSharePct.value);
  const sealPsi = head.seals > 0 ? head.sealRatedPsi : null;
  const bounds: Record<PressureBound, number> = {
    flange: head.ratedPressurePsi,
    collapse: casing.collapsePsi,
    'collapse-share': (casing.collapsePsi * sharePct) / 100,
    seal: sealPsi ?? Infinity,
  };
  return {
    flangePsi: bounds.flange,
    collapsePsi: bounds.collapse,
    collapseSharePsi: bounds['collapse-share'],
    sealPsi,
    safe: answer(
      voidPressureLimit({
        flangeRatingPsi: head.ratedPressurePsi,
        collapsePsi: casing.collapsePsi,
        collapseSharePct: sharePct,
        sealRatingPsi: sealPsi,
      }),
    ),
    targetOver: (Object.keys(bounds) as PressureBound[]).filter((bound) => terms.test.pressurePsi > bounds[bound]),
  };
};
