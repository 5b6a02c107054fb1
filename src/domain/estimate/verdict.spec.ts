import * as fc from 'fast-check';
import { worthInForce } from '../market/worth';
import { Dec } from '../money/decimal';
import type { Sums, Totals } from './totals';
import { costAgainstWorth, type StatedWorth } from './verdict';

const worth = (amount: string): StatedWorth => ({
  amount,
  valueType: 'fair-market',
  effectiveOn: '2026-04-09',
  saidBy: 'Ida Bell',
});
const sums = (total: string): Sums => ({
  labour: total,
  parts: '0.00',
  outside: '0.00',
  subtotal: total,
  taxable: '0.00',
  tax: '0.00',
  total,
});
const costing = (low: string, likely: string, high: string): Totals => ({
  currency: 'USD',
  hours: { low: '0', likely: '0', high: '0' },
  low: sums(low),
  likely: sums(likely),
  high: sums(high),
  deposit: '0.00',
  stages: [],
});

test.each([
  ['a clear gain', ['900.00', '1000.00', '1200.00'], 'At likely hours the work adds $600 more than it costs.'],
  ['a clear loss', ['1700.00', '2000.00', '2200.00'], 'At likely hours the work costs $400 more than it adds.'],
  ['even', ['1600.00', '1600.00', '1600.00'], 'At likely hours the work costs just what it adds.'],
  [
    'a gain that turns',
    ['900.00', '1500.00', '2000.00'],
    'At likely hours the work adds $100 more than it costs. If every line runs to its high hours, it costs $400 more than it adds.',
  ],
  [
    'a loss that may turn',
    ['1500.00', '1700.00', '2000.00'],
    'At likely hours the work costs $100 more than it adds. Only if every line keeps to its low hours does it add $100 more than it costs.',
  ],
])('%s is said plainly', (_what, [low = '', likely = '', high = ''], words) => {
  const verdict = costAgainstWorth(worth('650'), worth('2250'), costing(low, likely, high));
  expect(verdict).toMatchObject({
    asFound: '650.00',
    asRestored: '2250.00',
    uplift: '1600.00',
    cost: { low, likely, high },
  });
  expect(verdict.words).toBe(`${words} Money is one reason among others: the choice is yours.`);
});

test('names whose worths it rests on, and of when', () => {
  const { basis } = costAgainstWorth(
    worth('650'),
    { ...worth('2250'), saidBy: 'Idris B.', valueType: 'replacement' },
    costing('1', '1', '1'),
  );
  expect(basis).toContain('replacement value, Idris B., 9 Apr 2026');
  expect(basis).toContain('fair market value, Ida Bell, 9 Apr 2026');
});

test('work that lowers the worth counts against it', () => {
  const verdict = costAgainstWorth(worth('1000'), worth('700'), costing('100.00', '100.00', '100.00'));
  expect(verdict).toMatchObject({ uplift: '-300.00', gap: { atLikely: '-400.00' } });
});

test('the gap is worth restored less worth as found less cost, at every point', () => {
  const money = fc.integer({ min: 0, max: 9_999_999 }).map((n) => new Dec(n).div(100).toFixed(2));
  fc.assert(
    fc.property(money, money, money, money, money, (found, restored, low, likely, high) => {
      const { gap } = costAgainstWorth(worth(found), worth(restored), costing(low, likely, high));
      for (const [value, cost] of [
        [gap.atLow, low],
        [gap.atLikely, likely],
        [gap.atHigh, high],
      ] as const)
        expect(new Dec(value).plus(cost).plus(found).toFixed(2)).toBe(new Dec(restored).toFixed(2));
    }),
  );
});

describe('the worth in force', () => {
  const recorded = (
    id: number,
    effectiveOn: string,
    recordedAt: string,
    kind: 'as-found' | 'as-restored' = 'as-found',
  ) => ({ id, effectiveOn, recordedAt, kind });
  test('is the newest effective, then the newest recorded; of its own kind', () => {
    const a = recorded(1, '2025-01-01', '2026-01-01T00:00:00Z');
    const b = recorded(2, '2026-01-01', '2025-01-01T00:00:00Z');
    const c = recorded(3, '2026-01-01', '2025-06-01T00:00:00Z');
    const d = recorded(4, '2026-09-01', '2026-09-01T00:00:00Z', 'as-restored');
    expect(worthInForce([a, b, c, d], 'as-found')).toBe(c);
    expect(worthInForce([d, c, b, a], 'as-found')).toBe(c);
    expect(worthInForce([a, b, c], 'as-restored')).toBeUndefined();
  });
});
