import type { ParamMap, Params } from '@angular/router';
import { listSets, SET_SORTS } from '../../../contracts/sets';
import { SET_KINDS, type SetKind } from '../../../domain/sets/terms';

export const SET_STATES = ['active', 'archived', 'all'] as const;
export type SetState = (typeof SET_STATES)[number];
export type SetSort = (typeof SET_SORTS)[number];

export const SET_STATE_LABELS: Readonly<Record<SetState, string>> = {
  active: 'Active',
  archived: 'Archived',
  all: 'Active and archived',
};
export const SET_SORT_LABELS: Readonly<Record<SetSort, string>> = {
  '-updated': 'Last changed',
  number: 'Number',
  maker: 'Maker and model',
  year: 'Year, oldest first',
  '-year': 'Year, newest first',
  '-worth': 'Worth restored, highest first',
};
export const PAGE_SIZE = 25;

/** What the list of sets is asked for, as the address holds it. */
export interface SetsQuery {
  readonly q: string;
  readonly kind: SetKind | '';
  readonly maker: string;
  readonly ownerId: string;
  readonly state: SetState;
  readonly sort: SetSort;
  /** From 1. */
  readonly page: number;
}

export const FIRST_QUERY: SetsQuery = {
  q: '',
  kind: '',
  maker: '',
  ownerId: '',
  state: 'active',
  sort: '-updated',
  page: 1,
};

/** Reads the address; a part that cannot be used is as if left out. */
export function readQuery(params: Pick<ParamMap, 'get'>): SetsQuery {
  const page = params.get('page') ?? '';
  const ownerId = params.get('ownerId') ?? '';
  return {
    q: (params.get('q') ?? '').slice(0, 100),
    kind: oneOf(SET_KINDS, params.get('kind')) ?? '',
    maker: (params.get('maker') ?? '').slice(0, 80),
    ownerId: listSets.query.shape.ownerId.safeParse(ownerId).success ? ownerId : '',
    state: oneOf(SET_STATES, params.get('state')) ?? FIRST_QUERY.state,
    sort: oneOf(SET_SORTS, params.get('sort')) ?? FIRST_QUERY.sort,
    page: /^[1-9]\d{0,4}$/.test(page) ? Number(page) : 1,
  };
}

/** The address's query of a list: only what differs from the first view. */
export function toParams(query: SetsQuery): Params {
  const entries = Object.entries(query).filter(([name, value]) => value !== FIRST_QUERY[name as keyof SetsQuery]);
  return Object.fromEntries(entries.map(([name, value]) => [name, String(value)]));
}

/** Whether anything narrows the list. Order and page do not. */
export const isNarrowed = ({ q, kind, maker, ownerId, state }: SetsQuery): boolean =>
  q.trim() !== '' || kind !== '' || maker !== '' || ownerId !== '' || state !== 'active';

function oneOf<T extends string>(choices: readonly T[], text: string | null): T | undefined {
  return choices.find((choice) => choice === text);
}
