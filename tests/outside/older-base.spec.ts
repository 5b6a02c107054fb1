import type { Period } from '../../src/domain/calendar/period';
import type { PlainDecimal } from '../../src/domain/money/money';
import { restate } from '../../src/domain/restatement/restate';
import { expectOk } from '../../src/domain/result';
import { publishedDecimals, publishedFigures } from '../../src/domain/series/figures';
import type { IndexSeries } from '../../src/domain/series/series';
import { cpi, cpi1967 } from '../support/published';

/*
 * The agency publishes the same index on its older base, 1967=100, whose early figures are three times finer
 * (Bureau of Labor Statistics, CUUR0000AA0). What the finer figures say must lie inside what ours leave open.
 */

/** Large, so that amounts with two decimals show a ratio to ten digits. */
const PRICE = '100000000' as PlainDecimal;

const productBand = (series: IndexSeries, from: Period, to: Period) => {
  const { rounding } = expectOk(restate({ series, amount: PRICE, from, to }));
  return { low: Number(rounding.low) / Number(PRICE), high: Number(rounding.high) / Number(PRICE) };
};

interface Range {
  readonly period: Period;
  readonly low: number;
  readonly high: number;
}

/** What each published figure may stand for: half a unit of its last decimal either way. */
const ranges = (series: IndexSeries, kind: 'year' | 'month'): Range[] =>
  publishedFigures(series, kind).map(({ period, index }) => {
    const half = 0.5 * 10 ** -publishedDecimals(index);
    return { period, low: Number(index) - half, high: Number(index) + half };
  });

/** Pairs of periods published on both bases whose two bands have no point in common. */
function pairsApart(kind: 'year' | 'month') {
  const finer = new Map(ranges(cpi1967, kind).map((range) => [range.period, range]));
  const both = ranges(cpi, kind).flatMap((ours) => {
    const theirs = finer.get(ours.period);
    return theirs === undefined ? [] : [{ ours, theirs }];
  });
  const apart: string[] = [];
  for (const from of both)
    for (const to of both) {
      const low = Math.max(to.ours.low / from.ours.high, to.theirs.low / from.theirs.high);
      const high = Math.min(to.ours.high / from.ours.low, to.theirs.high / from.theirs.low);
      if (low > high) apart.push(`${from.ours.period} to ${to.ours.period}`);
    }
  return { tried: both.length ** 2, apart };
}

describe('the base 1967=100', () => {
  const months = publishedFigures(cpi1967, 'month').filter(({ period }) => period < '1988-01');

  it.each(['2007-01', '2010-06', '2017-12'])(
    'has its ratio inside our band, from every month before 1988 to %s',
    (to) => {
      const toIndex = Number(cpi1967.figures.get(to as Period));
      const outside = months.filter(({ period, index }) => {
        const { low, high } = productBand(cpi, period, to as Period);
        const ratio = toIndex / Number(index);
        return ratio < low || ratio > high;
      });
      expect(months).toHaveLength(900); // 1913-01 to 1987-12
      expect(outside).toEqual([]);
    },
  );

  it('has its ratio inside our band from every year before 1988 to 2007, 2010 and 2017', () => {
    const years = publishedFigures(cpi1967, 'year').filter(({ period }) => period < '1988');
    for (const to of ['2007', '2010', '2017'] as Period[])
      for (const { period, index } of years) {
        const { low, high } = productBand(cpi, period, to);
        const ratio = Number(cpi1967.figures.get(to)) / Number(index);
        expect({ period, inside: low <= ratio && ratio <= high }).toEqual({ period, inside: true });
      }
  });

  it('has a band overlapping ours for every pair of months published on both bases', () => {
    expect(pairsApart('month')).toEqual({ tried: 1265 ** 2, apart: [] }); // 1913-01 to 2018-05, both ways
  });

  it('has a band overlapping ours for every pair of years published on both bases', () => {
    expect(pairsApart('year')).toEqual({ tried: 105 ** 2, apart: [] });
  });

  it('narrows the early bands to about a third', () => {
    const [ours, finer] = [cpi, cpi1967].map((series) => productBand(series, '1913-01' as Period, '2017-12' as Period));
    if (ours === undefined || finer === undefined) throw new Error('two bands');
    expect((ours.high - ours.low) / (finer.high - finer.low)).toBeCloseTo(3, 1);
  });

  it('is compared by the band that the product computes', () => {
    const our = new Map(ranges(cpi, 'month').map((range) => [range.period, range]));
    for (const [from, to] of [
      ['1913-01', '2018-05'],
      ['1933-04', '1920-06'],
      ['1967-07', '2007-01'],
      ['2016-05', '1941-12'],
    ] as [Period, Period][]) {
      const [a, b] = [our.get(from), our.get(to)];
      if (a === undefined || b === undefined) throw new Error('published months');
      const band = productBand(cpi, from, to);
      expect(band.low).toBeCloseTo(b.low / a.high, 9);
      expect(band.high).toBeCloseTo(b.high / a.low, 9);
    }
  });

  it('is never used for a figure of the product', () => {
    expect([cpi.role, cpi1967.role]).toEqual(['primary', 'finer-base']);
  });
});
