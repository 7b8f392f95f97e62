import path from 'node:path';
import express from 'express';
import type { RequestHandler } from 'express';
import { Problem } from './problem';

/**
 * The built client. Files under assets/ carry their content's hash in their name and are kept for good; everything else,
 * the page and the service worker above all, is asked for anew. An address without a file is one of the client's screens.
 */
export function client(folder: string): RequestHandler[] {
  const files = express.static(folder, {
    index: false,
    redirect: false,
    setHeaders: (res, file) => {
      const forGood = path.relative(folder, file).startsWith(`assets${path.sep}`);
      res.setHeader('Cache-Control', forGood ? 'public, max-age=31536000, immutable' : 'no-cache');
    },
  });
  const screen: RequestHandler = (req, res, next) => {
    if (req.method !== 'GET' && req.method !== 'HEAD') {
      throw new Problem(405, 'request.wrong-method', { headers: { Allow: 'GET, HEAD' } });
    }
    if (path.extname(req.path) !== '' || !req.accepts('html')) throw new Problem(404, 'request.unknown-route');
    res.set('Cache-Control', 'no-cache');
    res.sendFile(path.join(folder, 'index.html'), (error) => error && next(new Problem(404, 'request.unknown-route')));
  };
  return [files, screen];
}
