import { Router } from 'express';
import { readDesk } from '../../shared/contracts/desk';
import type { AppDeps } from '../services/deps';
import { listDesk } from '../services/list-desk';
import { mount } from './mount';

/** What waits for a signature. */
export function deskRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, readDesk, async ({ account }) => ({ entries: await listDesk(deps, account) }));
  return router;
}
