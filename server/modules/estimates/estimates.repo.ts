import { and, asc, desc, eq, inArray, like, max, or, sql, type SQL } from 'drizzle-orm';
import type { Action, Role } from '../../../src/domain/access/policy';
import { STAGES } from '../../../src/domain/estimate/terms';
import { idInNumber } from '../../../src/domain/sets/numbers';
import { foldText } from '../../../src/domain/text/fold';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { estimateLines, estimates, owners, sets, users } from '../../db/schema';
import type { LineColumns } from './line-columns';

export type EstimateRow = typeof estimates.$inferSelect;
export type LineRow = typeof estimateLines.$inferSelect;
export type EstimateSettings = Pick<
  EstimateRow,
  'title' | 'taxTreatment' | 'taxRatePpm' | 'taxNote' | 'depositPpm' | 'notes'
>;
export type EstimatesRepo = ReturnType<typeof createEstimatesRepo>;
export interface FoundEstimate extends EstimateRow {
  readonly preparer: string;
  readonly preparerRole: Role;
  readonly maker: string;
  readonly model: string;
  readonly ownerName: string | null;
}
export interface EstimateFilter {
  readonly q: string;
  readonly setId: number | undefined;
  readonly state: 'active' | 'archived' | 'all';
}
type Editing = Authorized<'estimate.edit'>;
type Seeing = Authorized<Action>;
type Tx = Parameters<Parameters<Database['transaction']>[0]>[0];

const IN_ORDER = sql`case ${estimateLines.stage} ${sql.join(
  STAGES.map((stage, at) => sql`when ${stage} then ${at}`),
  sql` `,
)} end`;

