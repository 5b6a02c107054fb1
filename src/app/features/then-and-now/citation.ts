import type { SeriesSummary } from '../../../contracts/series';
import { formatDate, formatPeriod } from '../../../domain/calendar/period';
import { Dec } from '../../../domain/money/decimal';
import { formatMoney } from '../../../domain/money/money';
import { formatPrice, periodWords, type ShownRestatement } from './shown-restatement';

/**
 * A citation that lets another retrace the figure: publisher, series, base, release, both index figures, the sum, both
 * bands, the date it was worked out, and the address that shows it again.
 */
export function citation(options: {
  readonly shown: ShownRestatement;
  readonly series: SeriesSummary;
  /** ISO date. */
  readonly workedOutOn: string;
  readonly address: string;
}): string {
  const { shown, series, workedOutOn, address } = options;
  const money = (amount: string) => formatMoney(amount, shown.currency);
  const { from, to, rounding, withinYear } = shown;
  const bands = [
    `${money(rounding.low)} to ${money(rounding.high)} by the rounding of the index`,
    ...(withinYear
      ? [`${money(withinYear.low)} to ${money(withinYear.high)} by the months of ${formatPeriod(from.period)}`]
      : []),
  ];
  return [
    `${series.publisher}, ${series.title}, series ${series.publisherSeriesId}, ${series.base}, release ${shown.release}.`,
    `Index ${periodWords(from.period)}: ${from.index}; ${periodWords(to.period)}: ${to.index}.`,
    `${formatPrice(shown.original, shown.currency)} in ${formatPeriod(from.period)} is ${money(shown.restated)} in ${formatPeriod(to.period)} ` +
      `(factor ${new Dec(shown.factor).toSignificantDigits(12).toFixed()}; ${bands.join('; ')}).`,
    `Worked out with Thenworth, ${formatDate(workedOutOn)}: ${address}`,
  ].join(' ');
}
