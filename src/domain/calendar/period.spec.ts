import { formatDate, formatPeriod, midYear, parsePeriod, periodKind, yearOf, type Period } from './period';

test.each([
  ['1941', 'year', '1941', 1941.5],
  ['1941-05', 'month', 'May 1941', 1941 + 4.5 / 12],
  ['2026-12', 'month', 'Dec 2026', 2026 + 11.5 / 12],
  ['1948-Q3', 'quarter', 'Q3 1948', 1948 + 2.5 / 4],
])('%s is a %s, reads %s', (text, kind, words, middle) => {
  const period = text as Period;
  expect(parsePeriod(text)).toEqual({ ok: true, value: text });
  expect(periodKind(period)).toBe(kind);
  expect(formatPeriod(period)).toBe(words);
  expect(midYear(period)).toBeCloseTo(middle, 10);
  expect(yearOf(period)).toBe(Number(text.slice(0, 4)));
});

test.each(['', '41', '1941-13', '1941-00', '1941-5', '1941-Q5', '1941-Q0', '19411', '1941 ', 'May 1941', '1941-05-01'])(
  '%j is no period',
  (text) => {
    expect(parsePeriod(text)).toMatchObject({ ok: false, error: { code: 'not-a-period', text } });
  },
);

test('a date reads without leading zeros', () => {
  expect(formatDate('2026-04-09')).toBe('9 Apr 2026');
  expect(formatDate('2026-12-31T23:59:59Z')).toBe('31 Dec 2026');
});
