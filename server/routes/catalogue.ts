import { Router } from 'express';
import * as contract from '../../shared/contracts/catalogue';
import type { AppDeps } from '../services/deps';
import { readCatalogue } from '../services/read-catalogue';
import { readHeads } from '../services/read-heads';
import { mount } from './mount';

/** What a new job is made from, and heads for one that is set again. */
export function catalogueRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, contract.readCatalogue, () => readCatalogue(deps));
  mount(router, contract.readHeads, () => readHeads(deps));
  return router;
}
