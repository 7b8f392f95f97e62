import type { Request, RequestHandler } from 'express';
import type { Config } from '../config';
import { Problem } from './problem';

const reading = new Set(['GET', 'HEAD', 'OPTIONS']);
const loopbackNames = /^(localhost|127\.0\.0\.1|\[::1\])(:\d+)?$/;

/**
 * A browser says where a write comes from; one from another site is refused before anything reads its body.
 * Callers that are no browsers send neither header, and carry no cookie that they were not given on purpose.
 * Without a public address only the names of loopback are answered to: another name means that somebody's DNS points here.
 */
export function sameOrigin(config: Config): RequestHandler {
  return (req, _res, next) => {
    if (!config.publicOrigin && !config.tls && !loopbackNames.test(req.headers.host ?? '')) {
      throw new Problem(400, 'request.wrong-host');
    }
    if (!reading.has(req.method) && isForeign(req, config)) throw new Problem(403, 'request.cross-site');
    next();
  };
}

function isForeign(req: Request, config: Config): boolean {
  const site = req.get('Sec-Fetch-Site');
  if (site !== undefined && site !== 'same-origin' && site !== 'none') return true;
  const origin = req.get('Origin');
  if (origin === undefined) return false;
  return origin !== (config.publicOrigin ?? `${config.secure ? 'https' : 'http'}://${req.headers.host}`);
}
