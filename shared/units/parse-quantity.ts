import { writeDecimal } from './decimal';
import { plainText } from './tape-text';
import { dimensionOf, type Unit } from './units';
import { unitNamed } from './unit-words';

/** Why a typed quantity was refused; each has its own message saying what to type instead. */
export type ParseRefusal =
  | 'quantity-empty'
  | 'quantity-not-understood'
  | 'quantity-not-finite'
  | 'quantity-exponent'
  | 'quantity-many-commas'
  | 'quantity-comma-ambiguous'
  | 'quantity-zero-denominator'
  | 'quantity-fraction-not-on-tape'
  | 'quantity-fraction-not-proper'
  | 'quantity-fraction-needs-inches'
  | 'quantity-fraction-with-decimal'
  | 'quantity-inches-reach-a-foot'
  | 'quantity-feet-not-whole'
  | 'quantity-unit-unknown'
  | 'quantity-unit-of-another-kind'
  | 'quantity-too-many-digits';

export type ParsedQuantity =
  | { readonly ok: true; readonly value: number; readonly unit: Unit; readonly exact: string }
  | { readonly ok: false; readonly reason: ParseRefusal };

/** An exact decimal: digits over ten to the scale. */
interface Exact {
  readonly digits: bigint;
  readonly scale: number;
}

const DECIMAL_PLACES = 6;
const WHOLE_DIGITS = 9;
const LONGEST_TEXT = 60;
const TAPE_DENOMINATORS = new Set([2, 4, 8, 16, 32, 64]);

