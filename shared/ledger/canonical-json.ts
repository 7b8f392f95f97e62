/** What the record may hold: no floats, no dates, nothing that prints differently on another machine. */
export type CanonicalValue =
  null | boolean | number | string | readonly CanonicalValue[] | { readonly [key: string]: CanonicalValue | undefined };

const byCodeUnits = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

const loneSurrogate = /[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/;

const print = (value: unknown): string => {
  if (value === null) return 'null';
  switch (typeof value) {
    case 'boolean':
      return value ? 'true' : 'false';
    case 'number':
      if (!Number.isFinite(value)) throw new TypeError('canonical JSON holds no NaN and no infinity');
      return JSON.stringify(value);
    case 'string':
      if (loneSurrogate.test(value)) throw new TypeError('canonical JSON holds whole characters only');
      return JSON.stringify(value);
    case 'object': {
      if (Array.isArray(value)) return `[${value.map((item) => print(item === undefined ? null : item)).join(',')}]`;
      const entries = Object.entries(value as Record<string, unknown>)
        .filter(([, item]) => item !== undefined)
        .sort(([a], [b]) => byCodeUnits(a, b));
      return `{${entries.map(([key, item]) => `${print(key)}:${print(item)}`).join(',')}}`;
    }
    default:
      throw new TypeError(`canonical JSON holds no ${typeof value}`);
  }
};

/**
 * JSON in its one canonical spelling: keys sorted by UTF-16 code units, no white space, ECMAScript number printing.
 * Throws TypeError for what JSON cannot hold: that is a programming fault, never a user's. Source: RFC 8785.
 */
export const canonicalJson = (value: unknown): string => print(value);
