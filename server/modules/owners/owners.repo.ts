import { and, asc, count, eq, isNull, sql } from 'drizzle-orm';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { owners, sets } from '../../db/schema';

export type OwnerRow = typeof owners.$inferSelect;
export type OwnersRepo = ReturnType<typeof createOwnersRepo>;

export function createOwnersRepo(db: Database) {
  return {
    list: (_auth: Authorized<'owner.list'>): (OwnerRow & { readonly setCount: number })[] =>
      db
        .select({ owner: owners, setCount: count(sets.id) })
        .from(owners)
        .leftJoin(sets, eq(sets.ownerId, owners.id))
        .groupBy(owners.id)
        .orderBy(asc(sql`fold(${owners.name})`), asc(owners.id))
        .all()
        .map(({ owner, setCount }) => ({ ...owner, setCount })),

    insert: (_auth: Authorized<'owner.edit'>, row: Omit<typeof owners.$inferInsert, 'id'>): OwnerRow =>
      db.insert(owners).values(row).returning().get(),

    /** Gives the sets of this address to the collector who proved, by accepting an invitation, that it is theirs. */
    linkUser: (email: string, userId: number): void =>
      void db
        .update(owners)
        .set({ userId })
        .where(and(sql`lower(trim(${owners.email})) = ${email.trim().toLowerCase()}`, isNull(owners.userId)))
        .run(),
  };
}
