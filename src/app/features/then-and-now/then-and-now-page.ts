import { DOCUMENT } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Router } from '@angular/router';
import { fromEvent } from 'rxjs';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { CopyButton } from '../../ui/copy-button';
import { Failed } from '../../ui/failed';
import { Notice } from '../../ui/notice';
import { Sweep } from '../../ui/sweep';
import { YearScale } from '../../ui/year-scale';
import { AddressKeeper } from './address-keeper';
import { citation } from './citation';
import { KnownPrices, type KnownPrice } from './known-prices';
import { NotAWorth } from './not-a-worth';
import { Refusal } from './refusal';
import { RestateForm } from './restate-form';
import { RestatedFigures } from './restated-figures';
import { RestatementStore } from './restatement-store';
import { TheSum } from './the-sum';
import { YearlyChart } from './yearly-chart';

/** What a price was then and what that is in later money, for anyone. */
@Component({
  selector: 'tw-then-and-now-page',
  imports: [
    CopyButton,
    Failed,
    KnownPrices,
    NotAWorth,
    Notice,
    Refusal,
    RestatedFigures,
    RestateForm,
    Sweep,
    TheSum,
    YearlyChart,
    YearScale,
  ],
  providers: [RestatementStore, AddressKeeper],
  templateUrl: './then-and-now-page.html',
  styleUrl: './then-and-now-page.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ThenAndNowPage {
  protected readonly store = inject(RestatementStore);
  protected readonly address = inject(AddressKeeper);
  private readonly router = inject(Router);
  private readonly document = inject(DOCUMENT);

  protected readonly newest = computed(() => {
    const last = this.store.series()?.last;
    return last === undefined ? null : formatPeriod(last as Period);
  });

  /** The address of what is asked, every part named, whatever the address bar shows at the moment. */
  protected readonly link = computed(() => {
    const tree = this.router.createUrlTree(['/then-and-now'], { queryParams: { ...this.store.inquiry() } });
    return new URL(this.router.serializeUrl(tree), this.document.baseURI).href;
  });

  protected readonly citation = computed(() => {
    const shown = this.store.shown();
    const series = this.store.series();
    if (shown === null || series === undefined) return '';
    return citation({ shown, series, workedOutOn: today(), address: this.link() });
  });

  protected readonly knownPrices = computed(() =>
    this.store.knownPrices.hasValue() ? this.store.knownPrices.value() : [],
  );

  protected readonly trouble = computed(() => {
    const problem = this.store.problem();
    if (problem === null) return null;
    if (problem.code !== 'unreachable') return problem.problem.detail ?? problem.problem.title;
    const kept = this.store.answer().kind === 'shown';
    return kept
      ? `The server cannot be reached. This is worked out here, from the figures of release ${this.store.shown()?.release} loaded before.`
      : 'The server cannot be reached. The last result stays until it can.';
  });

  constructor() {
    const window = this.document.defaultView;
    if (window === null) return;
    fromEvent(window, 'online')
      .pipe(takeUntilDestroyed())
      .subscribe(() => this.store.retry());
  }

  protected moveThen(from: Period): void {
    this.address.change({ ...this.store.inquiry(), from }, 'then-needle');
  }

  protected moveNow(to: Period): void {
    this.address.change({ ...this.store.inquiry(), to }, 'now-needle');
  }

  protected useNeighbour(which: 'from' | 'to', period: Period): void {
    this.address.change({ ...this.store.inquiry(), [which]: period }, 'neighbour');
  }

  protected useKnown({ price, maker, model }: KnownPrice): void {
    this.address.change({ ...this.store.inquiry(), amount: price.amount, from: price.period }, `${maker} ${model}`);
    this.document.defaultView?.scrollTo({ top: 0 });
  }
}

/** The reader's own date. */
function today(): string {
  const now = new Date();
  return [now.getFullYear(), now.getMonth() + 1, now.getDate()].map((part) => String(part).padStart(2, '0')).join('-');
}
