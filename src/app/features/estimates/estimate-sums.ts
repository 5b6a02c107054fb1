import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { EstimateDetail } from '../../../contracts/estimates';
import { TAX_TREATMENT_LABELS } from '../../../domain/estimate/terms';
import { hasRange } from '../../../domain/estimate/totals';
import { worthInForce } from '../../../domain/market/worth';
import { formatMoney } from '../../../domain/money/money';
import { CostAgainstWorth } from '../../ui/cost-against-worth';
import { VerdictMark } from '../../ui/verdict-mark';

/** What the lines come to, and that against the worth. */
@Component({
  selector: 'tw-estimate-sums',
  imports: [CostAgainstWorth, RouterLink, VerdictMark],
  templateUrl: './estimate-sums.html',
  styleUrl: './estimate-sums.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EstimateSums {
  readonly estimate = input.required<EstimateDetail>();

  protected readonly treatment = computed(() => TAX_TREATMENT_LABELS[this.estimate().taxTreatment]);
  protected readonly hasRange = computed(() => hasRange(this.estimate().totals));
  protected readonly figures = computed(() => {
    const { verdict, totals, set } = this.estimate();
    if (verdict === null) return null;
    const { low, high } = worthInForce(set.worths, 'as-restored') ?? { low: null, high: null };
    return {
      currency: totals.currency,
      asFound: Number(verdict.asFound),
      asRestored: Number(verdict.asRestored),
      restoredLow: low === null ? null : Number(low.amount),
      restoredHigh: high === null ? null : Number(high.amount),
      cost: { low: Number(verdict.cost.low), likely: Number(verdict.cost.likely), high: Number(verdict.cost.high) },
    };
  });

  protected money(amount: string): string {
    return formatMoney(amount, this.estimate().totals.currency);
  }
}
