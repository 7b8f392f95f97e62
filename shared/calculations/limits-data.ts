/** A limit that a crew is shown: its value, where it is from, which edition, and how sure the house is of it. */
export interface PublishedLimit {
  readonly value: number;
  readonly unit: string;
  readonly source: string;
  /** Edition or date of the text the value was taken from; null where the house has not fixed one. */
  readonly edition: string | null;
  readonly status: 'stated by the source' | 'from memory' | 'common practice';
}

const limit = (
  value: number,
  unit: string,
  source: string,
  edition: string | null,
  status: PublishedLimit['status'],
): PublishedLimit => ({ value, unit, source, edition, status });

const STATED = 'stated by the source';
const MEMORY = 'from memory';
const PRACTICE = 'common practice';

/** Every published or customary limit of the calculations, by name. A job's own programme replaces the customary ones. */
export const LIMITS = {
  oxygenLow: limit(19.5, 'pct', '29 CFR 1910.146(b)', null, STATED),
  oxygenHigh: limit(23.5, 'pct', '29 CFR 1910.146(b)', null, STATED),
  flammableCeiling: limit(10, 'pct LFL', '29 CFR 1910.146(b)', null, STATED),
  flammableHotWork: limit(0, 'pct LFL', 'common practice', null, PRACTICE),
  hydrogenSulphide: limit(10, 'ppm', 'NIOSH ceiling', null, STATED),
  carbonMonoxide: limit(35, 'ppm', 'NIOSH REL', null, STATED),
  undercutThin: limit(1 / 32, 'in', 'AWS D1.1', null, STATED),
  undercutThick: limit(1 / 16, 'in', 'AWS D1.1', null, MEMORY),
  collapseShare: limit(80, 'pct', 'common practice', null, PRACTICE),
  gaugeLow: limit(25, 'pct', 'common practice', null, PRACTICE),
  gaugeHigh: limit(75, 'pct', 'common practice', null, PRACTICE),
  gaugeLowTexas: limit(30, 'pct', 'Texas RRC form H-5', null, STATED),
  gaugeHighTexas: limit(70, 'pct', 'Texas RRC form H-5', null, STATED),
  touchTemperature: limit(120, 'degF', 'common practice', null, PRACTICE),
  preheatDistanceAws: limit(3, 'in', 'AWS D1.1', null, STATED),
  preheatDistanceIso: limit(50, 'mm', 'ISO 13916', null, STATED),
  preheatDistanceIsoThick: limit(75, 'mm', 'ISO 13916', null, MEMORY),
  continuityMonths: limit(6, 'months', 'ASME IX QW-322', null, STATED),
  standOffSmall: limit(30, 'm', 'ASME PCC-2 article 501', null, STATED),
} as const satisfies Record<string, PublishedLimit>;
