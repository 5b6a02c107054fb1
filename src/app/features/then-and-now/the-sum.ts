import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { formatPeriod } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { formatAbout } from '../../../domain/restatement/precision';
import { CopyButton } from '../../ui/copy-button';
import {
  formatBand,
  formatFigure,
  formatPrice,
  periodWords,
  roundedFrom,
  type ShownRestatement,
} from './shown-restatement';

/** The sum written out, what its two bands mean in a sentence each, and a citation to copy. */
@Component({
  selector: 'tw-the-sum',
  imports: [CopyButton],
  templateUrl: './the-sum.html',
  styleUrl: './the-sum.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TheSum {
  readonly shown = input.required<ShownRestatement>();
  readonly citation = input.required<string>();

  protected readonly sum = computed(() => {
    const shown = this.shown();
    return {
      price: formatPrice(shown.original, shown.currency),
      paidIn: `paid in ${formatPeriod(shown.from.period)}`,
      to: shown.to.index,
      toPeriod: periodWords(shown.to.period),
      from: shown.from.index,
      fromPeriod: periodWords(shown.from.period),
      restated: formatMoney(shown.restated, shown.currency),
    };
  });

  protected readonly rounding = computed(() => {
    const shown = this.shown();
    const { from, to } = shown;
    if (from.period === to.period) return 'Both periods are the same, so nothing is restated and nothing is left open.';
    return (
      `The index is published rounded: ${from.index} stands for anything from ${roundedFrom(from.index)}, and ` +
      `${to.index} for ${roundedFrom(to.index)}, so the result lies from ${formatBand(shown, shown.rounding)}; that is why ` +
      `it reads ${formatAbout(shown, shown.currency)}.`
    );
  });

  protected readonly withinYear = computed(() => {
    const shown = this.shown();
    const band = shown.withinYear;
    if (band === null || shown.from.period === shown.to.period) return null;
    const year = formatPeriod(shown.from.period);
    return (
      `The price is dated ${year} without a month: paid when prices stood highest in ${year} it would come to ` +
      `${formatFigure(shown, band.low)}, when lowest to ${formatFigure(shown, band.high)}.`
    );
  });
}
