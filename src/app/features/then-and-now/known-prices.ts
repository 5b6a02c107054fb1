import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import type * as z from 'zod';
import type { SeriesSummary } from '../../../contracts/series';
import type { listPublicPrices } from '../../../contracts/sets';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import type { YearScaleContent } from '../../../domain/year-scale/content';
import { YearScaleRow } from '../../ui/year-scale-row';

export type KnownPrice = z.output<typeof listPublicPrices.reply>['items'][number];

/** Prices when new of known sets, each on its own small year scale; choosing one asks about it. */
@Component({
  selector: 'tw-known-prices',
  imports: [YearScaleRow],
  templateUrl: './known-prices.html',
  styleUrl: './known-prices.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class KnownPrices {
  readonly prices = input.required<readonly KnownPrice[]>();
  readonly series = input.required<SeriesSummary>();

  readonly choose = output<KnownPrice>();

  protected readonly span = computed(() => {
    const { first, last } = this.series();
    return `${first.slice(0, 4)} to ${formatPeriod(last as Period)}`;
  });

  protected readonly rows = computed(() =>
    this.prices().map((known) => {
      const { amount, currency, period } = known.price;
      return {
        known,
        name: `${known.maker} ${known.model}`,
        paid: formatPeriod(period),
        price: formatMoney(amount, currency),
        restated: known.restated
          ? formatMoney(known.restated.amount, known.restated.currency, { whole: true })
          : 'Not known',
        scale: this.scaleOf(known),
      };
    }),
  );

  private scaleOf({ price, restated, to }: KnownPrice): YearScaleContent | null {
    if (restated === null || to === null) return null;
    const { first, last } = this.series();
    return {
      first: first as Period,
      last: last as Period,
      from: price.period,
      to: to as Period,
      price: price.amount,
      restated: restated.amount,
      currency: restated.currency,
      curve: [],
    };
  }
}
