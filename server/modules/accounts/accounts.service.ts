import { createHash, randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';
import type { Session } from '../../../src/contracts/session';
import type { User } from '../../../src/contracts/users';
import type { Role } from '../../../src/domain/access/policy';
import { authorize, type Actor, type Authorized } from '../../db/authorized';
import { fieldError, ProblemError } from '../../http/problem';
import type { OwnersService } from '../owners/owners.service';
import type { PracticeService } from '../practice/practice.service';
import type { AccountsRepo, UserRow } from './accounts.repo';

export type AccountsService = ReturnType<typeof createAccountsService>;
type Managing = Authorized<'user.manage'>;

const INVITATION_LASTS_MS = 7 * 24 * 60 * 60 * 1000;

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

export function createAccountsService(deps: {
  readonly repo: AccountsRepo;
  readonly practice: PracticeService;
  readonly owners: Pick<OwnersService, 'linkUser'>;
  readonly now: () => number;
}) {
  const { repo, practice, owners, now } = deps;
  /** Verified where the address is unknown, so that the answer takes as long as for a wrong password. */
  const nobodysHash = hash(randomBytes(16).toString('hex'));

  const mayEnter = (row: UserRow | undefined): row is UserRow & { passwordHash: string } =>
    row !== undefined && row.passwordHash !== null && !row.disabled;

  function session(actor: Actor | null): Session {
    const settings = practice.settings();
    const row = actor === null ? undefined : repo.byId(actor.userId);
    return {
      user: row === undefined ? null : { id: row.id, name: row.name, email: row.email, role: row.role },
      needsSetup: !repo.anyoneWithPassword(),
      demo: settings?.demo ?? false,
      practiceName: settings?.name ?? '',
    };
  }

  function newInvitation() {
    const token = randomBytes(32).toString('base64url');
    return { token, hash: sha256(token), expiresAt: now() + INVITATION_LASTS_MS };
  }

  /** The person an unspent, unexpired invitation is for; 404 otherwise. */
  function invited(token: string): UserRow {
    const row = repo.byInvitation(sha256(token));
    if (row === undefined || row.disabled || (row.invitationExpiresAt ?? 0) <= now())
      throw new ProblemError('not-found', {
        detail: 'This invitation is spent, has run out or was replaced. Ask the administrator for a new one.',
      });
    return row;
  }

  function required(id: number): UserRow {
    const row = repo.byId(id);
    if (row === undefined) throw new ProblemError('not-found');
    return row;
  }

  const settled = () =>
    new ProblemError('not-allowed-now', { detail: 'The practice has its administrator already. Sign in.' });

  function invitationOf(row: UserRow, token: string, expiresAt: number) {
    return {
      user: shown({ ...row, invitationExpiresAt: expiresAt }),
      token,
      expiresAt: new Date(expiresAt).toISOString(),
    };
  }

  return {
    session,
    hasAnyone: (): boolean => repo.anyoneWithPassword(),

    /** The person of a session, or null when they are gone or disabled. */
    findActor(userId: number): Actor | null {
      const row = repo.byId(userId);
      return mayEnter(row) ? actorOf(row) : null;
    },

    /** The person whose address and password these are, or null; never says which of the two was wrong. */
    async checkPassword(email: string, password: string): Promise<Actor | null> {
      const row = repo.byEmail(email.trim().toLowerCase());
      const matches = await verify(mayEnter(row) ? row.passwordHash : await nobodysHash, password);
      return matches && mayEnter(row) ? actorOf(row) : null;
    },

    noteSignIn(actor: Actor): void {
      repo.noteSeen(actor.userId, now());
      repo.sessions.endExpired(now());
    },

    /** Names the first administrator and makes the practice's row; refused once anyone can sign in. */
    async setUp(input: {
      readonly practiceName: string;
      readonly name: string;
      readonly email: string;
      readonly password: string;
      readonly demo?: boolean;
    }): Promise<Actor> {
      if (repo.anyoneWithPassword()) throw settled(); // before the costly hash: anyone may call this
      const passwordHash = await hash(input.password);
      const row = repo.insertFirst(
        { name: input.name, email: input.email, role: 'administrator', passwordHash, createdAt: now() },
        () => practice.establish({ name: input.practiceName, demo: input.demo ?? false }),
      );
      if (row === null) throw settled();
      return actorOf(row);
    },

    async changePassword(
      actor: Actor,
      input: { currentPassword: string; newPassword: string },
      sessionId: string,
    ): Promise<void> {
      if ((await this.checkPassword(required(actor.userId).email, input.currentPassword)) === null)
        throw fieldError('currentPassword', 'This is not your present password.');
      repo.setPassword(actor.userId, await hash(input.newPassword));
      repo.sessions.endOthers(actor.userId, sha256(sessionId));
    },

    signOutEverywhere: (actor: Actor): void => repo.sessions.endAll(actor.userId),

    list(auth: Managing): { items: User[]; total: number } {
      const items = repo.list(auth).map(shown);
      return { items, total: items.length };
    },

    invite(auth: Managing, input: { readonly name: string; readonly email: string; readonly role: Role }) {
      if (repo.byEmail(input.email) !== undefined)
        throw new ProblemError('already-exists', {
          fields: [{ field: 'email', value: input.email, message: 'Somebody with this address is here already.' }],
        });
      const { token, hash: invitationHash, expiresAt } = newInvitation();
      const row = repo.insert(auth, { ...input, invitationHash, invitationExpiresAt: expiresAt, createdAt: now() });
      return invitationOf(row, token, expiresAt);
    },

    renewInvitation(auth: Managing, id: number) {
      const row = required(id);
      if (row.passwordHash !== null)
        throw new ProblemError('not-allowed-now', { detail: `${row.name} has accepted already and can sign in.` });
      const { token, hash: invitationHash, expiresAt } = newInvitation();
      repo.renewInvitation(auth, id, invitationHash, expiresAt);
      return invitationOf(row, token, expiresAt);
    },

    update(
      auth: Managing,
      id: number,
      { role, disabled }: { role?: Role | undefined; disabled?: boolean | undefined },
    ): User {
      required(id);
      const change = { ...(role === undefined ? {} : { role }), ...(disabled === undefined ? {} : { disabled }) };
      if (Object.keys(change).length === 0) return shown(required(id));
      if (!repo.update(auth, id, change))
        throw new ProblemError('not-allowed-now', {
          detail: 'The practice needs an administrator who can sign in. Name another one first.',
        });
      if (disabled === true) repo.sessions.endAll(id);
      const row = required(id);
      if (row.role === 'collector' && mayEnter(row)) owners.linkUser(row.email, id);
      return shown(row);
    },

    invitation(token: string) {
      const { name, email, role } = invited(token);
      return { name, email, role, practiceName: practice.settings()?.name ?? '' };
    },

    /** Spends an invitation; looked up before the costly hash, and again after it in case it was spent meanwhile. */
    async accept(token: string, password: string): Promise<Actor> {
      invited(token);
      const passwordHash = await hash(password);
      const row = invited(token);
      repo.setPassword(row.id, passwordHash);
      if (row.role === 'collector') owners.linkUser(row.email, row.id);
      return actorOf(row);
    },

    /** Adds a person who can sign in at once; for making the demo practice and tests. */
    async addActiveUser(
      auth: Managing,
      input: { readonly name: string; readonly email: string; readonly role: Role; readonly password: string },
    ): Promise<Actor> {
      const { password, ...person } = input;
      const row = repo.insert(auth, { ...person, passwordHash: await hash(password), createdAt: now() });
      if (row.role === 'collector') owners.linkUser(row.email, row.id);
      return actorOf(row);
    },

    /** Proof for work the program does by itself, such as making the demo practice. Never for a request. */
    authorizeSystem: (): Managing => authorize({ userId: 0, name: 'Thenworth', role: 'administrator' }, 'user.manage'),
  };
}

const actorOf = ({ id, name, role }: UserRow): Actor => ({ userId: id, name, role });

const instantOrNull = (at: number | null) => (at === null ? null : new Date(at).toISOString());

function shown(row: UserRow): User {
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    role: row.role,
    state: row.disabled ? 'disabled' : row.passwordHash === null ? 'invited' : 'active',
    lastSeenAt: instantOrNull(row.lastSeenAt),
    invitationExpiresAt: instantOrNull(row.invitationExpiresAt),
  };
}