export function createEstimatesRepo(db: Database) {
  const joined = () =>
    db
      .select({
        estimate: estimates,
        preparer: users.name,
        preparerRole: users.role,
        maker: sets.maker,
        model: sets.model,
        ownerName: owners.name,
      })
      .from(estimates)
      .innerJoin(sets, eq(estimates.setId, sets.id))
      .innerJoin(users, eq(estimates.preparedBy, users.id))
      .leftJoin(owners, eq(sets.ownerId, owners.id))
      .$dynamic();
  const flat = ({
    estimate,
    ...rest
  }: { estimate: EstimateRow } & Omit<FoundEstimate, keyof EstimateRow>): FoundEstimate => ({
    ...estimate,
    ...rest,
  });

  const linesOf = (estimateIds: readonly number[]): LineRow[] =>
    db
      .select()
      .from(estimateLines)
      .where(inArray(estimateLines.estimateId, [...estimateIds]))
      .orderBy(asc(estimateLines.estimateId), asc(IN_ORDER), asc(estimateLines.position), asc(estimateLines.id))
      .all();

  const touch = (tx: Tx, estimateId: number, now: number) =>
    tx.update(estimates).set({ updatedAt: now }).where(eq(estimates.id, estimateId)).run();

  /** The position behind the last line of a stage. */
  function endOf(tx: Tx, estimateId: number, stage: LineRow['stage']): number {
    const last = tx
      .select({ at: max(estimateLines.position) })
      .from(estimateLines)
      .where(and(eq(estimateLines.estimateId, estimateId), eq(estimateLines.stage, stage)))
      .get();
    return (last?.at ?? 0) + 1;
  }

  /** Puts a line behind another of its stage, or first, and numbers the stage's lines anew. */
  function place(tx: Tx, line: Pick<LineRow, 'id' | 'estimateId' | 'stage'>, afterLineId: number | null): void {
    const others = tx
      .select({ id: estimateLines.id })
      .from(estimateLines)
      .where(and(eq(estimateLines.estimateId, line.estimateId), eq(estimateLines.stage, line.stage)))
      .orderBy(asc(estimateLines.position), asc(estimateLines.id))
      .all()
      .map(({ id }) => id)
      .filter((id) => id !== line.id);
    const at = afterLineId === null ? 0 : others.indexOf(afterLineId) + 1;
    others.splice(at, 0, line.id);
    others.forEach((id, position) =>
      tx
        .update(estimateLines)
        .set({ position: position + 1 })
        .where(eq(estimateLines.id, id))
        .run(),
    );
  }

  return {
    find(auth: Seeing, id: number): FoundEstimate | undefined {
      const row = joined()
        .where(and(eq(estimates.id, id), reach(auth)))
        .get();
      return row && flat(row);
    },

    /** Every estimate that fits, newest first; their sums decide order and page, so these are the caller's. */
    list: (auth: Seeing, filter: EstimateFilter): FoundEstimate[] =>
      joined()
        .where(and(reach(auth), ...filters(filter)))
        .orderBy(desc(estimates.updatedAt), desc(estimates.id))
        .all()
        .map(flat),

    /** The lines of estimates already found with a proof, in the order of the job. */
    lines: linesOf,

    insert: (_auth: Editing, row: Omit<typeof estimates.$inferInsert, 'id'>): number =>
      db.insert(estimates).values(row).returning({ id: estimates.id }).get().id,

    /** Changes the settings if the estimate still has the version given; answers whether it had. */
    update: (_auth: Editing, id: number, version: number, values: EstimateSettings, now: number): boolean =>
      db
        .update(estimates)
        .set({ ...values, version: version + 1, updatedAt: now })
        .where(and(eq(estimates.id, id), eq(estimates.version, version)))
        .run().changes === 1,

    setArchived: (_auth: Editing, id: number, archived: boolean, now: number): void =>
      void db.update(estimates).set({ archived, updatedAt: now }).where(eq(estimates.id, id)).run(),

    line: (_auth: Editing, estimateId: number, lineId: number): LineRow | undefined =>
      db
        .select()
        .from(estimateLines)
        .where(and(eq(estimateLines.id, lineId), eq(estimateLines.estimateId, estimateId)))
        .get(),

    /** Adds behind the line named (of the same stage), or at the end of the stage. */
    insertLine: (
      _auth: Editing,
      estimateId: number,
      columns: LineColumns,
      afterLineId: number | null,
      now: number,
    ): number =>
      db.transaction(
        (tx) => {
          const line = tx
            .insert(estimateLines)
            .values({ ...columns, estimateId, position: endOf(tx, estimateId, columns.stage) })
            .returning()
            .get();
          if (afterLineId !== null) place(tx, line, afterLineId);
          touch(tx, estimateId, now);
          return line.id;
        },
        { behavior: 'immediate' },
      ),

    /** Changes a line if it still has the version given; answers whether it had. A changed stage puts it at its end. */
    updateLine: (_auth: Editing, before: LineRow, version: number, columns: LineColumns, now: number): boolean =>
      db.transaction(
        (tx) => {
          const position =
            columns.stage === before.stage ? before.position : endOf(tx, before.estimateId, columns.stage);
          const { changes } = tx
            .update(estimateLines)
            .set({ ...columns, position, version: version + 1 })
            .where(and(eq(estimateLines.id, before.id), eq(estimateLines.version, version)))
            .run();
          if (changes === 0) return false;
          touch(tx, before.estimateId, now);
          return true;
        },
        { behavior: 'immediate' },
      ),

    removeLine: (_auth: Editing, line: LineRow, version: number, now: number): boolean =>
      db.transaction(
        (tx) => {
          const { changes } = tx
            .delete(estimateLines)
            .where(and(eq(estimateLines.id, line.id), eq(estimateLines.version, version)))
            .run();
          if (changes === 0) return false;
          touch(tx, line.estimateId, now);
          return true;
        },
        { behavior: 'immediate' },
      ),

    moveLine: (_auth: Editing, line: LineRow, afterLineId: number | null, now: number): void =>
      db.transaction(
        (tx) => {
          place(tx, line, afterLineId);
          touch(tx, line.estimateId, now);
        },
        { behavior: 'immediate' },
      ),
  };
}

const reach = (auth: Seeing): SQL | undefined =>
  auth.scope === 'all' ? undefined : eq(owners.userId, auth.actor.userId);

const SEARCHED = sql`fold(${estimates.title} || ' ' || ${sets.maker} || ' ' || ${sets.model} || ' ' || coalesce(${owners.name}, ''))`;

function filters({ q, setId, state }: EstimateFilter): (SQL | undefined)[] {
  const id = idInNumber('E', q);
  const words = foldText(q)
    .split(/\s+/)
    .filter((word) => word !== '');
  const byWords = and(
    ...words.map((word) => sql`${like(SEARCHED, `%${word.replace(/[\\%_]/g, '\\$&')}%`)} escape '\\'`),
  );
  return [
    id === null ? byWords : or(eq(estimates.id, id), byWords),
    setId === undefined ? undefined : eq(estimates.setId, setId),
    state === 'all' ? undefined : eq(estimates.archived, state === 'archived'),
  ];
}
