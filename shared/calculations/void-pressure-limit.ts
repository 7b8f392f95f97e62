import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { POSITIVE_PRESSURE_PSI } from './ranges';

export const voidPressureLimitInfo = {
  id: 'void-pressure-limit',
  version: 1,
  formula: 'lowest of flange rating, share of casing collapse, seal rating',
  source: 'flange: API 6A; collapse: API TR 5C3; share of it: common practice, a setting of the job',
  range: 'pressures above 0; what is not known is left out and named',
} as const;

export type VoidLimitBy = 'flange' | 'collapse' | 'seal';

export interface VoidPressureLimit {
  limitPsi: number;
  governedBy: VoidLimitBy;
  limits: readonly { by: VoidLimitBy; psi: number }[];
  /** What nobody entered, so that the screen can say the limit may be lower. */
  unknown: readonly VoidLimitBy[];
  /** The void presses on the casing from outside: the test against a share of internal yield says nothing here. */
  loading: 'external';
}

/**
 * The highest test pressure for the void behind the seal, psi, and which part sets it. Null stands for a rating that is
 * not known. The collapse share is in percent.
 */
export const voidPressureLimit = (ratings: {
  flangeRatingPsi: number | null;
  collapsePsi: number | null;
  collapseSharePct: number;
  sealRatingPsi: number | null;
}): Outcome<VoidPressureLimit> => {
  const { flangeRatingPsi, collapsePsi, collapseSharePct, sealRatingPsi } = ratings;
  const refused = firstRefusal(
    flangeRatingPsi === null ? null : mustBe('flangeRatingPsi', flangeRatingPsi, POSITIVE_PRESSURE_PSI),
    collapsePsi === null ? null : mustBe('collapsePsi', collapsePsi, POSITIVE_PRESSURE_PSI),
    mustBe('collapseSharePct', collapseSharePct, { above: 0, atMost: 100 }),
    sealRatingPsi === null ? null : mustBe('sealRatingPsi', sealRatingPsi, POSITIVE_PRESSURE_PSI),
  );
  if (refused) return refused;
  const rated: readonly { by: VoidLimitBy; psi: number | null }[] = [
    { by: 'flange', psi: flangeRatingPsi },
    { by: 'collapse', psi: collapsePsi === null ? null : (collapsePsi * collapseSharePct) / 100 },
    { by: 'seal', psi: sealRatingPsi },
  ];
  const limits = rated.flatMap(({ by, psi }) => (psi === null ? [] : [{ by, psi }]));
  const unknown = rated.filter(({ psi }) => psi === null).map(({ by }) => by);
  const [first] = limits;
  if (first === undefined) return refuse('no-limit-given');
  const lowest = limits.reduce((least, each) => (each.psi < least.psi ? each : least), first);
  return { ok: true, limitPsi: lowest.psi, governedBy: lowest.by, limits, unknown, loading: 'external' };
};
