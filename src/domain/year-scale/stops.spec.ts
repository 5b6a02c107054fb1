import * as fc from 'fast-check';
import { midYear, type Period } from '../calendar/period';
import { nearestStop, needleLimits, needleStops, stepNeedle, type Step } from './stops';

const period = (text: string) => text as Period;
const years = Array.from({ length: 113 }, (_, i) => period(String(1913 + i)));
const stops = needleStops(years, period('2026-07'));
const all = { least: period('1913'), most: period('2026-07') };

it('the stops are the published years and the newest month of a year without an average', () => {
  expect(stops.slice(-2)).toEqual(['2025', '2026-07']);
  expect(needleStops(years, period('2025-12')).at(-1)).toBe('2025');
});

it.each<[string, Step, string]>([
  ['1941', 1, '1942'],
  ['1941', -1, '1940'],
  ['1941', 10, '1951'],
  ['1941', -10, '1931'],
  ['1941-05', 1, '1942'],
  ['1941-05', -1, '1940'],
  ['2025', 1, '2026-07'],
  ['2026-07', -1, '2025'],
  ['2026-07', 1, '2026-07'],
  ['1913', -1, '1913'],
  ['1915', -10, '1913'],
  ['2020', 10, '2026-07'],
  ['1941', 'first', '1913'],
  ['1941', 'last', '2026-07'],
])('from %s a step of %p leads to %s', (from, step, to) => {
  expect(stepNeedle(stops, period(from), step, all)).toBe(to);
});

it('a needle halts at the other one', () => {
  const limits = needleLimits(stops, period('1941'), period('1945'), 'then');
  expect(stepNeedle(stops, period('1941'), 10, limits)).toBe('1945');
  expect(nearestStop(stops, 1990, limits)).toBe('1945');
  const mirrored = needleLimits(stops, period('1945'), period('1941'), 'then');
  expect(stepNeedle(stops, period('1945'), -10, mirrored)).toBe('1941');
});

it('needles on one place part in their own directions', () => {
  expect(needleLimits(stops, period('1941'), period('1941'), 'then')).toEqual({ least: '1913', most: '1941' });
  expect(needleLimits(stops, period('1941'), period('1941'), 'now')).toEqual({ least: '1941', most: '2026-07' });
});

it('no step passes the limits or turns back', () => {
  const at = fc.integer({ min: 0, max: stops.length - 1 });
  const anyStep = fc.constantFrom<Step>(-10, -1, 1, 10, 'first', 'last');
  fc.assert(
    fc.property(at, at, anyStep, (i, j, step) => {
      const [needle, other] = [stops[i]!, stops[j]!];
      const limits = needleLimits(stops, needle, other, 'then');
      const to = midYear(stepNeedle(stops, needle, step, limits));
      expect(to).toBeGreaterThanOrEqual(midYear(limits.least));
      expect(to).toBeLessThanOrEqual(midYear(limits.most));
      if (typeof step === 'number') expect((to - midYear(needle)) * step).toBeGreaterThanOrEqual(0);
    }),
  );
});
