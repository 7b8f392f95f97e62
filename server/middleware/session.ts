import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import passport from 'passport';
import { Strategy } from 'passport-local';
import type { AppDeps } from '../services/deps';
import { checkSignIn } from '../services/check-sign-in';
import type { SignInAnswer } from '../services/check-sign-in';
import { SessionStore } from './session-store';
import { loadAccount } from '../services/signed-in-account';
import type { SignedInAccount } from '../services/signed-in-account';

/** A cookie that only this host may set, wherever there is https; loopback has none and drops the prefix. */
export const cookieName = (secure: boolean) => (secure ? '__Host-headfast' : 'headfast');

type User = { accountId: string };

/** Passport and the session behind it, one of each for one app. */
export function sessions(deps: AppDeps): RequestHandler[] {
  const { config } = deps;
  const guard = new passport.Passport();
  guard.serializeUser<string>((user, done) => done(null, (user as User).accountId));
  guard.deserializeUser<string>((id, done) => {
    loadAccount(deps.dataSource, id).then((account) => done(null, account ?? false), done);
  });
  guard.use(
    new Strategy(
      { usernameField: 'email', passwordField: 'password', passReqToCallback: true },
      (req, email, password, done) => {
        checkSignIn(deps, { email, password, address: req.ip ?? '' }).then(
          (answer) =>
            done(null, answer.ok ? { accountId: answer.accountId } : false, { message: JSON.stringify(answer) }),
          done,
        );
      },
    ),
  );
  return [
    session({
      name: cookieName(config.secure),
      secret: deps.keys.session,
      store: new SessionStore(deps),
      resave: false,
      saveUninitialized: false,
      proxy: config.trustProxy !== false,
      cookie: {
        httpOnly: true,
        sameSite: 'strict',
        secure: config.secure,
        path: '/',
        maxAge: config.session.longestMs,
      },
    }),
    guard.session() as RequestHandler,
    (req, _res, next) => {
      passportOf.set(req, guard);
      next();
    },
  ];
}

const passportOf = new WeakMap<Request, passport.Authenticator>();

/** Asks the local strategy about the e-mail and password in a request's body. */
export function askPassport(req: Request): Promise<SignInAnswer> {
  return new Promise((resolve, reject) => {
    const answered = (error: unknown, _user: unknown, info: { message: string } | undefined) =>
      error
        ? reject(error)
        : resolve(info ? (JSON.parse(info.message) as SignInAnswer) : { ok: false, code: 'sign-in.refused' });
    const ask = passportOf.get(req)?.authenticate('local', answered) as RequestHandler;
    void ask(req, req.res!, reject);
  });
}

/** Opens a session under a new id, and notes that it had the password now. */
export async function openSession(req: Request, accountId: string, now: Date): Promise<void> {
  await new Promise<void>((resolve, reject) => {
    req.logIn({ accountId } as User, (error: unknown) => (error ? reject(error) : resolve()));
  });
  req.session.passwordAt = now.toISOString();
  req.session.userAgent = req.get('User-Agent') ?? '';
}

/** Ends this device's session on the server. */
export function closeSession(req: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    req.session.destroy((error: unknown) => (error ? reject(error) : resolve()));
  });
}

/** Who is signed in, or null. */
export const accountOf = (req: Request): SignedInAccount | null => (req.user as SignedInAccount | undefined) ?? null;
