import type { User } from '../../../contracts/users';

export interface PersonState {
  readonly tone: 'attention' | 'done' | 'stopped';
  readonly icon: string;
  readonly text: string;
}

/** How a person stands with the practice at an instant (UTC, ms): an invitation may have run out by then. */
export function personState(person: User, now: number): PersonState {
  if (person.state === 'active') return { tone: 'done', icon: 'check', text: 'Active' };
  if (person.state === 'disabled') return { tone: 'stopped', icon: 'lock', text: 'Disabled' };
  const { invitationExpiresAt: expiry } = person;
  return expiry !== null && Date.parse(expiry) <= now
    ? { tone: 'stopped', icon: 'history', text: 'Invitation ran out' }
    : { tone: 'attention', icon: 'schedule', text: 'Invited' };
}
