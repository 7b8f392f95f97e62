import type { RequestHandler } from 'express';
import helmet from 'helmet';
import type { Config } from '../config';

/**
 * The content security policy of the whole house: scripts from here and nowhere else, without exception.
 * Inline styles are allowed for the component library, which sets its measures on elements.
 */
export function securityHeaders(config: Config): RequestHandler[] {
  return [
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'"],
          scriptSrcAttr: ["'none'"],
          styleSrc: ["'self'", "'unsafe-inline'"],
          imgSrc: ["'self'", 'blob:', 'data:'],
          mediaSrc: ["'self'", 'blob:'],
          fontSrc: ["'self'"],
          connectSrc: ["'self'"],
          workerSrc: ["'self'"],
          manifestSrc: ["'self'"],
          objectSrc: ["'none'"],
          frameSrc: ["'none'"],
          baseUri: ["'none'"],
          formAction: ["'self'"],
          frameAncestors: ["'none'"],
          ...(config.secure && { upgradeInsecureRequests: [] }),
        },
      },
      strictTransportSecurity: config.secure && { maxAge: 31_536_000, includeSubDomains: false },
      referrerPolicy: { policy: 'no-referrer' },
      xFrameOptions: { action: 'deny' },
    }),
    (_req, res, next) => {
      res.set('Permissions-Policy', 'camera=(self), microphone=(), geolocation=(), payment=()');
      next();
    },
  ];
}
