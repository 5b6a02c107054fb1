import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { EstimateDetail } from '../../../contracts/estimates';
import type { Worth } from '../../../contracts/sets';
import { costAgainstWorthSentence, type CostAgainstWorthFigures } from '../../../domain/charts/cost-against-worth';
import { formatMoney } from '../../../domain/money/money';
import { ChartCard } from '../../ui/chart-card';
import { CostAgainstWorth } from '../../ui/cost-against-worth';
import { VerdictMark } from '../../ui/verdict-mark';

/** Cost against worth by the newest estimate: chart, table twin, and the verdict in words. Presentational. */
@Component({
  selector: 'tw-worth-chart',
  imports: [ChartCard, CostAgainstWorth, VerdictMark],
  templateUrl: './worth-chart.html',
  styleUrl: './worth-chart.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class WorthChart {
  readonly estimate = input.required<EstimateDetail | undefined>();
  readonly loading = input(false);
  readonly asFound = input.required<Worth | undefined>();
  readonly asRestored = input.required<Worth | undefined>();
  readonly mayEstimate = input(false);

  protected readonly currency = computed(() => this.estimate()?.totals.currency ?? 'USD');
  protected readonly figures = computed<CostAgainstWorthFigures | null>(() => {
    const verdict = this.estimate()?.verdict;
    if (!verdict) return null;
    const restored = this.asRestored();
    const { cost } = verdict;
    return {
      currency: this.currency(),
      asFound: Number(verdict.asFound),
      asRestored: Number(verdict.asRestored),
      restoredLow: restored?.low ? Number(restored.low.amount) : null,
      restoredHigh: restored?.high ? Number(restored.high.amount) : null,
      cost: { low: Number(cost.low), likely: Number(cost.likely), high: Number(cost.high) },
    };
  });
  protected readonly sentence = computed(() => {
    const figures = this.figures();
    return figures ? costAgainstWorthSentence(figures) : '';
  });
  protected readonly rows = computed(() => {
    const verdict = this.estimate()?.verdict;
    if (!verdict) return [];
    const money = (amount: string, signed = false) => formatMoney(amount, this.currency(), { signed });
    return [
      { label: 'Worth as found', amount: money(verdict.asFound) },
      { label: 'Uplift', amount: money(verdict.uplift, true) },
      { label: 'Worth restored', amount: money(verdict.asRestored) },
      { label: 'Cost at low hours', amount: money(verdict.cost.low) },
      { label: 'Cost at likely hours', amount: money(verdict.cost.likely) },
      { label: 'Cost at high hours', amount: money(verdict.cost.high) },
      { label: 'Gap at likely hours', amount: money(verdict.gap.atLikely, true) },
      { label: 'Gap at high hours', amount: money(verdict.gap.atHigh, true) },
    ];
  });
  /** What is still needed before cost and worth can be set against each other. */
  protected readonly missing = computed(() => {
    const parts = [
      this.asFound() ? '' : 'the worth as found',
      this.asRestored() ? '' : 'the worth restored',
      this.estimate() ? '' : 'an estimate',
    ].filter((part) => part !== '');
    return parts.length < 2 ? parts.join('') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`;
  });
}
