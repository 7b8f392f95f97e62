import { mustBe, type Outcome } from './outcome';
import { YIELD_PSI } from './ranges';

export const collapseCoefficientsInfo = {
  id: 'collapse-coefficients',
  version: 1,
  formula: 'A, B, C, F, G as polynomials of the yield strength; limits of the four regimes',
  source: 'API TR 5C3 (Bulletin 5C3, ISO 10400), customary units',
  range: 'yield strength 20,000 to 200,000 psi',
} as const;

/** The elastic formula's constant as published, psi; customary units only. */
export const ELASTIC_PSI = 46.95e6;

export interface CollapseCoefficients {
  a: number;
  b: number;
  c: number;
  f: number;
  g: number;
  /** Largest D/t of the yield regime. */
  yieldToPlastic: number;
  plasticToTransition: number;
  transitionToElastic: number;
}

/** The coefficients of the collapse formulas, unrounded, and the D/t limits between the four regimes. */
export const collapseCoefficients = ({ yieldPsi }: { yieldPsi: number }): Outcome<CollapseCoefficients> => {
  const refused = mustBe('yieldPsi', yieldPsi, YIELD_PSI);
  if (refused) return refused;
  const y = yieldPsi;
  const a = 2.8762 + 0.10679e-5 * y + 0.21301e-10 * y ** 2 - 0.53132e-16 * y ** 3;
  const b = 0.026233 + 0.50609e-6 * y;
  const c = -465.93 + 0.030867 * y - 0.10483e-7 * y ** 2 + 0.36989e-13 * y ** 3;
  const ratio = b / a;
  const share = (3 * ratio) / (2 + ratio);
  const f = (ELASTIC_PSI * share ** 3) / (y * (share - ratio) * (1 - share) ** 2);
  const g = f * ratio;
  const bend = b + c / y;
  return {
    ok: true,
    a,
    b,
    c,
    f,
    g,
    yieldToPlastic: (Math.sqrt((a - 2) ** 2 + 8 * bend) + (a - 2)) / (2 * bend),
    plasticToTransition: (y * (a - f)) / (c + y * (b - g)),
    transitionToElastic: (2 + ratio) / (3 * ratio),
  };
};
