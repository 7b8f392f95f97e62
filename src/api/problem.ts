import type { FieldProblem, Problem as ProblemDocument } from '../../shared/contracts/problem';

/**
 * Why the server's door stayed shut (problem+json, RFC 9457), or why it was not reached at all (`status` 0,
 * code `no-signal`). `code` is a message key under `errors`, `params` go into it. Whatever else the server put into the
 * document stands in `more`.
 */
export interface Problem {
  readonly status: number;
  readonly code: string;
  readonly params?: ProblemDocument['params'];
  readonly fields?: readonly FieldProblem[];
  readonly retryAfterS?: number;
  readonly more: Readonly<Record<string, unknown>>;
}

/** An answer is a value either way: nothing has to be caught. */
export type Answer<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problem: Problem };

/** The server was not reached. */
export const noSignal: Problem = { status: 0, code: 'no-signal', more: {} };

/** Reads a refusal. A body that is no problem document (a proxy's page) still becomes a problem with a code. */
export async function readProblem(response: Response): Promise<Problem> {
  const { code, params, fields, ...more } = await readDocument(response);
  const retryAfterS = Number(response.headers.get('retry-after') ?? Number.NaN);
  return {
    status: response.status,
    code: code ?? `http-${response.status}`,
    ...(params === undefined ? {} : { params }),
    ...(fields === undefined ? {} : { fields }),
    ...(Number.isFinite(retryAfterS) ? { retryAfterS } : {}),
    more,
  };
}

async function readDocument(response: Response): Promise<Partial<ProblemDocument>> {
  if (response.headers.get('content-type')?.includes('json') !== true) return {};
  try {
    return (await response.json()) as Partial<ProblemDocument>;
  } catch {
    return {};
  }
}
