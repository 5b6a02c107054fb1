import { parsePeriod, type Period } from '../../src/domain/calendar/period';
import type { PlainDecimal } from '../../src/domain/money/money';
import { restate, restatedCurve } from '../../src/domain/restatement/restate';
import { expectOk } from '../../src/domain/result';
import { publishedDecimals, publishedFigures, publishedMonths } from '../../src/domain/series/figures';
import type { IndexSeries } from '../../src/domain/series/series';
import { cpi, cpi1967 } from '../support/published';
import { seriesOf } from '../support/sample-series';

/*
 * Values from outside: read in a public copy of the source named, or computed apart (Python's decimal module) from the
 * figures cited. «From memory» and «common practice, no source» are marked so.
 */

const between = (amount: string, from: string, to: string, series: IndexSeries = cpi) =>
  expectOk(restate({ series, amount: amount as PlainDecimal, from: from as Period, to: to as Period }));

/** Percent change between two published levels, by the factor of restating one as a price paid in the other's time. */
const percentChange = (from: string, to: string) =>
  (Number(between('1', '1901', '1902', seriesOf({ 1901: from, 1902: to })).factor) - 1) * 100;

describe('percent change and restating', () => {
  it('P-01 the agency’s worked example: 239.261 in April to 240.236 in May 2016 is 0.4075 %, published as 0.4 %', () => {
    // Bureau of Labor Statistics, «CPI math calculations» (Perrins and Nilsen)
    expect(percentChange('239.261', '240.236')).toBeCloseTo(0.4075, 4);
    expect(percentChange('239.261', '240.236').toFixed(1)).toBe('0.4');
  });

  it('P-01 with May 2016 as corrected: 240.229, which leaves the published 0.4 %', () => {
    // Bureau of Labor Statistics corrected May to August 2016; the worked example prints the figure before that
    const { from, to, factor } = between('1', '2016-04', '2016-05');
    expect([from.index, to.index]).toEqual(['239.261', '240.229']);
    expect(((Number(factor) - 1) * 100).toFixed(1)).toBe('0.4');
  });

  it('P-02 escalation from 229.815 to 232.945 is 1.4 %', () => {
    // Bureau of Labor Statistics’ escalation example, as quoted by lawinsider; the months carry these figures here
    const { from, to, factor } = between('1', '2012-05', '2013-05');
    expect([from.index, to.index]).toEqual(['229.815', '232.945']);
    expect((Number(factor) - 1) * 100).toBeCloseTo(1.361965, 6);
  });

  it.each([
    ['112.500', '121.500', '8.0'],
    ['225.000', '243.000', '8.0'],
    ['110.000', '128.000', '16.4'],
  ])('P-03 equal points are not equal percents: %s to %s is %s %', (from, to, percent) => {
    // technical note of the agency’s CPI release
    expect(percentChange(from, to).toFixed(1)).toBe(percent);
  });

  it.each([
    ['201.427', '205.916', 2.22859, '2.2'],
    ['195.144', '201.427', 3.2197, '3.2'],
  ])('P-04 %s to %s is %f %', (from, to, percent, published) => {
    // labor.alaska.gov
    expect(percentChange(from, to)).toBeCloseTo(percent, 4);
    expect(percentChange(from, to).toFixed(1)).toBe(published);
  });

  it('P-05 129.9 to 136.0 is 4.7 %', () => {
    // UK Office for National Statistics, CPI Technical Manual 2019, table 7
    expect(percentChange('129.9', '136.0')).toBeCloseTo(4.6959, 4);
  });

  it('P-06 a rise of 7 % from the base shows as 107.0', () => {
    // Bureau of Labor Statistics, «CPI math calculations»
    expect(between('1', '1901', '1902', seriesOf({ 1901: '100.0', 1902: '107.0' })).factor).toBe('1.07');
  });

  it('P-07 29.95 in 1939 is 446.66 in 2007 by the table with one decimal', () => {
    // Federal Reserve Bank of Minneapolis, table 1913-2008: 13.9 and 207.3
    const { factor, restated } = between('29.95', '1939', '2007', seriesOf({ 1939: '13.9', 2007: '207.3' }));
    expect(Number(factor)).toBeCloseTo(14.913669, 6);
    expect(restated).toBe('446.66');
  });

  it.each([
    ['P-08', '29.95', '1939', '2024', 22.567554, '675.90'],
    ['P-11', '375.00', '1949', '2024', 13.18021, '4942.58'],
    ['P-12', '29.95', '1939-09', '2024-12', 22.383333, '670.38'],
    ['P-12', '29.95', '1939-09', '2026-05', 23.767589, '711.84'],
    ['P-14', '100.00', '1929', '1933', 0.760234, '76.02'],
  ])('%s %s in %s comes to × %#f in %s', (_id, amount, from, to, factor, restated) => {
    // computed apart from the monthly figures of a public copy (P-20) and the published annual averages
    const result = between(amount, from, to);
    expect(Number(result.factor)).toBeCloseTo(factor, 6);
    expect(result.restated).toBe(restated);
  });

  it('P-14 falling prices: less in 1933 than in 1929, in every year between them on the way down', () => {
    const curve = expectOk(restatedCurve(cpi, '100' as PlainDecimal, '1929' as Period));
    const slump = curve
      .filter(({ period }) => period >= '1929' && period <= '1933')
      .map(({ amount }) => Number(amount));
    expect(slump).toEqual([...slump].sort((a, b) => b - a));
    expect([slump.at(0), slump.at(-1)]).toEqual([100, 76.02]);
  });

  it('P-15 the same year is the same amount, by a factor of exactly 1', () => {
    expect(between('29.95', '1939', '1939')).toMatchObject({ factor: '1', restated: '29.95' });
  });

  it('P-15 there and back by unrounded factors gives the amount again', () => {
    const series = seriesOf({ 1939: '13.9', 2007: '207.3' });
    expect(between('446.66', '2007', '1939', series).restated).toBe('29.95');
    for (const { period } of publishedFigures(cpi, 'year')) {
      const there = Number(between('1', '1939', period).factor);
      const back = Number(between('1', period, '1939').factor);
      expect(29.95 * there * back).toBeCloseTo(29.95, 10);
    }
  });

  it('P-16 an index of 13.9 carries ± 0.36 %: 675.90 is known to about ± 2.4', () => {
    const { restated, rounding, precisionAmount } = between('29.95', '1939', '2024');
    const half = (Number(rounding.high) - Number(rounding.low)) / 2;
    expect((half / Number(restated)) * 100).toBeCloseTo(0.36, 2);
    expect(half).toBeCloseTo(2.4, 1);
    expect(precisionAmount).toBe('676'); // three significant figures
  });

  it('P-50 a change of base changes no restated amount while figures are unrounded', () => {
    const rebased: IndexSeries = {
      ...cpi,
      figures: new Map([...cpi.figures].map(([period, index]) => [period, String(Number(index) * 4)])),
    };
    for (const [from, to] of [
      ['1913', '2024'],
      ['1941-05', '2026-05'],
      ['1929', '1933'],
    ] as const) {
      const [ours, theirs] = [cpi, rebased].map((series) => Number(between('1', from, to, series).factor));
      expect(theirs).toBeCloseTo(ours ?? 0, 9);
    }
  });

  it('P-50 figures rounded on another base do change it, within the band, and the basis says which was used', () => {
    const [ours, older] = [cpi, cpi1967].map((series) => between('169.95', '1941', '2017', series));
    expect(ours?.restated).not.toBe(older?.restated);
    expect(Number(older?.restated)).toBeGreaterThan(Number(ours?.rounding.low));
    expect(Number(older?.restated)).toBeLessThan(Number(ours?.rounding.high));
    expect(ours?.basis).toContain('CUUR0000SA0, 1982-84=100');
    expect(older?.basis).toContain('CUUR0000AA0, 1967=100');
  });

  it.each([
    ['1991', '55.56'],
    ['1992', '66.67'],
    ['1993', '83.33'],
    ['1994', '100.00'],
    ['1995', '125.00'],
  ])('P-43 100, 120, 150, 180, 225 in the money of 1994: %s gives %s', (to, restated) => {
    // data of an exercise at gradestack.com; results computed apart
    const series = seriesOf({ 1991: '100', 1992: '120', 1993: '150', 1994: '180', 1995: '225' });
    expect(between('100', '1994', to, series).restated).toBe(restated);
  });

  it('P-48 100 on the base 1967 is 33.4 on the base 1982-84: a factor of 2.994 as rounded', () => {
    expect(cpi.figures.get('1967' as Period)).toBe('33.4');
    expect(cpi1967.figures.get('1967' as Period)).toBe('100.0');
    expect((100 / 33.4).toFixed(3)).toBe('2.994');
  });
});

