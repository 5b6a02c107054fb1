/** Who may do what. The server asks before it acts; the client asks before it offers. One table serves both. */
export const ROLES = ['administrator', 'restorer', 'appraiser', 'collector'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_LABELS: Readonly<Record<Role, string>> = {
  administrator: 'Administrator',
  restorer: 'Restorer',
  appraiser: 'Appraiser',
  collector: 'Collector',
};

/** `all`: every record of the practice; `own`: records of sets the person owns. */
export type Scope = 'all' | 'own';

const EVERYONE_AT_WORK = { administrator: 'all', restorer: 'all', appraiser: 'all' } as const;

const POLICY = {
  'set.view': { ...EVERYONE_AT_WORK, collector: 'own' },
  'set.edit': EVERYONE_AT_WORK,
  'worth.record': EVERYONE_AT_WORK,
  'owner.list': EVERYONE_AT_WORK,
  'owner.edit': EVERYONE_AT_WORK,
  'estimate.view': { ...EVERYONE_AT_WORK, collector: 'own' },
  'estimate.edit': { administrator: 'all', restorer: 'all' },
  'paper.view': { ...EVERYONE_AT_WORK, collector: 'own' },
  'practice.view': EVERYONE_AT_WORK,
  'practice.edit': { administrator: 'all' },
  'user.manage': { administrator: 'all' },
} as const satisfies Record<string, Partial<Record<Role, Scope>>>;

export type Action = keyof typeof POLICY;
export const ACTIONS = Object.keys(POLICY) as Action[];

/** How far a role's permission for an action reaches, or null when there is none. */
export function scopeOf(role: Role, action: Action): Scope | null {
  const scopes: Partial<Record<Role, Scope>> = POLICY[action];
  return scopes[role] ?? null;
}

/** Whether the role may do the action at all; which records it reaches is `scopeOf`'s answer. */
export function can(role: Role | null | undefined, action: Action): boolean {
  return role != null && scopeOf(role, action) !== null;
}
