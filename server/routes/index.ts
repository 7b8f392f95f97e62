import type { Router } from 'express';
import type { AppDeps } from '../services/deps';
import { accountRoutes } from './account';
import { catalogueRoutes } from './catalogue';
import { clockRoutes } from './clock';
import { fileRoutes } from './files';
import { healthRoutes } from './health';
import { sessionRoutes } from './session';

/** Every router, one line for each file of contracts. */
export const apiRoutes = (deps: AppDeps): Router[] => [
  healthRoutes(deps),
  sessionRoutes(deps),
  accountRoutes(deps),
  catalogueRoutes(deps),
  clockRoutes(deps),
  fileRoutes(deps),
];
