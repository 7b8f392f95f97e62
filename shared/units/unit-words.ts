import type { Unit } from './units';

/** Every way a unit may be written behind a number, in lower case. */
const WORDS: Readonly<Record<string, Unit>> = {
  '"': 'in',
  in: 'in',
  'in.': 'in',
  inch: 'in',
  inches: 'in',
  "'": 'ft',
  ft: 'ft',
  'ft.': 'ft',
  foot: 'ft',
  feet: 'ft',
  mm: 'mm',
  cm: 'cm',
  m: 'm',
  psi: 'psi',
  psig: 'psi',
  bar: 'bar',
  kpa: 'kPa',
  mpa: 'MPa',
  '°f': 'degF',
  f: 'degF',
  degf: 'degF',
  '°c': 'degC',
  c: 'degC',
  degc: 'degC',
  k: 'K',
  '%': 'pct',
  ppm: 'ppm',
  v: 'V',
  a: 'A',
  amps: 'A',
  volts: 'V',
  s: 's',
  sec: 's',
  min: 'min',
  h: 'h',
  hr: 'h',
  '°': 'deg',
  deg: 'deg',
  l: 'L',
  gal: 'gal',
  lb: 'lb',
  lbs: 'lb',
  kg: 'kg',
  'in/min': 'inPerMin',
  ipm: 'inPerMin',
  'mm/min': 'mmPerMin',
  'kj/in': 'kJPerIn',
  'kj/mm': 'kJPerMm',
};

/** The unit a word names (`°F`, `inches`, `"`), or null. Capitals do not matter. */
export const unitNamed = (word: string): Unit | null => {
  const key = word.toLowerCase().replace(/\s+/g, '');
  return Object.hasOwn(WORDS, key) ? (WORDS[key] ?? null) : null;
};
