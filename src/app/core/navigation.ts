import type { Action } from '../../domain/access/policy';

export interface Place {
  readonly path: string;
  readonly label: string;
  readonly icon: string;
  /** Whom it is shown to; null is anyone. */
  readonly action: Action | null;
}

/** The places of the top bar and the dock, in order. */
export const PLACES: readonly Place[] = [
  { path: '/sets', label: 'Sets', icon: 'radio', action: 'set.view' },
  { path: '/estimates', label: 'Estimates', icon: 'calculate', action: 'estimate.view' },
  { path: '/people', label: 'People', icon: 'group', action: 'user.manage' },
  { path: '/practice', label: 'Practice', icon: 'storefront', action: 'practice.edit' },
  { path: '/then-and-now', label: 'Then and now', icon: 'straighten', action: null },
];

/** Where a person starts after signing in. */
export const HOME = '/sets';
