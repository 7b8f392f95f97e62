import { Router } from 'express';
import * as contract from '../../shared/contracts/health';
import { Problem } from '../middleware/problem';
import type { AppDeps } from '../services/deps';
import { openApiDocument } from './openapi';
import { mount } from './mount';

/** Whether the process and its database answer, and the document of the API. */
export function healthRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, contract.healthz, () => ({ status: 'up' as const }));
  mount(router, contract.readyz, async () => {
    try {
      await deps.dataSource.query('SELECT 1');
    } catch {
      throw new Problem(503, 'server.unavailable', { retryAfter: 2 });
    }
    return { status: 'ready' as const };
  });
  mount(router, contract.openApiDocument, () => openApiDocument());
  return router;
}
