/** Coefficients n, density power d, temperature power t, and exponent l of the exponential term (0: none). */
type PowerTerm = readonly [n: number, d: number, t: number, l: number];
/** Coefficients n, d, t, and the bell's width and place: eta, beta, gamma. */
type BellTerm = readonly [n: number, d: number, t: number, eta: number, beta: number, gamma: number];

const POWER_TERMS: readonly PowerTerm[] = [
  [0.924803575275, 1, 0.25, 0],
  [-0.492448489428, 1, 0.875, 0],
  [0.661883336938, 2, 0.5, 0],
  [-1.92902649201, 2, 0.875, 0],
  [-0.0622469309629, 3, 0.375, 0],
  [0.349943957581, 3, 0.75, 0],
  [0.564857472498, 1, 0.5, 1],
  [-1.61720005987, 1, 0.75, 1],
  [-0.481395031883, 1, 2, 1],
  [0.421150636384, 3, 1.25, 1],
  [-0.0161962230825, 3, 3.5, 1],
  [0.172100994165, 4, 1, 1],
  [0.00735448924933, 6, 0.5, 1],
  [0.0168077305479, 6, 3, 1],
  [-0.00107626664179, 7, 0, 1],
  [-0.0137318088513, 7, 2.75, 1],
  [0.000635466899859, 8, 0.75, 1],
  [0.00304432279419, 8, 2.5, 1],
  [-0.0435762336045, 1, 4, 2],
  [-0.0723174889316, 2, 6, 2],
  [0.0389644315272, 3, 6, 2],
  [-0.021220136391, 4, 3, 2],
  [0.00408822981509, 5, 3, 2],
  [-5.51990017984e-5, 8, 6, 2],
  [-0.0462016716479, 4, 16, 3],
  [-0.00300311716011, 5, 11, 3],
  [0.0368825891208, 5, 15, 3],
  [-0.0025585684622, 8, 12, 3],
  [0.00896915264558, 3, 12, 4],
  [-0.0044151337035, 5, 7, 4],
  [0.00133722924858, 6, 4, 4],
  [0.000264832491957, 9, 16, 4],
];

const BELL_TERMS: readonly BellTerm[] = [
  [19.6688194015, 1, 0, 20, 325, 1.16],
  [-20.911560073, 1, 1, 20, 325, 1.16],
  [0.0167788306989, 3, 2, 15, 300, 1.13],
  [2627.67566274, 2, 3, 25, 275, 1.25],
];

const CRITICAL_K = 126.192;
const CRITICAL_MOL_M3 = 11183.9;
const GAS_J_MOL_K = 8.31451;

/** Density where the search stops, mol/m³: some 30,000 psi at a rig's temperatures. */
const DENSEST_MOL_M3 = 26_000;

/**
 * Pressure of nitrogen in Pa at a density in mol/m³ and a temperature in K. Source: Span, Lemmon, Jacobsen, Wagner and
 * Yokozeki, reference equation of state for nitrogen, J. Phys. Chem. Ref. Data 29 (2000) 1361.
 */
export const nitrogenPressurePa = (densityMolM3: number, temperatureK: number): number => {
  const delta = densityMolM3 / CRITICAL_MOL_M3;
  const tau = CRITICAL_K / temperatureK;
  let slope = 0;
  for (const [n, d, t, l] of POWER_TERMS) {
    const power = l === 0 ? 0 : delta ** l;
    slope += n * delta ** d * tau ** t * Math.exp(-power) * (d - l * power);
  }
  for (const [n, d, t, eta, beta, gamma] of BELL_TERMS) {
    const bell = Math.exp(-eta * (delta - 1) ** 2 - beta * (tau - gamma) ** 2);
    slope += n * delta ** d * tau ** t * bell * (d - 2 * eta * delta * (delta - 1));
  }
  return densityMolM3 * GAS_J_MOL_K * temperatureK * (1 + slope);
};

/**
 * Density in mol/m³ at an absolute pressure in Pa and a temperature in K; null beyond the search. Well above the
 * critical temperature pressure only rises with density, so halving always finds it.
 */
export const nitrogenDensity = (pressurePa: number, temperatureK: number): number | null => {
  if (nitrogenPressurePa(DENSEST_MOL_M3, temperatureK) < pressurePa) return null;
  let [low, high] = [0, DENSEST_MOL_M3];
  for (let round = 0; round < 60; round += 1) {
    const middle = (low + high) / 2;
    if (nitrogenPressurePa(middle, temperatureK) < pressurePa) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
};
