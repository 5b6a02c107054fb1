import type { ParamMap, Params } from '@angular/router';
import { ESTIMATE_SORTS } from '../../../contracts/estimates';

export const ESTIMATE_STATES = ['active', 'archived', 'all'] as const;
export const ESTIMATE_STATE_LABELS: Readonly<Record<(typeof ESTIMATE_STATES)[number], string>> = {
  active: 'Active',
  archived: 'Archived',
  all: 'Active and archived',
};
export const ESTIMATE_SORT_LABELS: Readonly<Record<(typeof ESTIMATE_SORTS)[number], string>> = {
  '-updated': 'Last changed',
  number: 'Number',
  '-total': 'Total, highest first',
  set: 'Set',
};

/** What the list of estimates is asked for, as the address holds it. */
export interface EstimatesQuery {
  readonly q: string;
  readonly state: (typeof ESTIMATE_STATES)[number];
  readonly sort: (typeof ESTIMATE_SORTS)[number];
  /** From 1. */
  readonly page: number;
}

export const FIRST_QUERY: EstimatesQuery = { q: '', state: 'active', sort: '-updated', page: 1 };

/** Reads the address; a part that cannot be used is as if left out. */
export function readQuery(params: Pick<ParamMap, 'get'>): EstimatesQuery {
  const page = params.get('page') ?? '';
  return {
    q: (params.get('q') ?? '').slice(0, 100),
    state: ESTIMATE_STATES.find((state) => state === params.get('state')) ?? FIRST_QUERY.state,
    sort: ESTIMATE_SORTS.find((sort) => sort === params.get('sort')) ?? FIRST_QUERY.sort,
    page: /^[1-9]\d{0,4}$/.test(page) ? Number(page) : 1,
  };
}

/** The address's query of a list: only what differs from the first view. */
export function toParams(query: EstimatesQuery): Params {
  const entries = Object.entries(query).filter(([name, value]) => value !== FIRST_QUERY[name as keyof EstimatesQuery]);
  return Object.fromEntries(entries.map(([name, value]) => [name, String(value)]));
}

export const isNarrowed = ({ q, state }: EstimatesQuery): boolean => q.trim() !== '' || state !== 'active';
