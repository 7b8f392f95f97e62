import { Router } from 'express';
import * as contract from '../../shared/contracts/packets';
import { Problem } from '../middleware/problem';
import type { AppDeps } from '../services/deps';
import { findPacketScope } from '../services/find-job-scope';
import { listPackets } from '../services/list-packets';
import { readJobEvents } from '../services/read-job';
import { readPacket } from '../services/read-packet';
import { makeStorage } from '../storage/make-storage';
import { answerFile } from './answer-file';
import { mount } from './mount';

/** Sealed and called-off jobs, for those who may read them. */
export function packetRoutes(deps: AppDeps): Router {
  const router = Router();
  const storage = makeStorage(deps.config, deps.ids);
  const job = ({ id }: { id: string }) => findPacketScope(deps.dataSource, id);

  mount(router, contract.listPackets, ({ account, query }) => listPackets(deps, account, query));

  mount(router, contract.readPacket, async ({ account, params }) => found(await readPacket(deps, account, params.id)), {
    job,
  });

  mount(
    router,
    contract.readPacketEvents,
    async ({ params, query }) => found(await readJobEvents(deps, params.id, query.after)),
    { job },
  );

  mount(router, contract.getPacketFile, (asked) => answerFile(deps, storage, asked), { job });

  return router;
}

function found<T>(value: T | null): T {
  if (value === null) throw new Problem(404, 'permission.not-found');
  return value;
}
