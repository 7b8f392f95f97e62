import type { Router } from 'express';
import type { AppDeps } from '../services/deps';
import { accountRoutes } from './account';
import { catalogueRoutes } from './catalogue';
import { clockRoutes } from './clock';
import { commandRoutes } from './commands';
import { deskRoutes } from './desk';
import { fileRoutes } from './files';
import { healthRoutes } from './health';
import { jobRoutes } from './jobs';
import { packetRoutes } from './packets';
import { sessionRoutes } from './session';

/** Every router, one line for each file of contracts. */
export const apiRoutes = (deps: AppDeps): Router[] => [
  healthRoutes(deps),
  sessionRoutes(deps),
  accountRoutes(deps),
  catalogueRoutes(deps),
  clockRoutes(deps),
  fileRoutes(deps),
  jobRoutes(deps),
  commandRoutes(deps),
  deskRoutes(deps),
  packetRoutes(deps),
];
