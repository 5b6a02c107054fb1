import { SAMPLE, seriesOf } from '../../../tests/support/sample-series';
import type { Period } from '../calendar/period';
import {
  annualAverages,
  figureAt,
  firstPeriod,
  neighbours,
  newestPeriod,
  newestYear,
  publishedDecimals,
  publishedMonths,
} from './figures';

const p = (text: string) => text as Period;

describe('figures of a series', () => {
  it('gives a figure exactly as published, and nothing for a gap', () => {
    expect(figureAt(SAMPLE, p('2025-09'))).toBe('324.800');
    expect(figureAt(SAMPLE, p('2025-10'))).toBeUndefined();
  });

  it.each([
    ['14.7', 1],
    ['13.0', 1],
    ['245.120', 3],
    ['100', 0],
  ])('%s was published to %i decimals', (figure, decimals) => {
    expect(publishedDecimals(figure)).toBe(decimals);
  });

  it('begins and ends with months where there are any', () => {
    expect([firstPeriod(SAMPLE), newestPeriod(SAMPLE)]).toEqual(['1939-09', '2026-05']);
    expect(newestYear(SAMPLE)).toBe('2025');
  });

  it('begins and ends with years in a series without months', () => {
    const yearly = seriesOf({ 1901: '9.0', 1900: '8.0' });
    expect([firstPeriod(yearly), newestPeriod(yearly)]).toEqual(['1900', '1901']);
  });

  it('has no first period without figures', () => {
    expect(() => firstPeriod(seriesOf({}))).toThrow('has no figures');
    expect(newestYear(seriesOf({}))).toBeUndefined();
  });

  it('lists the published months of a year and no others', () => {
    expect(publishedMonths(SAMPLE, 2025).map(({ period }) => period)).toEqual(['2025-09', '2025-11', '2025-12']);
    expect(publishedMonths(SAMPLE, 1929)).toEqual([]);
  });

  it('lists annual averages oldest first, whatever the order of the figures', () => {
    const years = annualAverages(seriesOf({ 1950: '24.1', 1941: '14.7', '1941-05': '14.4' }));
    expect(years).toEqual([
      { period: '1941', index: '14.7' },
      { period: '1950', index: '24.1' },
    ]);
  });
});

describe('nearest published periods', () => {
  it.each([
    ['2025-10', ['2025-09', '2025-11']],
    ['1930', ['1929', '1933']],
    ['2026', ['2025']],
    ['1912', ['1929']],
    ['2027-01', ['2026-05']],
    ['1913-01', ['1939-09']],
  ])('of %s are %j', (period, expected) => {
    expect(neighbours(SAMPLE, p(period))).toEqual(expected);
  });

  it('of a quarter, in a monthly index, are the months around its middle', () => {
    expect(neighbours(SAMPLE, p('1941-Q3'))).toEqual(['1941-07', '1941-09']);
    expect(neighbours(SAMPLE, p('2026-Q4'))).toEqual(['2026-05']);
  });
});
