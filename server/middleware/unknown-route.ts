import type { RequestHandler } from 'express';
import { allRoutes } from '../../shared/contracts';
import { Problem } from './problem';

const patterns = allRoutes.map((route) => ({
  method: route.method.toUpperCase(),
  pattern: new RegExp(`^${route.path.replace(/[.]/g, '\\.').replace(/\{\w+\}/g, '[^/]+')}/?$`),
}));

/** Nothing answered under this address: 405 where another method would, 404 otherwise. */
export const unknownRoute: RequestHandler = (req) => {
  const path = req.baseUrl + req.path;
  const methods = patterns.filter((route) => route.pattern.test(path)).map((route) => route.method);
  if (methods.length > 0 && !methods.includes(req.method)) {
    throw new Problem(405, 'request.wrong-method', { headers: { Allow: [...new Set(methods)].join(', ') } });
  }
  throw new Problem(404, 'request.unknown-route');
};
