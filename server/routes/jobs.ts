import { Router } from 'express';
import * as contract from '../../shared/contracts/jobs';
import { detailOf, Problem } from '../middleware/problem';
import type { AppDeps } from '../services/deps';
import { findJobScope } from '../services/find-job-scope';
import { listJobs } from '../services/list-jobs';
import { planJob } from '../services/plan-job';
import { readJob, readJobEvents } from '../services/read-job';
import { commandProblem } from './command-problem';
import { mount } from './mount';

/** Planning a job, finding it again and following its events. */
export function jobRoutes(deps: AppDeps): Router {
  const router = Router();
  const job = ({ id }: { id: string }) => findJobScope(deps.dataSource, id);

  mount(router, contract.listJobs, ({ account, query }) => listJobs(deps, account, query));

  mount(router, contract.planJob, async ({ account, body }) => {
    const answer = await planJob(deps, account, body);
    if (answer.ok) return { id: answer.id, seq: answer.seq, replayed: answer.replayed };
    if (answer.kind !== 'faulty') throw commandProblem(answer);
    const fields = answer.faults.map(({ path, code }) => ({ path, code, detail: detailOf(`field.${code}`) }));
    throw new Problem(422, 'request.invalid', { fields });
  });

  mount(router, contract.readJob, async ({ account, params }) => found(await readJob(deps, account, params.id)), {
    job,
  });

  mount(
    router,
    contract.readJobEvents,
    async ({ params, query }) => found(await readJobEvents(deps, params.id, query.after)),
    { job },
  );

  return router;
}

function found<T>(value: T | null): T {
  if (value === null) throw new Problem(404, 'permission.not-found');
  return value;
}
