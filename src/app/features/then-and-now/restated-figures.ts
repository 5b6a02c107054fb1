import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import type { SeriesSummary } from '../../../contracts/series';
import { formatPeriod } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { formatAbout } from '../../../domain/restatement/precision';
import { averageYearlyRise, purchasingPower } from '../../../domain/restatement/readings';
import { Figure } from '../../ui/figure';
import {
  formatBand,
  formatFactor,
  formatPurchasingPower,
  periodWords,
  type ShownRestatement,
} from './shown-restatement';

/** The restated amount with both of its bands, the multiplier, the yearly rise and what money buys. */
@Component({
  selector: 'tw-restated-figures',
  imports: [Figure],
  templateUrl: './restated-figures.html',
  styleUrl: './restated-figures.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RestatedFigures {
  readonly shown = input.required<ShownRestatement>();
  readonly series = input.required<SeriesSummary>();

  protected readonly exact = signal(false);

  protected readonly figures = computed(() => {
    const shown = this.shown();
    const { from, to, currency, withinYear } = shown;
    const rise = averageYearlyRise(shown);
    const same = from.period === to.period;
    return {
      restatedTo: `Restated to ${formatPeriod(to.period)}`,
      about: formatAbout(shown, currency),
      exact: formatMoney(shown.restated, currency),
      rounding: same ? null : formatBand(shown, shown.rounding),
      within: same ? 'Nothing left open' : withinYear ? formatBand(shown, withinYear) : 'Dated to the month',
      withinLabel: withinYear ? `Any month of ${from.period}` : 'Within the year',
      withinBasis: same
        ? 'Both periods are the same'
        : withinYear
          ? `Paid when prices stood highest, to when lowest, in ${from.period}`
          : `${formatPeriod(from.period)} leaves no months open`,
      factor: formatFactor(shown.factor),
      indexes: `Index ${from.index}, then ${to.index}`,
      base: `${this.series().publisherSeriesId}, ${this.series().base.replace('=', ' = ')}`,
      rise: rise ? `${rise.percent.replace('-', '−')}%` : 'No time between',
      riseKnown: rise !== null,
      riseYears: rise ? `Compounded over ${rise.years} years` : '',
      riseBasis: `${periodWords(from.period)} to ${periodWords(to.period)}`,
      unitLabel: `${currency === 'USD' ? 'A dollar' : `One ${currency}`} of ${formatPeriod(to.period)} buys what`,
      unit: formatPurchasingPower(purchasingPower(shown.factor), currency),
      unitBought: `bought in ${formatPeriod(from.period)}`,
      release: `${this.series().publisherSeriesId}, release ${shown.release}, ${periodWords(from.period)}`,
    };
  });
}
