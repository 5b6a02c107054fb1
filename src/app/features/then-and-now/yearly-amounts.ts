import { midYear, periodKind, yearOf, type Period } from '../../../domain/calendar/period';
import { Dec } from '../../../domain/money/decimal';
import { annualAverages, figureAt, newestPeriod, publishedMonths } from '../../../domain/series/figures';
import type { IndexSeries } from '../../../domain/series/series';

/** A restated amount on the chart and in its table; null where no figure was ever published. */
export interface ChartedAmount {
  readonly period: Period;
  /** In years, on the chart's axis. */
  readonly time: number;
  /** Two decimals. */
  readonly amount: string | null;
}

const YEARS_OF_MONTHS = 10;

interface Charted {
  readonly series: IndexSeries;
  readonly amount: string;
  readonly from: Period;
}

const restateBy = (amount: string, fromIndex: string, index: string) =>
  new Dec(amount).times(index).div(fromIndex).toFixed(2);

/** The price in the money of every published year, and of the newest month where its year has no average yet. */
export function amountsByYear({ series, amount, from }: Charted): ChartedAmount[] {
  const fromIndex = figureAt(series, from);
  if (fromIndex === undefined) return [];
  const newest = newestPeriod(series);
  const figures = [...annualAverages(series)];
  const newestIndex = figureAt(series, newest);
  const lastYear = figures.at(-1);
  if (newestIndex !== undefined && (lastYear === undefined || yearOf(newest) > yearOf(lastYear.period)))
    figures.push({ period: newest, index: newestIndex });
  return figures.map(({ period, index }) => ({
    period,
    time: midYear(period),
    amount: restateBy(amount, fromIndex, index),
  }));
}

/** The price in the money of each month of the last ten years; a month never published has no amount. */
export function amountsByMonth({ series, amount, from }: Charted): ChartedAmount[] {
  const fromIndex = figureAt(series, from);
  const newest = newestPeriod(series);
  if (fromIndex === undefined || periodKind(newest) !== 'month') return [];
  const last = yearOf(newest);
  const years = Array.from({ length: YEARS_OF_MONTHS + 1 }, (_, i) => last - YEARS_OF_MONTHS + i);
  return years
    .flatMap((year) => monthsOf(series, year, newest))
    .map(({ period, index }) => ({
      period,
      time: midYear(period),
      amount: index === null ? null : restateBy(amount, fromIndex, index),
    }));
}

function monthsOf(series: IndexSeries, year: number, newest: Period): { period: Period; index: string | null }[] {
  const published = new Map(publishedMonths(series, year).map(({ period, index }) => [period, index]));
  if (published.size === 0) return [];
  return Array.from({ length: 12 }, (_, i) => `${year}-${String(i + 1).padStart(2, '0')}` as Period)
    .filter((period) => period <= newest)
    .map((period) => ({ period, index: published.get(period) ?? null }));
}

/** The published amounts on both sides of each gap, for a dotted bridge that claims nothing. */
export function bridges(amounts: readonly ChartedAmount[]): (readonly [ChartedAmount, ChartedAmount])[] {
  const found: (readonly [ChartedAmount, ChartedAmount])[] = [];
  let before: ChartedAmount | null = null;
  let open = false;
  for (const entry of amounts) {
    if (entry.amount === null) {
      open = before !== null;
      continue;
    }
    if (open && before) found.push([before, entry]);
    open = false;
    before = entry;
  }
  return found;
}