const SHAPE =
  /^(?<sign>[-+]?) ?(?:(?<feet>\d+(?:\.\d*)?) ?(?:'|ft\.?|foot|feet) ?-? ?(?=[\d.]))?(?:(?<number>\d+\.?\d*|\.\d+)(?:(?: ?- ?| )(?<top>\d+) ?\/ ?(?<bottom>\d+))?|(?<bareTop>\d+) ?\/ ?(?<bareBottom>\d+)) ?(?<unit>[^\d\s.,+-][^\d]*)?$/i;

const refuse = (reason: ParseRefusal): { ok: false; reason: ParseRefusal } => ({ ok: false, reason });

const readNumber = (text: string): Exact => {
  const [whole = '', part = ''] = text.split('.');
  const trimmed = part.replace(/0+$/, '');
  return { digits: BigInt(`${whole}${trimmed}` || '0'), scale: trimmed.length };
};

const add = (a: Exact, b: Exact): Exact => {
  const scale = Math.max(a.scale, b.scale);
  const raise = (x: Exact): bigint => x.digits * 10n ** BigInt(scale - x.scale);
  return { digits: raise(a) + raise(b), scale };
};

const times = (a: Exact, factor: bigint): Exact => ({ digits: a.digits * factor, scale: a.scale });

/** A power of two below always ends in decimals: 1/64 is 0.015625. */
const readFraction = (top: string, bottom: string): Exact | ParseRefusal => {
  if (top.length > WHOLE_DIGITS || bottom.length > WHOLE_DIGITS) return 'quantity-too-many-digits';
  const [numerator, denominator] = [Number(top), Number(bottom)];
  if (denominator === 0) return 'quantity-zero-denominator';
  if (!TAPE_DENOMINATORS.has(denominator)) return 'quantity-fraction-not-on-tape';
  // 143/8 is most likely 14 3/8 with the space forgotten; guessing would put the cut in the wrong place.
  if (numerator >= denominator) return 'quantity-fraction-not-proper';
  return { digits: (BigInt(numerator) * 1_000_000n) / BigInt(denominator), scale: DECIMAL_PLACES };
};

/** Looks for what a person may have meant when the shape does not fit, to give the fitting answer. */
const explain = (text: string): ParseRefusal => {
  if (/nan|infinit|∞/i.test(text)) return 'quantity-not-finite';
  if (/\d\s*e\s*[-+]?\d/i.test(text)) return 'quantity-exponent';
  return 'quantity-not-understood';
};

/** Units in which a thousandth is read and a thousand is not: there a comma can only be the decimal one. */
const NEVER_THOUSANDS: ReadonlySet<Unit> = new Set<Unit>(['in', 'm']);

/** The unit as typed behind a number with a comma, or else the one that a bare number is in. */
const unitBehind = (text: string, defaultUnit: Unit): Unit =>
  unitNamed(/,\d+ ?(?<word>[^\d\s]\D*)$/.exec(text)?.groups?.word ?? '') ?? defaultUnit;

/** `14,375` in is 14.375; `1,250` mm may be one and a quarter or twelve hundred and fifty, so it is sent back. */
const settleComma = (text: string, defaultUnit: Unit): string | ParseRefusal => {
  const commas = text.split(',').length - 1;
  if (commas === 0) return text;
  if (commas > 1 || text.includes('.')) return 'quantity-many-commas';
  if (!/\d,\d/.test(text)) return 'quantity-not-understood';
  const looksLikeThousands = /(?<!\d)[1-9]\d{0,2},\d{3}(?!\d)/.test(text);
  const mayBeThousands = looksLikeThousands && !NEVER_THOUSANDS.has(unitBehind(text, defaultUnit));
  return mayBeThousands ? 'quantity-comma-ambiguous' : text.replace(',', '.');
};

/**
 * Reads a quantity as it is said off a tape, a gauge or a meter: `14 3/8`, `1'11-15/16"`, `365 mm`, `250 °F`.
 * A bare number is in `defaultUnit`; a unit of another dimension is refused. Feet with inches come back in inches.
 * `exact` is the same value as a decimal string without rounding. Never throws; refusals carry a code.
 * Source: an inch is 25.4 mm (NIST SP 811); fractions are kept exact.
 */
export const parseQuantity = (typed: string, defaultUnit: Unit): ParsedQuantity => {
  if (typed.length > LONGEST_TEXT) return refuse('quantity-not-understood');
  const plain = plainText(typed);
  if (plain === '') return refuse('quantity-empty');
  const text = settleComma(plain, defaultUnit);
  if (text.startsWith('quantity-')) return refuse(text as ParseRefusal);
  const groups = SHAPE.exec(text)?.groups;
  if (!groups) return refuse(explain(text));
  const { sign, feet, number } = groups;
  const top = groups.top ?? groups.bareTop;
  const bottom = groups.bottom ?? groups.bareBottom;

  const word = groups.unit?.trim() ?? '';
  const named = word === '' ? null : unitNamed(word);
  if (word !== '' && named === null) {
    const why = explain(text);
    return refuse(why === 'quantity-not-understood' ? 'quantity-unit-unknown' : why);
  }
  if (feet !== undefined && named !== null && named !== 'in') return refuse('quantity-not-understood');
  const unit = named ?? (feet === undefined ? defaultUnit : 'in');
  if (dimensionOf(unit) !== dimensionOf(defaultUnit)) return refuse('quantity-unit-of-another-kind');

  let total: Exact = number === undefined ? { digits: 0n, scale: 0 } : readNumber(number);
  if (top !== undefined && bottom !== undefined) {
    const fraction = readFraction(top, bottom);
    if (typeof fraction === 'string') return refuse(fraction);
    if (unit !== 'in' && unit !== 'ft') return refuse('quantity-fraction-needs-inches');
    if (number?.includes('.')) return refuse('quantity-fraction-with-decimal');
    total = add(total, fraction);
  }
  if (feet !== undefined) {
    if (feet.includes('.')) return refuse('quantity-feet-not-whole');
    if (total.digits >= 12n * 10n ** BigInt(total.scale)) return refuse('quantity-inches-reach-a-foot');
    total = add(times(readNumber(feet), 12n), total);
  }
  const exact = writeDecimal({ negative: sign === '-', ...total });
  const [whole = '', part = ''] = exact.replace('-', '').split('.');
  if (whole.length > WHOLE_DIGITS || part.length > DECIMAL_PLACES) return refuse('quantity-too-many-digits');
  return { ok: true, value: Number(exact), unit, exact };
};
