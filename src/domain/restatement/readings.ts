import { midYear, yearOf, type Period } from '../calendar/period';
import { Dec } from '../money/decimal';
import { fail, ok, type Result } from '../result';
import { annualAverages, figureAt } from '../series/figures';
import type { IndexSeries } from '../series/series';
import { notPublished, type PeriodNotPublished } from './not-published';

/**
 * The steady yearly rise that leads from one period to the other: (factor ^ (1 ÷ years) − 1) × 100, years counted
 * between the middles of the periods. Percent to two decimals and years to one, as text; negative where prices fell.
 * Null where the middles coincide.
 */
export function averageYearlyRise(restatement: {
  readonly factor: string;
  readonly from: { readonly period: Period };
  readonly to: { readonly period: Period };
}): { readonly percent: string; readonly years: string } | null {
  const years = new Dec(midYear(restatement.to.period)).minus(midYear(restatement.from.period));
  if (years.abs().lt('0.001')) return null;
  const yearly = new Dec(restatement.factor).pow(new Dec(1).div(years));
  return { percent: yearly.minus(1).times(100).toFixed(2), years: years.abs().toFixed(1) };
}

/** What one unit of the later money bought in the earlier period: 1 ÷ factor, four decimals. */
export const purchasingPower = (factor: string): string => new Dec(1).div(factor).toFixed(4);

/** I(to) ÷ I(year) for each year of the series that begins a decade, oldest first: one decimal, two digits below 1. */
export function decadeMultipliers(
  series: IndexSeries,
  to: Period,
): Result<{ readonly period: Period; readonly multiplier: string }[], PeriodNotPublished> {
  const toIndex = figureAt(series, to);
  if (toIndex === undefined) return fail(notPublished(series, to, 'to'));
  return ok(
    annualAverages(series)
      .filter(({ period }) => yearOf(period) % 10 === 0)
      .map(({ period, index }) => ({ period, multiplier: multiplierText(new Dec(toIndex).div(index)) })),
  );
}

const multiplierText = (factor: Dec) => (factor.lt(1) ? factor.toSignificantDigits(2).toFixed() : factor.toFixed(1));
