import type { Request, Response, Router } from 'express';
import { z } from 'zod';
import type { BodyOf, ParamsOf, QueryOf, ResponseOf, RouteContract } from '../../shared/contracts/contract';
import { isJobPermission } from '../../shared/permissions';
import type { JobScope } from '../../shared/permissions';
import { allow } from '../middleware/permission';
import { detailOf, Problem } from '../middleware/problem';
import { accountOf } from '../middleware/session';
import type { SignedInAccount } from '../services/signed-in-account';

/** What a handler gets: everything checked, nothing raw but `req` and `res` for what is no JSON. */
export interface Call<R extends RouteContract> {
  params: ParamsOf<R>;
  query: QueryOf<R>;
  body: BodyOf<R>;
  account: R['permission'] extends 'public' ? SignedInAccount | null : SignedInAccount;
  req: Request;
  res: Response;
}

interface MountOptions<R extends RouteContract> {
  /** looks up the job that the parameters name; null when there is none. Needed by every permission that asks which job. */
  job?: (params: ParamsOf<R>) => Promise<JobScope | null>;
}

/**
 * Puts a contract's route in place: session, permission, parameters, query and body are checked before the handler, and
 * the answer after it, so that nothing leaves that the contract does not name. A handler of `bytes` or `events` writes itself.
 */
export function mount<R extends RouteContract>(
  router: Router,
  route: R,
  handler: (call: Call<R>) => Promise<ResponseOf<R>> | ResponseOf<R>,
  options: MountOptions<R> = {},
): void {
  const { permission } = route;
  const asksJob = permission !== 'public' && permission !== 'signed-in' && isJobPermission(permission);
  if (asksJob && !options.job) throw new Error(`${route.method} ${route.path} must say how its job is found`);
  router[route.method](route.path.replace(/\{(\w+)\}/g, ':$1'), async (req: Request, res: Response) => {
    const account = accountOf(req);
    if (permission !== 'public' && !account) throw new Problem(401, 'session.needed');
    if (account && permission !== 'public' && permission !== 'signed-in' && !asksJob) allow(account, permission);
    const params = (asksJob ? readParams(route, req) : parsed(route.params, req.params, 'params')) as ParamsOf<R>;
    if (account && asksJob) allow(account, permission, await options.job?.(params));
    const call = {
      params,
      query: parsed(route.query, req.query, 'query'),
      body: bodyOf(route, req),
      account,
      req,
      res,
    } as Call<R>;
    const answer = await handler(call);
    send(route, res, answer);
  });
}

/** A parameter that cannot name any job names none: 404, the same as for a job that does not exist. */
function readParams(route: RouteContract, req: Request): unknown {
  const result = route.params?.safeParse(req.params);
  if (result && !result.success) throw new Problem(404, 'permission.not-found');
  return result?.data;
}

function bodyOf(route: RouteContract, req: Request): unknown {
  if (!(route.request instanceof z.ZodType)) return undefined;
  if (req.headers['content-type'] !== undefined && !req.is('application/json')) {
    throw new Problem(415, 'request.wrong-type');
  }
  return parsed(route.request, req.body, 'body');
}

function parsed(schema: z.ZodType | undefined, value: unknown, place: string): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const fields = result.error.issues.slice(0, 50).map((issue) => {
    const missing = issue.code === 'invalid_type' && valueAt(value, issue.path) === undefined;
    const code = missing ? 'missing' : issue.code.replaceAll('_', '-');
    return { path: [place, ...issue.path].join('.'), code, detail: detailOf(`field.${code}`) };
  });
  throw new Problem(422, 'request.invalid', { fields });
}

const valueAt = (value: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>((at, key) => (typeof at === 'object' && at !== null ? Reflect.get(at, key) : undefined), value);

function send(route: RouteContract, res: Response, answer: unknown): void {
  if (!(route.response instanceof z.ZodType)) {
    if (route.response === 'nothing') res.set('Cache-Control', 'no-store').status(204).end();
    return;
  }
  if (!res.hasHeader('Cache-Control')) res.set('Cache-Control', 'no-store');
  res.status(route.status ?? 200).json(route.response.parse(answer));
}
