import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/**
 * One line for each request: method, path, status, time, and who. Headers, bodies and query strings stay out,
 * because secrets travel in them.
 */
export function requestLog(log: Logger, ids: () => string): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId: (_req, res) => {
      const id = ids();
      res.setHeader('X-Request-Id', id);
      return id;
    },
    quietReqLogger: true,
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? 'error' : 'info'),
    customSuccessMessage: () => 'request',
    customErrorMessage: () => 'request',
    customProps: (req) => ({ account: 'user' in req && isPerson(req.user) ? req.user.accountId : undefined }),
    serializers: {
      req: (req: { id: string; method: string; url: string }) => ({
        id: req.id,
        method: req.method,
        path: req.url.split('?')[0],
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
      err: () => undefined,
    },
  }) as unknown as RequestHandler;
}

const isPerson = (user: unknown): user is { accountId: string } =>
  typeof user === 'object' && user !== null && 'accountId' in user;
