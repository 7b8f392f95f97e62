/** What is measured. Only units of one dimension convert into each other. */
export type Dimension =
  | 'length'
  | 'pressure'
  | 'temperature'
  | 'ratio'
  | 'concentration'
  | 'voltage'
  | 'current'
  | 'time'
  | 'angle'
  | 'volume'
  | 'mass'
  | 'travel-speed'
  | 'heat-input'
  | 'energy'
  | 'count';

interface UnitFacts {
  readonly dimension: Dimension;
  /** Size in the dimension's base unit (mm, Pa, K, s, deg, L, kg, mm/min, kJ/mm, J); exact by definition. */
  readonly size: number;
  /** How the unit is written behind a number. */
  readonly symbol: string;
}

const INCH_MM = 25.4;
const POUND_KG = 0.45359237;
/** Pound-force per square inch: 0.45359237 kg x 9.80665 m/s2 over (0.0254 m)2. */
const PSI_PA = 6894.757293168361;

/** Every unit of the house. Source of the sizes: NIST SP 811, exact definitions. */
export const UNITS = {
  in: { dimension: 'length', size: INCH_MM, symbol: 'in' },
  ft: { dimension: 'length', size: 12 * INCH_MM, symbol: 'ft' },
  mm: { dimension: 'length', size: 1, symbol: 'mm' },
  cm: { dimension: 'length', size: 10, symbol: 'cm' },
  m: { dimension: 'length', size: 1000, symbol: 'm' },
  psi: { dimension: 'pressure', size: PSI_PA, symbol: 'psi' },
  bar: { dimension: 'pressure', size: 100_000, symbol: 'bar' },
  kPa: { dimension: 'pressure', size: 1000, symbol: 'kPa' },
  MPa: { dimension: 'pressure', size: 1_000_000, symbol: 'MPa' },
  degF: { dimension: 'temperature', size: 5 / 9, symbol: '°F' },
  degC: { dimension: 'temperature', size: 1, symbol: '°C' },
  K: { dimension: 'temperature', size: 1, symbol: 'K' },
  pct: { dimension: 'ratio', size: 1, symbol: '%' },
  ppm: { dimension: 'concentration', size: 1, symbol: 'ppm' },
  V: { dimension: 'voltage', size: 1, symbol: 'V' },
  A: { dimension: 'current', size: 1, symbol: 'A' },
  s: { dimension: 'time', size: 1, symbol: 's' },
  min: { dimension: 'time', size: 60, symbol: 'min' },
  h: { dimension: 'time', size: 3600, symbol: 'h' },
  deg: { dimension: 'angle', size: 1, symbol: '°' },
  L: { dimension: 'volume', size: 1, symbol: 'L' },
  gal: { dimension: 'volume', size: 3.785411784, symbol: 'gal' },
  in3: { dimension: 'volume', size: 0.016387064, symbol: 'in³' },
  lb: { dimension: 'mass', size: POUND_KG, symbol: 'lb' },
  kg: { dimension: 'mass', size: 1, symbol: 'kg' },
  inPerMin: { dimension: 'travel-speed', size: INCH_MM, symbol: 'in/min' },
  mmPerMin: { dimension: 'travel-speed', size: 1, symbol: 'mm/min' },
  kJPerIn: { dimension: 'heat-input', size: 1 / INCH_MM, symbol: 'kJ/in' },
  kJPerMm: { dimension: 'heat-input', size: 1, symbol: 'kJ/mm' },
  J: { dimension: 'energy', size: 1, symbol: 'J' },
  kJ: { dimension: 'energy', size: 1000, symbol: 'kJ' },
  ftLbf: { dimension: 'energy', size: POUND_KG * 9.80665 * 0.3048, symbol: 'ft·lbf' },
  count: { dimension: 'count', size: 1, symbol: '' },
} as const satisfies Record<string, UnitFacts>;

export type Unit = keyof typeof UNITS;

/** The dimension a unit measures. */
export const dimensionOf = (unit: Unit): Dimension => UNITS[unit].dimension;

/** The unit's symbol as it stands behind a number (`°F`, `in`). */
export const symbolOf = (unit: Unit): string => UNITS[unit].symbol;
