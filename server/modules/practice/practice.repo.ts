import { and, eq, sql } from 'drizzle-orm';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { practice } from '../../db/schema';

export type PracticeRow = typeof practice.$inferSelect;
export type PracticeRepo = ReturnType<typeof createPracticeRepo>;

export function createPracticeRepo(db: Database) {
  return {
    /** The practice's own row, for documents and defaults: it belongs to no one, so no proof is asked. */
    find: (): PracticeRow | undefined => db.select().from(practice).get(),

    insert: (row: typeof practice.$inferInsert): void => void db.insert(practice).values(row).run(),

    /** Changes the row if it still has the version given; answers whether it had. */
    update: (
      _auth: Authorized<'practice.edit'>,
      version: number,
      values: Partial<Omit<PracticeRow, 'id' | 'version' | 'demo'>>,
    ): boolean =>
      db
        .update(practice)
        .set({ ...values, version: sql`${practice.version} + 1` })
        .where(and(eq(practice.id, 1), eq(practice.version, version)))
        .run().changes === 1,
  };
}
