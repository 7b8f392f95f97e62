import { Router } from 'express';
import * as contract from '../../shared/contracts/account';
import { Problem } from '../middleware/problem';
import { openSession } from '../middleware/session';
import { changePassword } from '../services/change-password';
import { changePin } from '../services/change-pin';
import { changePreferences } from '../services/change-preferences';
import type { AppDeps } from '../services/deps';
import { mount } from './mount';

type Refused = { ok: false; code: string; retryAfter?: number };

function problemOf({ code, retryAfter }: Refused): Problem {
  if (retryAfter !== undefined) return new Problem(429, code, { retryAfter, params: { seconds: retryAfter } });
  return new Problem(code === 'password.wrong' ? 403 : 422, code);
}

/** What somebody changes on the own account. */
export function accountRoutes(deps: AppDeps): Router {
  const router = Router();

  mount(router, contract.changePassword, async ({ account, body, req }) => {
    const answer = await changePassword(deps, account.accountId, body);
    if (!answer.ok) throw problemOf(answer);
    await openSession(req, account.accountId, deps.clock());
    return undefined;
  });

  mount(router, contract.changePin, async ({ account, body }) => {
    const answer = await changePin(deps, account.accountId, body);
    if (!answer.ok) throw problemOf(answer);
    return undefined;
  });

  mount(router, contract.changePreferences, ({ account, body }) => changePreferences(deps, account.accountId, body));

  return router;
}
