/** What may stand in a message: plain words and numbers, or a value that is printed the reader's way. */
export type TextParam = string | number | QuantityParam | InstantParam | DayParam | Text;

/** A measured value as the record keeps it: a decimal string and the code of its unit. */
export interface QuantityParam {
  readonly quantity: string;
  readonly unit: string;
  /** a distance between two values rather than a point on a scale: it matters for temperatures */
  readonly difference?: true;
}

/** A moment, ISO 8601. */
export interface InstantParam {
  readonly instant: string;
}

/** A day of the site's calendar, `2026-08-31`: it has no hour and no zone. */
export interface DayParam {
  readonly day: string;
}

/**
 * A sentence before it is said in a language: a message key and what goes into it.
 * Rules, the server and the record speak in these; only the last step turns one into words.
 */
export interface Text {
  readonly key: string;
  readonly params?: Readonly<Record<string, TextParam>>;
}

/** Builds a {@link Text}; shorter to write where many are listed. */
export function text(key: string, params?: Readonly<Record<string, TextParam>>): Text {
  return params === undefined ? { key } : { key, params };
}
