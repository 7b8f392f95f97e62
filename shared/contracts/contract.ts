import type { z } from 'zod';
import type { Permission } from '../permissions/grants';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** `public` needs no session; `signed-in` leaves the rest to the handler, as the route of the commands does. */
export type RoutePermission = 'public' | 'signed-in' | Permission;

/** What travels when it is not JSON: `bytes` as they are, `form` in parts, `events` as a stream of server-sent events. */
export type RequestBody = z.ZodType | 'bytes' | 'form' | undefined;
export type ResponseBody = z.ZodType | 'nothing' | 'bytes' | 'events';

/** One way into the server: client, route, document of the API and role table are made from this and nothing else. */
export interface RouteContract<
  P extends z.ZodObject | undefined = z.ZodObject | undefined,
  Q extends z.ZodObject | undefined = z.ZodObject | undefined,
  B extends RequestBody = RequestBody,
  R extends ResponseBody = ResponseBody,
  A extends RoutePermission = RoutePermission,
> {
  method: Method;
  /** with parameters as `{name}`, as OpenAPI writes them */
  path: `/${string}`;
  permission: A;
  params?: P;
  query?: Q;
  request?: B;
  response: R;
  /** status of a good answer; 200 when left out, 204 when there is nothing to send */
  status?: 200 | 201 | 202;
  summary: string;
}

/** Declares a route; the types of its parameters, body and answer are inferred from the schemas. */
export const defineRoute = <
  R extends ResponseBody,
  A extends RoutePermission,
  P extends z.ZodObject | undefined = undefined,
  Q extends z.ZodObject | undefined = undefined,
  B extends RequestBody = undefined,
>(
  route: RouteContract<P, Q, B, R, A>,
): RouteContract<P, Q, B, R, A> => route;

type Inferred<T> = T extends z.ZodType ? z.output<T> : undefined;

export type ParamsOf<T> = T extends { params?: infer P } ? Inferred<P> : undefined;
export type QueryOf<T> = T extends { query?: infer Q } ? Inferred<Q> : undefined;
export type BodyOf<T> = T extends { request?: infer B } ? Inferred<B> : undefined;
export type ResponseOf<T> = T extends { response: infer R }
  ? R extends z.ZodType
    ? z.output<R>
    : undefined
  : undefined;

/** A route's path with its parameters put in, each escaped. */
export function pathWith(path: string, params: Readonly<Record<string, string>> = {}): string {
  return path.replace(/\{(\w+)\}/g, (whole, name: string) => {
    const value = params[name];
    return value === undefined ? whole : encodeURIComponent(value);
  });
}
