import type { Problem } from './problem';
import { noSignal, readProblem, type Answer } from './problem';
import { giveSignal } from './signals';

export type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';

export interface Call {
  /** Sent as JSON; a Blob is sent as its bytes. */
  readonly body?: unknown;
  readonly query?: Readonly<Record<string, string | number | boolean | undefined>>;
  /** Secrets travel here, beside the body. */
  readonly headers?: Readonly<Record<string, string>>;
  readonly signal?: AbortSignal;
  /** A 401 answers the question and does not end the session (wrong password, wrong PIN). */
  readonly expects401?: boolean;
}

/**
 * Asks the server: `ask<ResponseOf<typeof readSession>>('GET', '/api/session')`. The contract is imported as a type
 * only, so that its checker stays out of the first load; the server proves the shape before it answers.
 */
export async function ask<T>(method: Method, path: string, call: Call = {}): Promise<Answer<T>> {
  const response = await reach(method, path, call);
  if (response === undefined) return refused(noSignal);
  giveSignal('reached');
  if (response.ok) return readValue<T>(response);
  if (response.status === 401 && call.expects401 !== true) giveSignal('session-ended');
  return refused(await readProblem(response));
}

const refused = (problem: Problem): { ok: false; problem: Problem } => ({ ok: false, problem });

async function reach(method: Method, path: string, call: Call): Promise<Response | undefined> {
  try {
    return await fetch(path + queryOf(call.query), {
      method,
      credentials: 'same-origin',
      cache: 'no-store',
      headers: headersOf(call),
      ...(call.body === undefined ? {} : { body: call.body instanceof Blob ? call.body : JSON.stringify(call.body) }),
      ...(call.signal === undefined ? {} : { signal: call.signal }),
    });
  } catch {
    // A call that its own caller gave up says nothing about the link.
    if (call.signal?.aborted !== true) giveSignal('lost');
    return undefined;
  }
}

function headersOf(call: Call): Record<string, string> {
  const accept = { Accept: 'application/json, application/problem+json' };
  if (call.body === undefined) return { ...accept, ...call.headers };
  const type = call.body instanceof Blob ? call.body.type || 'application/octet-stream' : 'application/json';
  return { ...accept, 'Content-Type': type, ...call.headers };
}

/** The link can break in the middle of an answer: that is no signal, too. */
async function readValue<T>(response: Response): Promise<Answer<T>> {
  if (response.status === 204) return { ok: true, value: undefined as T };
  try {
    const json = response.headers.get('content-type')?.includes('json') === true;
    return { ok: true, value: (json ? await response.json() : await response.blob()) as T };
  } catch {
    giveSignal('lost');
    return refused(noSignal);
  }
}

function queryOf(query: Call['query']): string {
  const pairs = Object.entries(query ?? {}).flatMap(([name, value]) =>
    value === undefined || value === '' ? [] : [[name, String(value)]],
  );
  return pairs.length === 0 ? '' : `?${new URLSearchParams(pairs)}`;
}
