import { Router } from 'express';
import { sendCommand } from '../../shared/contracts/jobs';
import type { AppDeps } from '../services/deps';
import { recordCommand } from '../services/record-command';
import { commandProblem } from './command-problem';
import { mount } from './mount';

/** The one door through which a job moves. */
export function commandRoutes(deps: AppDeps): Router {
  const router = Router();
  mount(router, sendCommand, async ({ account, params, body, req }) => {
    const answer = await recordCommand(
      deps,
      { actor: account, jobId: params.id, command: body.command },
      { signing: body.signing, passwordAt: req.session.passwordAt ?? null },
    );
    if (!answer.ok) throw commandProblem(answer);
    const { events, seq, replayed, passwordGiven } = answer;
    if (passwordGiven) req.session.passwordAt = deps.clock().toISOString();
    return { events, seq, replayed };
  });
  return router;
}
