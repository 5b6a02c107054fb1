import { periodKind, yearOf, type Period } from '../calendar/period';
import { Dec } from '../money/decimal';
import type { PlainDecimal } from '../money/money';
import { fail, ok, type Result } from '../result';
import { annualAverages, figureAt, publishedDecimals, publishedMonths, type IndexFigure } from '../series/figures';
import type { IndexSeries } from '../series/series';
import { basisLine } from './basis';
import { notPublished, type PeriodNotPublished } from './not-published';
import { roundToBand } from './precision';

/** Lowest and highest amount, decimal strings with two decimals. */
export interface Band {
  readonly low: string;
  readonly high: string;
}

/** A price in another period's money. Amounts are decimal strings in the series' currency. */
export interface Restatement {
  readonly from: IndexFigure;
  readonly to: IndexFigure;
  /** I(to) ÷ I(from) to 40 significant digits; `1` between equal periods. */
  readonly factor: string;
  /** As given, with its decimals; leading zeros left out. */
  readonly original: string;
  /** Two decimals, rounded once. */
  readonly restated: string;
  /** The restated amount to the precision its rounding band supports, such as `1470`. */
  readonly precisionAmount: string;
  /** What the rounding of the published indexes leaves open. */
  readonly rounding: Band;
  /** For a price dated by a year: its lowest and highest monthly result. Null for a price dated by a month. */
  readonly withinYear: Band | null;
  /** Method, series, release and periods, for standing beside the figure. */
  readonly basis: string;
}

export interface RestateOptions {
  readonly series: IndexSeries;
  readonly amount: PlainDecimal;
  readonly from: Period;
  readonly to: Period;
}

/**
 * What a price of one period comes to in the money of another.
 *
 * Restated = amount × I(to) ÷ I(from), both published figures of one series; a year is its *published* annual average.
 * Rounding band: amount × (I(to) ∓ e) ÷ (I(from) ± e), each e half a unit of that figure's own last published
 * decimal. Within-year band: the lowest and highest of amount × I(to) ÷ I(month) over the published months of a year
 * `from`; the target is not varied, be it a month or a year. Between equal periods the factor is exactly 1 and both
 * bands close on the amount (within-year for a year only).
 *
 * @param options.amount what was paid, at most 9 digits before the point and 4 after
 * Rounding: two decimals, half away from zero, once at the end of each figure.
 * Fails when `from` or `to` (the first of them) has no published figure; nothing is interpolated.
 */
export function restate(options: RestateOptions): Result<Restatement, PeriodNotPublished> {
  const { series, amount, from, to } = options;
  const fromIndex = figureAt(series, from);
  if (fromIndex === undefined) return fail(notPublished(series, from, 'from'));
  const toIndex = figureAt(series, to);
  if (toIndex === undefined) return fail(notPublished(series, to, 'to'));

  const price = new Dec(amount);
  const factor = new Dec(toIndex).div(fromIndex);
  const restated = price.times(toIndex).div(fromIndex);
  const rounding = from === to ? closed(price) : roundingBand(price, fromIndex, toIndex);
  const figures = { from: { period: from, index: fromIndex }, to: { period: to, index: toIndex } };
  return ok({
    ...figures,
    factor: factor.toFixed(),
    original: price.toFixed(publishedDecimals(amount)),
    restated: restated.toFixed(2),
    precisionAmount: roundToBand(restated, rounding),
    rounding: asText(rounding),
    withinYear: withinYearBand(options, price, toIndex),
    basis: basisLine({ series, ...figures }),
  });
}

/** A price in the money of every year with a published annual average, oldest first; two decimals. */
export function restatedCurve(
  series: IndexSeries,
  amount: PlainDecimal,
  from: Period,
): Result<{ readonly period: Period; readonly amount: string }[], PeriodNotPublished> {
  const fromIndex = figureAt(series, from);
  if (fromIndex === undefined) return fail(notPublished(series, from, 'from'));
  const price = new Dec(amount);
  return ok(
    annualAverages(series).map(({ period, index }) => ({
      period,
      amount: price.times(index).div(fromIndex).toFixed(2),
    })),
  );
}

interface ExactBand {
  readonly low: Dec;
  readonly high: Dec;
}

const closed = (price: Dec): ExactBand => ({ low: price, high: price });

function roundingBand(price: Dec, fromIndex: string, toIndex: string): ExactBand {
  const [from, to] = [new Dec(fromIndex), new Dec(toIndex)];
  const [fromError, toError] = [halfUnit(fromIndex), halfUnit(toIndex)];
  return {
    low: price.times(to.minus(toError)).div(from.plus(fromError)),
    high: price.times(to.plus(toError)).div(from.minus(fromError)),
  };
}

/** Half a unit of a figure's last published decimal: 0.05 for `14.7`. */
const halfUnit = (figure: string): Dec => new Dec(10).pow(-publishedDecimals(figure)).div(2);

function withinYearBand({ series, from, to }: RestateOptions, price: Dec, toIndex: string): Band | null {
  if (periodKind(from) !== 'year') return null;
  if (from === to) return asText(closed(price));
  const indexes = publishedMonths(series, yearOf(from)).map(({ index }) => new Dec(index));
  if (indexes.length === 0) return null;
  const restatedBy = (index: Dec) => price.times(toIndex).div(index);
  return asText({ low: restatedBy(Dec.max(...indexes)), high: restatedBy(Dec.min(...indexes)) });
}

const asText = (band: ExactBand): Band => ({ low: band.low.toFixed(2), high: band.high.toFixed(2) });
