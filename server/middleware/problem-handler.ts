import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { isPassing } from '../services/passing-failure';
import { Problem } from './problem';

interface ParserError {
  type?: unknown;
  status?: unknown;
}

/** What Express and its parsers throw, in the house's own codes. */
function fromParser(error: ParserError): Problem | undefined {
  if (error.type === 'entity.too.large') return new Problem(413, 'request.too-large');
  if (error.type === 'charset.unsupported' || error.type === 'encoding.unsupported') {
    return new Problem(415, 'request.wrong-type');
  }
  const { status } = error;
  return typeof status === 'number' && status >= 400 && status < 500
    ? new Problem(400, 'request.malformed')
    : undefined;
}

function asProblem(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (isPassing(error)) return new Problem(503, 'server.unavailable', { retryAfter: 2 });
  const known = typeof error === 'object' && error !== null ? fromParser(error as ParserError) : undefined;
  return known ?? new Problem(500, 'server.failed');
}

/** A failure as the log may keep it: a failed query carries its values along, hashes of secrets among them. */
function withoutValues(error: unknown): unknown {
  if (!(error instanceof Error)) return { type: typeof error };
  const { name, message, stack } = error;
  return { type: name, message, stack, ...('code' in error && { code: error.code }) };
}

/** The last handler: every failure leaves as problem+json, and only the log knows the stack. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  return (error, req, res, next) => {
    const problem = asProblem(error);
    const id = typeof req.id === 'string' ? req.id : undefined;
    if (problem.status >= 500)
      log.error({ err: withoutValues(error), requestId: id, code: problem.code }, 'request failed');
    if (res.headersSent) return next(error);
    const { retryAfter, headers } = problem.details;
    if (retryAfter !== undefined) res.set('Retry-After', String(Math.max(1, Math.ceil(retryAfter))));
    if (headers) res.set(headers);
    res.set('Cache-Control', 'no-store');
    res
      .status(problem.status)
      .type('application/problem+json')
      .send(JSON.stringify(problem.body(id)));
  };
}
