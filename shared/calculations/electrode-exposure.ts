import { mustBe, refuse, type Outcome } from './outcome';
import { MINUTES } from './ranges';

export const electrodeExposureInfo = {
  id: 'electrode-exposure',
  version: 2,
  formula: 'time out of the oven ≤ the limit of the electrode class',
  source: 'AWS D1.1, exposure of low-hydrogen electrodes',
  range: 'E70 to E110 low-hydrogen coatings (last digit 5, 6 or 8)',
} as const;

/** Longest exposure by strength class, in minutes, with how each is known. */
export const EXPOSURE_LIMITS = {
  edition: null,
  source: 'AWS D1.1',
  byStrength: {
    '70': { minutes: 240, status: 'stated by the source' },
    '80': { minutes: 120, status: 'from memory' },
    '90': { minutes: 60, status: 'from memory' },
    '100': { minutes: 30, status: 'from memory' },
    '110': { minutes: 30, status: 'from memory' },
  },
  moistureResistant: { minutes: 540, status: 'from memory' },
} as const;

type Strength = keyof typeof EXPOSURE_LIMITS.byStrength;
const isStrength = (text: string): text is Strength => Object.hasOwn(EXPOSURE_LIMITS.byStrength, text);

const CLASS = /^E(?<strength>\d{2,3})(?<position>\d)(?<coating>\d)(?<rest>[A-Z0-9-]*)$/;

/** The longest exposure of a class such as `E7018` or `E7018-1 H4R`; null where the table sets none (cellulosic). */
export const exposureLimit = (electrodeClass: string): Outcome<{ limitMinutes: number | null }> => {
  const written = electrodeClass.slice(0, 40).toUpperCase().replace(/[\s/]/g, '').replace(/^E-/, 'E');
  const parts = CLASS.exec(written)?.groups;
  if (!parts) return refuse('electrode-class-unknown', 'electrodeClass');
  const { strength = '', coating = '', rest = '' } = parts;
  if (!'568'.includes(coating)) return { ok: true, limitMinutes: null };
  if (!isStrength(strength)) return refuse('electrode-class-unknown', 'electrodeClass');
  // the table, from memory, gives the longer time to E70 rods alone; a stronger rod keeps the shorter time of its class
  const resistant = strength === '70' && rest.endsWith('R');
  const row = resistant ? EXPOSURE_LIMITS.moistureResistant : EXPOSURE_LIMITS.byStrength[strength];
  return { ok: true, limitMinutes: row.minutes };
};

/** Whether a rod was out of the oven too long, in minutes. The limit itself still passes. */
export const electrodeExposure = (rod: {
  electrodeClass: string;
  exposedMinutes: number;
}): Outcome<{ limitMinutes: number | null; leftMinutes: number | null; verdict: 'pass' | 'fail' | 'no-limit' }> => {
  const limit = exposureLimit(rod.electrodeClass);
  if (!limit.ok) return limit;
  const refused = mustBe('exposedMinutes', rod.exposedMinutes, MINUTES);
  if (refused) return refused;
  const { limitMinutes } = limit;
  if (limitMinutes === null) return { ok: true, limitMinutes, leftMinutes: null, verdict: 'no-limit' };
  const leftMinutes = limitMinutes - rod.exposedMinutes;
  return { ok: true, limitMinutes, leftMinutes, verdict: leftMinutes >= 0 ? 'pass' : 'fail' };
};
