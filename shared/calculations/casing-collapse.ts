import { roundTo } from '../units/decimal';
import { collapseCoefficients, ELASTIC_PSI, type CollapseCoefficients } from './collapse-coefficients';
import { firstRefusal, mustBe, refuse, type Outcome } from './outcome';
import { DIAMETER_IN } from './ranges';

export type CollapseRegime = 'yield' | 'plastic' | 'transition' | 'elastic';

export const casingCollapseInfo = {
  id: 'casing-collapse',
  version: 2,
  formula:
    'yield 2Y(x−1)/x²; plastic Y(A/x−B)−C; transition Y(F/x−G); elastic 46.95e6/(x(x−1)²), with x = D/t to two decimals',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400)',
  range: 'D/t above 2; no tension and no inside pressure',
} as const;

/** Collapse pressure in psi at a ratio D/t by one regime's formula, before rounding. */
export const collapseInRegime = (
  regime: CollapseRegime,
  ratio: number,
  yieldPsi: number,
  { a, b, c, f, g }: CollapseCoefficients,
): number => {
  switch (regime) {
    case 'yield':
      return (2 * yieldPsi * (ratio - 1)) / ratio ** 2;
    case 'plastic':
      return yieldPsi * (a / ratio - b) - c;
    case 'transition':
      return yieldPsi * (f / ratio - g);
    case 'elastic':
      return ELASTIC_PSI / (ratio * (ratio - 1) ** 2);
  }
};

/** Far below any gauge or caliper: what halves are rounded by must not hang on the last bit of a double. */
const DECIMALS = 9;

const regimeAt = (ratio: number, limits: CollapseCoefficients): CollapseRegime => {
  if (ratio <= limits.yieldToPlastic) return 'yield';
  if (ratio <= limits.plasticToTransition) return 'plastic';
  return ratio <= limits.transitionToElastic ? 'transition' : 'elastic';
};

export interface Collapse {
  collapsePsi: number;
  unroundedPsi: number;
  regime: CollapseRegime;
  diameterToWall: number;
  coefficients: CollapseCoefficients;
}

/** Collapse pressure of casing under outside pressure, psi to the nearest 10, from OD and wall in inches and yield. */
export const casingCollapse = (casing: { odIn: number; wallIn: number; yieldPsi: number }): Outcome<Collapse> => {
  const { odIn, wallIn, yieldPsi } = casing;
  const refused = firstRefusal(
    mustBe('odIn', odIn, DIAMETER_IN),
    mustBe('wallIn', wallIn, { atLeast: 0.01, atMost: 10 }),
  );
  if (refused) return refused;
  const diameterToWall = roundTo(roundTo(odIn / wallIn, DECIMALS), 2);
  if (diameterToWall <= 2) return refuse('wall-too-thick', 'wallIn', { atLeast: 0.01, below: odIn / 2 });
  const coefficients = collapseCoefficients({ yieldPsi });
  if (!coefficients.ok) return coefficients;
  const regime = regimeAt(diameterToWall, coefficients);
  const unroundedPsi = collapseInRegime(regime, diameterToWall, yieldPsi, coefficients);
  return {
    ok: true,
    collapsePsi: roundTo(roundTo(unroundedPsi, 6) / 10, 0) * 10,
    unroundedPsi,
    regime,
    diameterToWall,
    coefficients,
  };
};