describe('the data', () => {
  it('P-20 holds the published averages 2008 to 2024 that equal the months’ mean', () => {
    // 2010: read as published. 2023 and 2024: as published, from memory. The others computed from the months.
    const published = { 2008: '215.303', 2009: '214.537', 2010: '218.056', 2015: '237.017', 2019: '255.657' };
    const later = { 2020: '258.811', 2021: '270.970', 2022: '292.655', 2023: '304.702', 2024: '313.689' };
    for (const [year, index] of Object.entries({ ...published, ...later })) {
      expect([year, cpi.figures.get(year as Period)]).toEqual([year, index]);
      expect(meanOfMonths(Number(year)).toFixed(3)).toBe(index);
    }
  });

  it('P-21 October 2025 is refused with its neighbours named', () => {
    expect(
      restate({ series: cpi, amount: '1' as PlainDecimal, from: '1941' as Period, to: '2025-10' as Period }),
    ).toEqual({
      ok: false,
      error: {
        code: 'period-not-published',
        which: 'to',
        period: '2025-10',
        reason: 'never-published',
        neighbours: ['2025-09', '2025-11'],
      },
    });
    expect(['2025-09', '2025-11'].map((period) => cpi.figures.get(period as Period))).toEqual(['324.800', '324.122']);
  });

  it('P-21 the 2025 average stands as published, and says that it is of eleven months', () => {
    expect(meanOfMonths(2025).toFixed(3)).toBe('321.943');
    expect(between('1', '1941', '2025').to.index).toBe('321.943');
    expect(between('1', '1941', '2025').basis).toContain('2025 average: the publisher’s mean of the eleven months');
  });

  it.each([
    [1929, 17.158, '17.1'],
    [1932, 13.642, '13.7'],
    [1933, 12.933, '13.0'],
    [1948, 24.042, '24.1'],
  ])('P-22 the published average of %i is not the mean of its months, %f, but %s', (year, mean, published) => {
    expect(meanOfMonths(year)).toBeCloseTo(mean, 3);
    expect(meanOfMonths(year).toFixed(1)).not.toBe(published);
    expect(between('1', String(year), String(year)).from.index).toBe(published);
  });

  it('P-23 the 36 months of the base 1982-84 average 99.9944', () => {
    expect((meanOfMonths(1982) + meanOfMonths(1983) + meanOfMonths(1984)) / 3).toBeCloseTo(99.9944, 4);
  });

  it('P-24 has one decimal to December 2006 and three from January 2007', () => {
    // math.andyou.com, citing the Bureau of Labor Statistics
    for (const [period, index] of cpi.figures)
      expect([period, publishedDecimals(index)]).toEqual([period, period < '2007' ? 1 : 3]);
  });

  it('P-31 is not seasonally adjusted', () => {
    // Bureau of Labor Statistics: seasonally adjusted figures are revised, unadjusted ones serve for escalation
    expect(cpi.title).toContain('not seasonally adjusted');
    expect(cpi.publisherSeriesId).toMatch(/^CUUR/); // U: unadjusted
  });

  it('P-32 belongs to a year or a month, not to a day', () => {
    // Bureau of Labor Statistics, escalation factsheet
    expect(parsePeriod('1941-05-14').ok).toBe(false);
  });

  it('P-38 restates by the published, rounded levels and rounds the amount alone (from memory)', () => {
    const { from, to, factor } = between('100000000', '1941', '2021');
    expect(factor.replace('.', '').length).toBeGreaterThanOrEqual(12);
    expect(Number(factor)).toBeCloseTo(Number(to.index) / Number(from.index), 12);
  });

  it('P-58 a price dated by a year goes by the annual average (common practice, no source)', () => {
    expect(between('29.95', '1939', '2024').basis).toContain('13.9 (1939 average)');
  });
});

describe('what the trade says', () => {
  it('a 1941 price is about 18½ times as much in the early 2020s (common practice, no source)', () => {
    const factors = ['2020', '2021', '2022'].map((year) => Number(between('1', '1941', year).factor));
    expect(Math.min(...factors)).toBeLessThan(18.5);
    expect(Math.max(...factors)).toBeGreaterThan(18.5);
    expect(Number(between('1', '1941', '2021').factor)).toBeCloseTo(18.4, 1);
  });
});

describe('every published year', () => {
  it('lies between the lowest and the highest of its months, so its band holds its result', () => {
    for (const { period } of publishedFigures(cpi, 'year')) {
      const { restated, withinYear } = between('1000', period, '2026-05');
      expect([period, Number(withinYear?.low) <= Number(restated)]).toEqual([period, true]);
      expect([period, Number(withinYear?.high) >= Number(restated)]).toEqual([period, true]);
    }
  });
});

function meanOfMonths(year: number): number {
  const months = publishedMonths(cpi, year);
  return months.reduce((sum, { index }) => sum + Number(index), 0) / months.length;
}
