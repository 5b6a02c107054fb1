import { and, eq, gt, lte, ne } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { sessions } from '../../db/schema';
import type { SessionRows } from '../../http/session';

/** The rows behind express-session. They answer only to the hash of a cookie's id, which is its own proof. */
export function createSessionRows(db: Database): SessionRows {
  return {
    read: (idHash, now) =>
      db
        .select({ data: sessions.data })
        .from(sessions)
        .where(and(eq(sessions.idHash, idHash), gt(sessions.expiresAt, now)))
        .get()?.data ?? null,
    write: (row) =>
      void db
        .insert(sessions)
        .values(row)
        .onConflictDoUpdate({
          target: sessions.idHash,
          set: { userId: row.userId, data: row.data, expiresAt: row.expiresAt },
        })
        .run(),
    touch: (idHash, expiresAt) => void db.update(sessions).set({ expiresAt }).where(eq(sessions.idHash, idHash)).run(),
    remove: (idHash) => void db.delete(sessions).where(eq(sessions.idHash, idHash)).run(),
  };
}

/** Ends sessions of one person, all of them or all but the one in hand, and those that have run out. */
export function createSessionEnding(db: Database) {
  return {
    endAll: (userId: number): void => void db.delete(sessions).where(eq(sessions.userId, userId)).run(),
    endOthers: (userId: number, keepIdHash: string): void =>
      void db
        .delete(sessions)
        .where(and(eq(sessions.userId, userId), ne(sessions.idHash, keepIdHash)))
        .run(),
    endExpired: (now: number): void => void db.delete(sessions).where(lte(sessions.expiresAt, now)).run(),
  };
}
