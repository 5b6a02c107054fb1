import { and, asc, count, eq, isNotNull } from 'drizzle-orm';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { users } from '../../db/schema';
import { createSessionEnding } from './sessions.repo';

export type UserRow = typeof users.$inferSelect;
export type NewUser = Omit<typeof users.$inferInsert, 'id'>;
export type AccountsRepo = ReturnType<typeof createAccountsRepo>;
type Managing = Authorized<'user.manage'>;

/**
 * People who sign in. What signing in itself needs (finding by address, by invitation or by session) asks for no proof:
 * the password, the token or the cookie is the proof. What one person does to another asks for `user.manage`.
 */
export function createAccountsRepo(db: Database) {
  const one = (id: number): UserRow | undefined => db.select().from(users).where(eq(users.id, id)).get();

  return {
    sessions: createSessionEnding(db),

    byId: one,
    byEmail: (email: string): UserRow | undefined => db.select().from(users).where(eq(users.email, email)).get(),
    byInvitation: (hash: string): UserRow | undefined =>
      db.select().from(users).where(eq(users.invitationHash, hash)).get(),
    findCollectorByEmail: (email: string): number | null =>
      db
        .select({ id: users.id })
        .from(users)
        .where(
          and(eq(users.email, email.trim().toLowerCase()), eq(users.role, 'collector'), isNotNull(users.passwordHash)),
        )
        .get()?.id ?? null,

    /** Whether anyone can sign in: while nobody can, the first administrator may be named. */
    anyoneWithPassword: (): boolean =>
      db.select({ id: users.id }).from(users).where(isNotNull(users.passwordHash)).limit(1).get() !== undefined,

    noteSeen: (id: number, at: number): void =>
      void db.update(users).set({ lastSeenAt: at }).where(eq(users.id, id)).run(),
    setPassword: (id: number, passwordHash: string): void =>
      void db
        .update(users)
        .set({ passwordHash, invitationHash: null, invitationExpiresAt: null })
        .where(eq(users.id, id))
        .run(),

    /** Adds the first administrator, with `also` in the same transaction, unless somebody was quicker. */
    insertFirst: (user: NewUser, also: () => void): UserRow | null =>
      db.transaction(
        (tx) => {
          if (tx.select({ id: users.id }).from(users).where(isNotNull(users.passwordHash)).limit(1).get()) return null;
          also();
          return tx.insert(users).values(user).returning().get();
        },
        { behavior: 'immediate' },
      ),

    insert: (_auth: Managing, user: NewUser): UserRow => db.insert(users).values(user).returning().get(),
    list: (_auth: Managing): UserRow[] => db.select().from(users).orderBy(asc(users.name), asc(users.id)).all(),
    renewInvitation: (_auth: Managing, id: number, invitationHash: string, invitationExpiresAt: number): void =>
      void db.update(users).set({ invitationHash, invitationExpiresAt }).where(eq(users.id, id)).run(),

    /** Changes role or access if an active administrator is left afterwards; answers whether one is. */
    update: (_auth: Managing, id: number, change: Partial<Pick<UserRow, 'role' | 'disabled'>>): boolean =>
      db.transaction(
        (tx) => {
          const before = tx.select().from(users).where(eq(users.id, id)).get();
          tx.update(users).set(change).where(eq(users.id, id)).run();
          const left = tx
            .select({ n: count() })
            .from(users)
            .where(and(eq(users.role, 'administrator'), eq(users.disabled, false), isNotNull(users.passwordHash)))
            .get();
          if ((left?.n ?? 0) > 0) return true;
          if (before)
            tx.update(users).set({ role: before.role, disabled: before.disabled }).where(eq(users.id, id)).run();
          return false;
        },
        { behavior: 'immediate' },
      ),
  };
}
