import compression from 'compression';
import express from 'express';
import type { Express } from 'express';
import { client } from './middleware/client';
import { jsonBody } from './middleware/json-body';
import { problemHandler } from './middleware/problem-handler';
import { requestLog } from './middleware/request-log';
import { sameOrigin } from './middleware/same-origin';
import { securityHeaders } from './middleware/security-headers';
import { sessions } from './middleware/session';
import { unknownRoute } from './middleware/unknown-route';
import { apiRoutes } from './routes';
import type { AppDeps } from './services/deps';

/** Builds the server without listening. Only addresses of the API ask for a session: pages load without the database. */
export function createApp(deps: AppDeps): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', deps.config.trustProxy);
  app.set('etag', false);
  app.use(requestLog(deps.log, deps.ids), ...securityHeaders(deps.config), sameOrigin(deps.config));
  app.use(compression());
  app.use('/api', ...jsonBody(), ...sessions(deps));
  app.use(...apiRoutes(deps));
  app.use('/api', unknownRoute);
  app.use(...client(deps.config.clientDir));
  app.use(problemHandler(deps.log));
  return app;
}
