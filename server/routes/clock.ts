import { Router } from 'express';
import * as contract from '../../shared/contracts/clock';
import type { AppDeps } from '../services/deps';
import { mount } from './mount';

/** The server's time. */
export function clockRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, contract.readClock, () => ({ now: deps.clock().toISOString() }));
  return router;
}
