import { Router } from 'express';
import * as contract from '../../shared/contracts/catalogue';
import type { AppDeps } from '../services/deps';
import { readCatalogue } from '../services/read-catalogue';
import { mount } from './mount';

/** What a new job is made from. */
export function catalogueRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, contract.readCatalogue, () => readCatalogue(deps));
  return router;
}
