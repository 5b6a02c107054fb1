import { and, asc, count, desc, eq, inArray, isNotNull, max, sql } from 'drizzle-orm';
import type { Action } from '../../../src/domain/access/policy';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { owners, setConditions, setHazards, setPhotos, sets, setWorths } from '../../db/schema';
import { filters, ordering, reach, type SetsQuery } from './sets.query.repo';

export type SetRow = typeof sets.$inferSelect;
export type SetValues = Omit<typeof sets.$inferInsert, 'id' | 'version' | 'createdAt' | 'updatedAt' | 'archived'>;
export type HazardValues = Pick<typeof setHazards.$inferSelect, 'hazard' | 'volts' | 'note'>;
export type WorthRow = typeof setWorths.$inferSelect;
export type ConditionRow = typeof setConditions.$inferSelect;
export type NewCondition = Omit<typeof setConditions.$inferInsert, 'id' | 'setId' | 'recordedAt'>;
export type NewWorth = Omit<typeof setWorths.$inferInsert, 'id' | 'setId' | 'recordedAt'>;
export type SetsRepo = ReturnType<typeof createSetsRepo>;
export type OwnedSet = SetRow & { readonly ownerName: string | null };

/** A proof that reaches sets: its scope decides which rows a query sees. */
type Seeing = Authorized<Action>;
type Editing = Authorized<'set.edit'>;

export function createSetsRepo(db: Database) {
  const owned = () =>
    db
      .select({ set: sets, ownerName: owners.name })
      .from(sets)
      .leftJoin(owners, eq(sets.ownerId, owners.id))
      .$dynamic();

  /** Every change within a set shows in the date of its last change. */
  const touch = (tx: Pick<Database, 'update'>, id: number, now: number): void =>
    void tx.update(sets).set({ updatedAt: now }).where(eq(sets.id, id)).run();

  return {
    find(auth: Seeing, id: number): OwnedSet | undefined {
      const row = owned()
        .where(and(eq(sets.id, id), reach(auth)))
        .get();
      return row && { ...row.set, ownerName: row.ownerName };
    },

    list(auth: Seeing, query: SetsQuery): { readonly rows: OwnedSet[]; readonly total: number } {
      const where = and(reach(auth), filters(query));
      const total = db
        .select({ n: count() })
        .from(sets)
        .leftJoin(owners, eq(sets.ownerId, owners.id))
        .where(where)
        .get();
      const rows = owned()
        .where(where)
        .orderBy(...ordering(query.sort))
        .limit(query.pageSize)
        .offset((query.page - 1) * query.pageSize)
        .all();
      return { rows: rows.map(({ set, ownerName }) => ({ ...set, ownerName })), total: total?.n ?? 0 };
    },

    makers: (auth: Seeing): string[] =>
      db
        .selectDistinct({ maker: sets.maker })
        .from(sets)
        .leftJoin(owners, eq(sets.ownerId, owners.id))
        .where(reach(auth))
        .orderBy(asc(sets.maker))
        .all()
        .map(({ maker }) => maker),

    /** Hazards, condition, worths and first photograph of sets already found with a proof. */
    hazards: (setIds: readonly number[]) =>
      db
        .select()
        .from(setHazards)
        .where(inArray(setHazards.setId, [...setIds]))
        .orderBy(asc(setHazards.id))
        .all(),
    conditions: (setId: number): ConditionRow[] =>
      db
        .select()
        .from(setConditions)
        .where(eq(setConditions.setId, setId))
        .orderBy(desc(setConditions.notedOn), desc(setConditions.id))
        .all(),
    worths: (setIds: readonly number[]): (WorthRow & { readonly recorder: string })[] =>
      db
        .select({
          worth: setWorths,
          recorder: sql<string>`(select name from users where users.id = ${setWorths.recordedBy})`,
        })
        .from(setWorths)
        .where(inArray(setWorths.setId, [...setIds]))
        .orderBy(desc(setWorths.effectiveOn), desc(setWorths.recordedAt), desc(setWorths.id))
        .all()
        .map(({ worth, recorder }) => ({ ...worth, recorder })),
    firstPhotos: (setIds: readonly number[]): ReadonlyMap<number, number> =>
      new Map(
        db
          .select({ setId: setPhotos.setId, id: setPhotos.id })
          .from(setPhotos)
          .where(inArray(setPhotos.setId, [...setIds]))
          .orderBy(desc(setPhotos.position), desc(setPhotos.id))
          .all()
          .map(({ setId, id }) => [setId, id]),
      ),

    insert: (_auth: Editing, values: SetValues, hazards: readonly HazardValues[], now: number): number =>
      db.transaction(
        (tx) => {
          const { id } = tx
            .insert(sets)
            .values({ ...values, createdAt: now, updatedAt: now })
            .returning({ id: sets.id })
            .get();
          if (hazards.length > 0)
            tx.insert(setHazards)
              .values(hazards.map((h) => ({ ...h, setId: id })))
              .run();
          return id;
        },
        { behavior: 'immediate' },
      ),

    /** Changes the set if it still has the version given; answers whether it had. */
    update: (
      _auth: Editing,
      id: number,
      version: number,
      values: SetValues,
      hazards: readonly HazardValues[],
      now: number,
    ): boolean =>
      db.transaction(
        (tx) => {
          const { changes } = tx
            .update(sets)
            .set({ ...values, version: version + 1, updatedAt: now })
            .where(and(eq(sets.id, id), eq(sets.version, version)))
            .run();
          if (changes === 0) return false;
          tx.delete(setHazards).where(eq(setHazards.setId, id)).run();
          if (hazards.length > 0)
            tx.insert(setHazards)
              .values(hazards.map((h) => ({ ...h, setId: id })))
              .run();
          return true;
        },
        { behavior: 'immediate' },
      ),

    setArchived: (_auth: Editing, id: number, archived: boolean, now: number): void =>
      void db.update(sets).set({ archived, updatedAt: now }).where(eq(sets.id, id)).run(),

    insertConditions: (_auth: Editing, setId: number, rows: readonly NewCondition[], now: number): void =>
      db.transaction(
        (tx) => {
          tx.insert(setConditions)
            .values(rows.map((row) => ({ ...row, setId, recordedAt: now })))
            .run();
          touch(tx, setId, now);
        },
        { behavior: 'immediate' },
      ),

    insertWorth: (_auth: Authorized<'worth.record'>, setId: number, row: NewWorth, now: number): void =>
      db.transaction(
        (tx) => {
          tx.insert(setWorths)
            .values({ ...row, setId, recordedAt: now })
            .run();
          touch(tx, setId, now);
        },
        { behavior: 'immediate' },
      ),

    /**
     * Prices of models that the practice shows to anyone, each model and period once; neither owner nor serial is
     * read. With max() SQLite takes the other columns of the row that has it: the set changed last.
     */
    publicPrices: () =>
      db
        .select({
          changed: max(sets.updatedAt),
          kind: sets.kind,
          maker: sets.maker,
          model: sets.model,
          priceCents: sets.priceCents,
          priceCurrency: sets.priceCurrency,
          pricePeriod: sets.pricePeriod,
          priceSource: sets.priceSource,
        })
        .from(sets)
        .where(and(eq(sets.priceIsPublic, true), eq(sets.archived, false), isNotNull(sets.priceCents)))
        .groupBy(sets.maker, sets.model, sets.pricePeriod)
        .orderBy(asc(sets.pricePeriod), asc(sets.maker), asc(sets.model))
        .all(),
  };
}
