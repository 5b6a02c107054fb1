import { formatMoney } from '../money/money';
import type { IndexSeries } from '../series/series';
import { describePeriod } from './basis';
import type { Restatement } from './restate';

/**
 * A restatement in one paragraph, for quoting elsewhere: both amounts, the rounding band, the sum with its published
 * figures, publisher, series and release, and that it is no worth. `address`, where given, leads back to it.
 */
export function citeRestatement(options: {
  readonly restatement: Restatement;
  readonly series: IndexSeries;
  readonly address?: string;
}): string {
  const { restatement, series, address } = options;
  const { original, restated, rounding, from, to } = restatement;
  const money = (amount: string) => formatMoney(amount, series.currency);
  const range = rounding.low === rounding.high ? '' : ` (${money(rounding.low)} to ${money(rounding.high)})`;
  return [
    `${money(original)} of ${describePeriod(from.period)} is ${money(restated)}${range} in money of ${describePeriod(to.period)}:`,
    `× ${to.index} ÷ ${from.index}, ${series.publisher}, ${series.title}, ${series.publisherSeriesId}, ${series.base},`,
    `release ${series.release}. A restated price is not what the set is worth.`,
    ...(address === undefined ? [] : [address]),
  ].join(' ');
}
