import { and, asc, desc, eq, like, sql, type SQL } from 'drizzle-orm';
import type { InputOf } from '../../../src/contracts/contract';
import type { listSets } from '../../../src/contracts/sets';
import type { Action } from '../../../src/domain/access/policy';
import { idInNumber } from '../../../src/domain/sets/numbers';
import { foldText } from '../../../src/domain/text/fold';
import type { Authorized } from '../../db/authorized';
import { owners, sets } from '../../db/schema';

export type SetsQuery = InputOf<typeof listSets>['query'];

/** Limits a query joined with owners to the sets that the proof reaches. */
export const reach = (auth: Authorized<Action>): SQL | undefined =>
  auth.scope === 'all' ? undefined : eq(owners.userId, auth.actor.userId);

/** The conditions of a list's filters and words. */
export function filters({ q, kind, maker, ownerId, state }: SetsQuery): SQL | undefined {
  return and(
    ...searchWords(q ?? ''),
    kind === undefined ? undefined : eq(sets.kind, kind),
    maker === undefined || maker === '' ? undefined : eq(sets.maker, maker),
    ownerId === undefined ? undefined : eq(sets.ownerId, ownerId),
    state === 'all' ? undefined : eq(sets.archived, state === 'archived'),
  );
}

/** `fold` is defined on the connection: small letters, no marks. */
const SEARCHED = sql`fold(printf('S-%04d ', ${sets.id}) || ${sets.maker} || ' ' || ${sets.model} || ' ' || ${sets.description} || ' ' || ${sets.serial} || ' ' || ${sets.chassis} || ' ' || coalesce(${sets.year}, '') || ' ' || coalesce(${owners.name}, ''))`;

/** Every word must occur somewhere; a set's number alone, with or without its zeros, finds that set. */
export function searchWords(text: string): SQL[] {
  const id = idInNumber('S', text);
  if (id !== null && /^s/i.test(text.trim())) return [eq(sets.id, id)];
  return foldText(text)
    .split(/\s+/)
    .filter((word) => word !== '')
    .map((word) => sql`${like(SEARCHED, `%${word.replace(/[\\%_]/g, '\\$&')}%`)} escape '\\'`);
}

const worthRestored = sql`(select w.amount_cents from set_worths w where w.set_id = ${sets.id} and w.kind = 'as-restored' order by w.effective_on desc, w.recorded_at desc, w.id desc limit 1)`;

export function ordering(sort: SetsQuery['sort']): SQL[] {
  switch (sort) {
    case 'number':
      return [asc(sets.id)];
    case 'maker':
      return [asc(sql`fold(${sets.maker})`), asc(sql`fold(${sets.model})`), asc(sets.id)];
    case 'year':
      return [sql`${sets.year} is null`, asc(sets.year), asc(sets.id)];
    case '-year':
      return [sql`${sets.year} is null`, desc(sets.year), asc(sets.id)];
    case '-worth':
      return [sql`${worthRestored} desc nulls last`, asc(sets.id)];
    case '-updated':
      return [desc(sets.updatedAt), desc(sets.id)];
  }
}
