/** Numbers travel through events as decimal strings; this is the only place that writes and reads them. */

interface Digits {
  readonly negative: boolean;
  readonly digits: bigint;
  readonly scale: number;
}

/** The shortest decimal that names the number, spelled without exponent: what a person would say it is. */
const spell = (value: number): Digits => {
  const [mantissa = '0', exponent = '0'] = Math.abs(value).toString().split('e');
  const [whole = '0', part = ''] = mantissa.split('.');
  const scale = part.length - Number(exponent);
  const digits = BigInt(whole + part);
  const negative = value < 0;
  return scale < 0 ? { negative, digits: digits * 10n ** BigInt(-scale), scale: 0 } : { negative, digits, scale };
};

const roundHalfAway = ({ negative, digits, scale }: Digits, places: number): Digits => {
  if (scale <= places) return { negative, digits, scale };
  const divisor = 10n ** BigInt(scale - places);
  return { negative, digits: (digits + divisor / 2n) / divisor, scale: places };
};

/** Digits and scale as text, trimmed: no exponent, no trailing zeros, no minus zero. */
export const writeDecimal = ({ negative, digits, scale }: Digits): string => {
  const padded = digits.toString().padStart(scale + 1, '0');
  const whole = padded.slice(0, padded.length - scale);
  const part = padded.slice(padded.length - scale).replace(/0+$/, '');
  const text = part === '' ? whole : `${whole}.${part}`;
  return negative && digits !== 0n ? `-${text}` : text;
};

/**
 * The canonical decimal string of a number: plain digits, trimmed, rounded half away from zero to `places` (six by
 * default). NaN and the infinities give `NaN`, which is no decimal string and which every contract refuses.
 */
export const toDecimal = (value: number, places = 6): string =>
  Number.isFinite(value) ? writeDecimal(roundHalfAway(spell(value), places)) : 'NaN';

const CANONICAL = /^-?(0|[1-9]\d*)(\.\d*[1-9])?$/;

/** Whether a text is already a canonical decimal string. */
export const isDecimal = (text: string): boolean => CANONICAL.test(text) && text !== '-0';

/** The number a canonical decimal string names; null for anything else. */
export const fromDecimal = (text: string): number | null => (isDecimal(text) ? Number(text) : null);

/** A number rounded half away from zero to `places`, judged by how it reads in decimals. NaN stays NaN. */
export const roundTo = (value: number, places: number): number => Number(toDecimal(value, places));
