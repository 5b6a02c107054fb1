import { Router, type Request, type Response } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import {
  changePassword,
  getSession,
  setUpPractice,
  signIn,
  signOut,
  signOutEverywhere,
} from '../../../src/contracts/session';
import {
  acceptInvitation,
  getInvitation,
  inviteUser,
  listUsers,
  renewInvitation,
  updateUser,
} from '../../../src/contracts/users';
import type { Actor } from '../../db/authorized';
import { ProblemError, sendProblem } from '../../http/problem';
import { route } from '../../http/route';
import { SESSION_COOKIE } from '../../http/session';
import type { AccountsService } from './accounts.service';
import type { LocalPassport } from './passport';

const FAILURES_ALLOWED = 10;
const WINDOW_MINUTES = 15;

export function accountsRoutes(deps: { readonly accounts: AccountsService; readonly passport: LocalPassport }): Router {
  const { accounts, passport } = deps;
  const router = Router();

  /** Begins a session under a new id, so that one planted before sign-in is worth nothing. */
  const begin = (req: Request, actor: Actor) =>
    new Promise<void>((resolve, reject) => {
      req.logIn(actor, (error: unknown) => (error ? reject(asError(error)) : resolve()));
    }).then(() => accounts.noteSignIn(actor));

  const end = (req: Request, res: Response) =>
    new Promise<void>((resolve, reject) => {
      req.session.destroy((error: unknown) => (error ? reject(asError(error)) : resolve()));
    }).then(() => void res.clearCookie(SESSION_COOKIE));

  const passwordOf = (req: Request, res: Response) =>
    new Promise<Actor | null>((resolve, reject) => {
      const done = (error: unknown, actor?: Actor | false) => (error ? reject(asError(error)) : resolve(actor || null));
      const authenticate = passport.authenticate('local', done) as (
        req: Request,
        res: Response,
        next: () => void,
      ) => void;
      authenticate(req, res, () => resolve(null));
    });

  router.post(signIn.path, guessLimit(emailIn));
  router.put(changePassword.path, guessLimit(userIdOf));
  router.post(
    acceptInvitation.path,
    guessLimit(() => ''),
  );

  route(router, getSession, ({ actor }) => accounts.session(actor));
  route(router, signIn, async ({ req, res }) => {
    const actor = await passwordOf(req, res);
    if (actor === null) throw new ProblemError('wrong-credentials');
    await begin(req, actor);
    return accounts.session(actor);
  });
  route(router, signOut, ({ req, res }) => end(req, res));
  route(router, signOutEverywhere, async ({ actor, req, res }) => {
    accounts.signOutEverywhere(actor);
    await end(req, res);
  });
  route(router, changePassword, ({ actor, input, req }) => accounts.changePassword(actor, input.body, req.sessionID));
  route(router, setUpPractice, async ({ input, req }) => {
    const actor = await accounts.setUp(input.body);
    await begin(req, actor);
    return accounts.session(actor);
  });

  route(router, listUsers, ({ auth }) => accounts.list(auth));
  route(router, inviteUser, ({ auth, input }) => accounts.invite(auth, input.body));
  route(router, renewInvitation, ({ auth, input }) => accounts.renewInvitation(auth, input.params.id));
  route(router, updateUser, ({ auth, input }) => accounts.update(auth, input.params.id, input.body));
  route(router, getInvitation, ({ input }) => accounts.invitation(input.params.token));
  route(router, acceptInvitation, async ({ input, req }) => {
    const actor = await accounts.accept(input.params.token, input.body.password);
    await begin(req, actor);
    return accounts.session(actor);
  });
  return router;
}

/** Ten failures in a quarter of an hour, by the caller's address and `whose`; what succeeds does not count. */
function guessLimit(whose: (req: Request) => string) {
  return rateLimit({
    windowMs: WINDOW_MINUTES * 60_000,
    limit: FAILURES_ALLOWED,
    skipSuccessfulRequests: true,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    keyGenerator: (req) => `${ipKeyGenerator(req.ip ?? '')} ${whose(req)}`,
    handler: (_req, res) =>
      sendProblem(res, 'too-many-attempts', {
        detail: `Too many attempts. Wait ${WINDOW_MINUTES} minutes, then try again.`,
      }),
  });
}

/** Empty for nobody, so that strangers use up no one's attempts. */
function userIdOf(req: Request): string {
  return String((req.user as Actor | undefined)?.userId ?? '');
}

function emailIn(req: Request): string {
  const body: unknown = req.body;
  const email: unknown = typeof body === 'object' && body !== null ? (body as { email?: unknown }).email : undefined;
  return typeof email === 'string' ? email.trim().toLowerCase().slice(0, 254) : '';
}

const asError = (error: unknown) => (error instanceof Error ? error : new Error(String(error)));
