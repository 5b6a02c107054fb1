import type { Period } from '../calendar/period';
import { yearScaleInput, type YearScaleContent } from './content';

const content = (price: string, restated: string): YearScaleContent => ({
  first: '1913-01' as Period,
  last: '2026-07' as Period,
  from: '1941' as Period,
  to: '2026-07' as Period,
  price,
  restated,
  currency: 'USD',
  curve: [{ period: '1941' as Period, amount: price }],
});

it.each([
  ['169.95', '3860.50', '$169.95', '$3,861'],
  ['3.50', '79.50', '$3.50', '$79.50'],
  ['250', '99.99', '$250.00', '$99.99'],
])('says %s and %s as %s and %s: cents when new, whole dollars from a hundred up', (price, restated, then, now) => {
  const input = yearScaleInput(content(price, restated), 'strip', 1020);
  expect([input.then.text, input.now.text]).toEqual([then, now]);
});

it('counts the axis in cents where the amounts are small, else in whole dollars', () => {
  expect(yearScaleInput(content('0.05', '1.18'), 'glass', 1296).formatAmount(1)).toBe('$1.00');
  expect(yearScaleInput(content('169.95', '3860.50'), 'glass', 1296).formatAmount(1000)).toBe('$1,000');
});

it('gives the curve by its years', () => {
  expect(yearScaleInput(content('169.95', '3860.50'), 'row', 190).curve).toEqual([{ year: 1941, amount: 169.95 }]);
});
