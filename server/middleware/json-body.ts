import express from 'express';
import type { RequestHandler } from 'express';
import { Problem } from './problem';

const deepest = 24;

/** Whether a parsed value is nested deeper than any body of this API, or names a key that reaches for a prototype. */
function isTreacherous(body: unknown): boolean {
  let level: unknown[] = [body];
  for (let depth = 0; level.length > 0; depth += 1) {
    if (depth > deepest) return true;
    const below: unknown[] = [];
    for (const value of level) {
      if (typeof value !== 'object' || value === null) continue;
      if (Object.hasOwn(value, '__proto__')) return true;
      // one by one: a long list spread over the arguments of a call would fill the stack
      for (const inner of Object.values(value)) below.push(inner);
    }
    level = below;
  }
  return false;
}

/** Reads JSON bodies of at most 256 kB and of a sensible depth; other types are left to the route that wants them. */
export function jsonBody(): RequestHandler[] {
  return [
    express.json({ limit: '256kb', strict: true }),
    (req, _res, next) => {
      if (req.body !== undefined && isTreacherous(req.body)) throw new Problem(400, 'request.too-deep');
      next();
    },
  ];
}
