/** Fractions that exist as one character on phone keyboards. */
const VULGAR: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅙': '1/6',
  '⅒': '1/10',
};

/** One spelling for the many ways to type a minus, a prime, a quote, a fraction bar or a space. */
export const plainText = (typed: string): string =>
  typed
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔⅕⅙⅒]/g, (sign) => ` ${VULGAR[sign] ?? sign}`)
    .replace(/[⁄∕]/g, '/')
    .replace(/[−–—‐‑]/g, '-')
    .replace(/[′’‘ʹ`´]/g, "'")
    .replace(/[″”“„ʺ]|''/g, '"')
    .replace(/℉/g, '°F')
    .replace(/℃/g, '°C')
    .replace(/º/g, '°')
    .replace(/\s+/g, ' ')
    .trim();
