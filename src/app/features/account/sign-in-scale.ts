import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { catchError, map, of, switchMap, type Observable } from 'rxjs';
import { getSeriesFigures, listSeries, toIndexSeries } from '../../../contracts/series';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { Dec } from '../../../domain/money/decimal';
import { parsePlainDecimal } from '../../../domain/money/money';
import { decadeMultipliers } from '../../../domain/restatement/readings';
import { restate, restatedCurve } from '../../../domain/restatement/restate';
import { firstPeriod, newestPeriod } from '../../../domain/series/figures';
import type { IndexSeries } from '../../../domain/series/series';
import { yearScaleInput, type YearScaleContent } from '../../../domain/year-scale/content';
import { drawYearScale } from '../../../domain/year-scale/geometry';
import { ApiClient } from '../../core/api-client';
import { elementWidth } from '../../ui/element-width';
import { YearScaleSvg } from '../../ui/year-scale-drawing';

const PRICE = '39.95';
const PAID = '1938' as Period;
const NARROW_UNDER = 560;

/** The year scale beside the sign-in form, from the published figures. Where they cannot be had it stays away. */
@Component({
  selector: 'tw-sign-in-scale',
  imports: [YearScaleSvg],
  template: `
    @if (drawing(); as drawing) {
      <div role="img" [attr.aria-label]="drawing.sentence"><tw-year-scale-drawing [drawing]="drawing" /></div>
      <p>{{ basis() }}</p>
    }
  `,
  styles: `
    :host {
      display: block;

      /* the strip of phones stands on the glass here: its inks are the glass's */
      --mat-sys-surface-container-lowest: var(--tw-glass);
      --mat-sys-on-surface: var(--tw-glass-text);
      --mat-sys-on-surface-variant: var(--tw-glass-soft);
      --mat-sys-outline: var(--tw-glass-tick);
      --tw-ink-soft: var(--tw-glass-tick-d);
      --tw-data-uplift: var(--tw-glass-curve);
      --tw-needle: var(--tw-glass-needle);
      --tw-on-needle: var(--tw-glass-on-needle);
    }
    p {
      margin-top: 12px;
      font: var(--mat-sys-body-small);
      color: var(--tw-glass-soft);
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SignInScale {
  private readonly api = inject(ApiClient);
  private readonly width = elementWidth(720);
  private readonly index = rxResource({ stream: () => this.figures() });

  private readonly content = computed(() => (this.index.hasValue() ? contentOf(this.index.value()) : null));
  protected readonly drawing = computed(() => {
    const content = this.content();
    const width = this.width();
    return content && drawYearScale(yearScaleInput(content, width < NARROW_UNDER ? 'strip-narrow' : 'glass', width));
  });
  protected readonly basis = computed(() => {
    const content = this.content();
    return content === null
      ? ''
      : `By the published index, ${PAID} to ${formatPeriod(content.to)}, CPI-U. It is not what a set is worth.`;
  });

  private figures(): Observable<IndexSeries | null> {
    return this.api.call(listSeries).pipe(
      switchMap(({ items }) => {
        const series = items.at(0);
        if (series === undefined) return of(null);
        return this.api
          .call(getSeriesFigures, { params: { id: series.id } })
          .pipe(map(({ figures }) => toIndexSeries(series, figures)));
      }),
      catchError(() => of(null)), // decoration: signing in says what is wrong
    );
  }
}

function contentOf(series: IndexSeries | null): YearScaleContent | null {
  const price = parsePlainDecimal(PRICE);
  if (series === null || !price.ok) return null;
  const last = newestPeriod(series);
  const restated = restate({ series, amount: price.value, from: PAID, to: last });
  const curve = restatedCurve(series, price.value, PAID);
  const multipliers = decadeMultipliers(series, last);
  if (!restated.ok || !curve.ok || !multipliers.ok) return null;
  return {
    first: firstPeriod(series),
    last,
    from: PAID,
    to: last,
    price: PRICE,
    restated: restated.value.restated,
    currency: series.currency,
    factor: new Dec(restated.value.factor).toFixed(1),
    curve: curve.value,
    multipliers: multipliers.value,
  };
}
