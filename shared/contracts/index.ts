import { accountRoutes } from './account';
import { catalogueRoutes } from './catalogue';
import { clockRoutes } from './clock';
import type { RouteContract } from './contract';
import { deskRoutes } from './desk';
import { fileRoutes } from './files';
import { healthRoutes } from './health';
import { jobRoutes } from './jobs';
import { packetRoutes } from './packets';
import { sessionRoutes } from './session';

/** Every route there is: the document of the API and the role table are made from this list. One line for each resource. */
export const allRoutes: readonly RouteContract[] = [
  ...accountRoutes,
  ...catalogueRoutes,
  ...clockRoutes,
  ...deskRoutes,
  ...fileRoutes,
  ...healthRoutes,
  ...jobRoutes,
  ...packetRoutes,
  ...sessionRoutes,
];
