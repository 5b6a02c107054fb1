import { ACTIONS, can, ROLES, scopeOf } from './policy';

test('nobody may do anything', () => {
  for (const action of ACTIONS) expect([can(null, action), can(undefined, action)]).toEqual([false, false]);
});

test('a collector reaches their own records and changes none', () => {
  expect(ACTIONS.filter((action) => can('collector', action))).toEqual(['set.view', 'estimate.view', 'paper.view']);
  for (const action of ACTIONS) expect(scopeOf('collector', action)).not.toBe('all');
});

test('people and settings are the administrator’s alone', () => {
  for (const action of ['user.manage', 'practice.edit'] as const)
    expect(ROLES.filter((role) => can(role, action))).toEqual(['administrator']);
});

test('pricing is the restorer’s and the administrator’s; an appraiser reads it', () => {
  expect(ROLES.filter((role) => can(role, 'estimate.edit'))).toEqual(['administrator', 'restorer']);
  expect(can('appraiser', 'estimate.view')).toBe(true);
});

test('an administrator can do whatever anybody can', () => {
  for (const action of ACTIONS) expect(scopeOf('administrator', action)).toBe('all');
});
