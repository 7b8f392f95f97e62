import type { FieldProblem, Problem as ProblemBody } from '../../shared/contracts/problem';
import en from '../../shared/locales/en';
import { say } from '../../shared/locales/say';
import type { Formatters } from '../../shared/locales/say';

type Params = Readonly<Record<string, string | number>>;

interface Details {
  params?: Params;
  fields?: FieldProblem[];
  /** seconds after which trying again makes sense: a Retry-After header */
  retryAfter?: number;
  /** further members of the answer, as RFC 9457 allows: who released first, and when */
  extra?: Readonly<Record<string, unknown>>;
  headers?: Readonly<Record<string, string>>;
}

const titles: Record<number, string> = {
  400: 'Bad request',
  401: 'Sign-in needed',
  403: 'Not allowed',
  404: 'Not found',
  405: 'Method not allowed',
  409: 'Conflict',
  413: 'Too large',
  415: 'Unsupported media type',
  422: 'Not understood',
  429: 'Too many attempts',
  500: 'Internal error',
  503: 'Not available',
};

/** The log's reader gets plain marks: quantities with their unit, instants as they are stored. */
const plain: Formatters = {
  quantity: (quantity, unit) => `${quantity} ${unit}`,
  instant: (iso) => iso,
  day: (date) => date,
  number: (value) => String(value),
};

/** The English of a code; of a key that has no words, the key itself. */
export const detailOf = (code: string, params?: Params): string => say(en, { key: `errors.${code}`, params }, plain);

/** An answer that is not a success, thrown from a route or a middleware to the one place that writes it. */
export class Problem extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    readonly details: Details = {},
  ) {
    super(code);
  }

  /** The body as it travels. */
  body(instance: string | undefined): ProblemBody & Record<string, unknown> {
    const { params, fields, extra } = this.details;
    return {
      type: `urn:headfast:problem:${this.code}`,
      title: titles[this.status] ?? 'Problem',
      status: this.status,
      code: this.code,
      detail: detailOf(this.code, params),
      ...(params && { params }),
      ...(fields && { fields }),
      ...(instance && { instance: `urn:uuid:${instance}` }),
      ...extra,
    };
  }
}
