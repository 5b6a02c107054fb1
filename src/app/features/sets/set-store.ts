import { computed, inject, Injectable, signal } from '@angular/core';
import { rxResource } from '@angular/core/rxjs-interop';
import { of, tap } from 'rxjs';
import type { Photo, SetDetail } from '../../../contracts/sets';
import type { Period } from '../../../domain/calendar/period';
import { worthInForce } from '../../../domain/market/worth';
import { parsePlainDecimal } from '../../../domain/money/money';
import { restatedCurve } from '../../../domain/restatement/restate';
import { firstPeriod, newestPeriod } from '../../../domain/series/figures';
import type { YearScaleContent } from '../../../domain/year-scale/content';
import { SessionStore } from '../../core/session';
import { SetsApi, type ConditionBody, type WorthBody } from './sets-api';

/** One set's page: its record, its estimates and the index its price is restated by. The tabs share it. */
@Injectable()
export class SetStore {
  private readonly api = inject(SetsApi);
  private readonly session = inject(SessionStore);
  private readonly id = signal<number | undefined>(undefined);

  readonly record = rxResource({ params: () => this.id(), stream: ({ params }) => this.api.get(params) });
  readonly set = computed(() => (this.record.hasValue() ? this.record.value() : undefined));

  readonly estimateList = rxResource({
    params: () => (this.session.can('estimate.view') ? this.id() : undefined),
    stream: ({ params }) => this.api.estimates(params),
  });
  readonly estimates = computed(() => (this.estimateList.hasValue() ? this.estimateList.value() : []));
  /** The estimate last changed that is not archived; its cost is set against the worth. */
  readonly newest = computed(() => this.estimates().find(({ archived }) => !archived));
  readonly newestEstimate = rxResource({
    params: () => this.newest()?.id,
    stream: ({ params }) => this.api.estimate(params),
  });
  readonly estimate = computed(() => (this.newestEstimate.hasValue() ? this.newestEstimate.value() : undefined));

  private readonly index = rxResource({
    params: () => this.set()?.restated?.known,
    stream: ({ params }) => (params ? this.api.index() : of(undefined)),
  });

  readonly asFound = computed(() => worthInForce(this.set()?.worths ?? [], 'as-found'));
  readonly asRestored = computed(() => worthInForce(this.set()?.worths ?? [], 'as-restored'));

  /** The year scale of the price when new; without its curve until the index has come. */
  readonly scale = computed<YearScaleContent | null>(() => {
    const set = this.set();
    const index = this.index.hasValue() ? this.index.value() : undefined;
    const price = set?.priceWhenNew;
    const restated = set?.restated;
    if (!price || !restated?.known || index === undefined) return null;
    const amount = parsePlainDecimal(price.amount);
    const from = restated.from.period as Period;
    const curve = amount.ok ? restatedCurve(index, amount.value, from) : null;
    return {
      first: firstPeriod(index),
      last: newestPeriod(index),
      from,
      to: restated.to.period as Period,
      price: price.amount,
      restated: restated.restated.amount,
      currency: restated.restated.currency,
      curve: curve?.ok ? curve.value : [],
    };
  });

  readonly mayEdit = computed(() => this.session.can('set.edit'));
  readonly mayRecordWorth = computed(() => this.session.can('worth.record'));
  readonly mayEstimate = computed(() => this.session.can('estimate.edit'));
  readonly mayPrint = computed(() => this.session.can('paper.view'));

  open(id: number): void {
    this.id.set(id);
  }

  archive(archived: boolean) {
    return this.api.archive(this.known().id, archived).pipe(tap((set) => this.record.set(set)));
  }

  recordWorth(body: WorthBody) {
    return this.api.recordWorth(this.known().id, body).pipe(
      tap((set) => {
        this.record.set(set);
        this.newestEstimate.reload(); // its verdict rests on the worths
      }),
    );
  }

  recordCondition(body: ConditionBody) {
    return this.api.recordCondition(this.known().id, body).pipe(tap((set) => this.record.set(set)));
  }

  beginEstimate(title: string) {
    return this.api.beginEstimate(this.known().id, title);
  }

  caption(photoId: number, caption: string) {
    return this.api
      .caption(this.known().id, photoId, caption)
      .pipe(tap((photo) => this.changePhotos((all) => all.map((old) => (old.id === photo.id ? photo : old)))));
  }

  removePhoto(photoId: number) {
    return this.api
      .removePhoto(this.known().id, photoId)
      .pipe(tap(() => this.changePhotos((all) => all.filter(({ id }) => id !== photoId))));
  }

  /** Shows the order asked for at once; what the server answers replaces it. */
  orderPhotos(photos: readonly Photo[]) {
    this.changePhotos(() => photos);
    return this.api
      .orderPhotos(
        this.known().id,
        photos.map(({ id }) => id),
      )
      .pipe(tap((ordered) => this.changePhotos(() => ordered)));
  }

  photoAdded(photo: Photo): void {
    this.changePhotos((all) => [...all, photo]);
  }

  reload(): void {
    this.record.reload();
  }

  private changePhotos(change: (photos: readonly Photo[]) => readonly Photo[]): void {
    this.record.update((set) => set && { ...set, photos: [...change(set.photos)] });
  }

  private known(): SetDetail {
    const set = this.set();
    if (set === undefined) throw new Error('no set is open');
    return set;
  }
}
