import type { User } from '../../../contracts/users';
import { personState } from './person-state';

const person: User = {
  id: 2,
  name: 'Nell Harrow',
  email: 'nell@quayside.example',
  role: 'restorer',
  state: 'active',
  lastSeenAt: null,
  invitationExpiresAt: null,
};
const NOON = Date.UTC(2026, 3, 14, 12);

describe('how a person stands', () => {
  it('is active or disabled', () => {
    expect(personState(person, NOON).text).toBe('Active');
    expect(personState({ ...person, state: 'disabled' }, NOON).text).toBe('Disabled');
  });

  it('is invited until the invitation runs out', () => {
    const invited: User = { ...person, state: 'invited', invitationExpiresAt: '2026-04-14T12:00:01.000Z' };
    expect(personState(invited, NOON).text).toBe('Invited');
    expect(personState(invited, NOON + 1000).text).toBe('Invitation ran out');
  });
});
