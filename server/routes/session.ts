import { Router } from 'express';
import * as contract from '../../shared/contracts/session';
import type { Me } from '../../shared/contracts/session';
import { demoPeople } from '../demo/people';
import { Problem } from '../middleware/problem';
import { askPassport, closeSession, cookieName, openSession } from '../middleware/session';
import type { AppDeps } from '../services/deps';
import { endSessionsOf } from '../services/end-sessions';
import { listDevices } from '../services/list-devices';
import { loadAccount } from '../services/signed-in-account';
import type { SignedInAccount } from '../services/signed-in-account';
import { signingFreshMs } from '../services/verify-signing';
import { mount } from './mount';

function meOf(account: SignedInAccount, passwordAt: string): Me {
  const { accountId, name, email, roles, operatorIds, preferences, hasPin } = account;
  const signingFreshUntil = new Date(Date.parse(passwordAt) + signingFreshMs).toISOString();
  return { id: accountId, name, email, roles, operatorIds, preferences, hasPin, passwordAt, signingFreshUntil };
}

/** Signing in and out, and the devices that are signed in. */
export function sessionRoutes(deps: AppDeps): Router {
  const router = Router();
  const cookie = cookieName(deps.config.secure);
  const dropCookie = { path: '/', secure: deps.config.secure, httpOnly: true, sameSite: 'strict' } as const;

  mount(router, contract.signIn, async ({ req }) => {
    const answer = await askPassport(req);
    if (!answer.ok && answer.code === 'sign-in.locked') {
      throw new Problem(429, answer.code, { retryAfter: answer.retryAfter, params: { seconds: answer.retryAfter } });
    }
    const account = answer.ok ? await loadAccount(deps.dataSource, answer.accountId) : null;
    if (!account) throw new Problem(401, 'sign-in.refused');
    const now = deps.clock();
    await openSession(req, account.accountId, now);
    return meOf(account, now.toISOString());
  });

  mount(router, contract.readSession, ({ account, req }) =>
    meOf(account, req.session.passwordAt ?? new Date(0).toISOString()),
  );

  mount(router, contract.signOut, async ({ req, res }) => {
    await closeSession(req);
    res.clearCookie(cookie, dropCookie);
    return undefined;
  });

  mount(router, contract.listDevices, async ({ account, req }) => ({
    devices: await listDevices(deps, account.accountId, req.session.handle),
  }));

  mount(router, contract.signOutEverywhere, async ({ account, req, res }) => {
    await endSessionsOf(deps.dataSource, account.accountId);
    await closeSession(req);
    res.clearCookie(cookie, dropCookie);
    return undefined;
  });

  mount(router, contract.demoAccounts, () => ({
    accounts: deps.config.demo
      ? demoPeople.map(({ name, email, password, pin, roles }) => ({ name, email, password, pin, roles: [...roles] }))
      : [],
  }));

  return router;
}
