import { inject, Injectable } from '@angular/core';
import { map, shareReplay, switchMap, type Observable } from 'rxjs';
import type { BodyOf, ReplyOf } from '../../../contracts/contract';
import { beginEstimate, listEstimates, type EstimateSummary } from '../../../contracts/estimates';
import { getEstimate, type EstimateDetail } from '../../../contracts/estimates';
import { addOwner, listOwners, type Owner } from '../../../contracts/owners';
import { getRestatement, type RestatementReply } from '../../../contracts/restatements';
import { getSeriesFigures, listSeries, toIndexSeries } from '../../../contracts/series';
import {
  archiveSet,
  captionPhoto,
  getSet,
  listSets,
  orderPhotos,
  recordCondition,
  recordWorth,
  registerSet,
  removePhoto,
  updateSet,
  type Photo,
  type SetDetail,
} from '../../../contracts/sets';
import type { IndexSeries } from '../../../domain/series/series';
import { ApiClient } from '../../core/api-client';
import { PAGE_SIZE, type SetsQuery } from './sets-query';

export type SetsList = ReplyOf<typeof listSets>;
export type SetBody = BodyOf<typeof registerSet>;
export type ConditionBody = BodyOf<typeof recordCondition>;
export type WorthBody = BodyOf<typeof recordWorth>;
export type OwnerBody = BodyOf<typeof addOwner>;

/** The index that prices in US dollars are restated by. */
export const PRICE_SERIES = 'us-cpi-u';

@Injectable({ providedIn: 'root' })
export class SetsApi {
  private readonly client = inject(ApiClient);

  /** The published figures, fetched once. */
  private readonly figures = this.client.call(listSeries).pipe(
    map(({ items }) => items.find(({ id }) => id === PRICE_SERIES)),
    switchMap((summary) => {
      if (summary === undefined) throw new Error(`no series ${PRICE_SERIES}`);
      return this.client
        .call(getSeriesFigures, { params: { id: summary.id } })
        .pipe(map(({ figures }) => toIndexSeries(summary, figures)));
    }),
    shareReplay({ bufferSize: 1, refCount: false }),
  );

  list(query: SetsQuery): Observable<SetsList> {
    const { page, ...rest } = query;
    return this.client.call(listSets, { query: { ...rest, page: String(page), pageSize: String(PAGE_SIZE) } });
  }

  get(id: number): Observable<SetDetail> {
    return this.client.call(getSet, { params: { id } });
  }

  register(body: SetBody): Observable<SetDetail> {
    return this.client.call(registerSet, { body });
  }

  update(id: number, version: number, body: SetBody): Observable<SetDetail> {
    return this.client.call(updateSet, { params: { id }, body: { ...body, version } });
  }

  archive(id: number, archived: boolean): Observable<SetDetail> {
    return this.client.call(archiveSet, { params: { id }, body: { archived } });
  }

  recordCondition(id: number, body: ConditionBody): Observable<SetDetail> {
    return this.client.call(recordCondition, { params: { id }, body });
  }

  recordWorth(id: number, body: WorthBody): Observable<SetDetail> {
    return this.client.call(recordWorth, { params: { id }, body });
  }

  caption(id: number, photoId: number, caption: string): Observable<Photo> {
    return this.client.call(captionPhoto, { params: { id, photoId }, body: { caption } });
  }

  removePhoto(id: number, photoId: number): Observable<unknown> {
    return this.client.call(removePhoto, { params: { id, photoId } });
  }

  orderPhotos(id: number, photoIds: number[]): Observable<readonly Photo[]> {
    return this.client.call(orderPhotos, { params: { id }, body: { photoIds } }).pipe(map(({ items }) => items));
  }

  owners(): Observable<Owner[]> {
    return this.client.call(listOwners).pipe(map(({ items }) => items));
  }

  addOwner(body: OwnerBody): Observable<Owner> {
    return this.client.call(addOwner, { body });
  }

  /** The estimates of a set, newest change first. */
  estimates(setId: number): Observable<EstimateSummary[]> {
    const query = { setId: String(setId), state: 'all', pageSize: '200' } as const;
    return this.client.call(listEstimates, { query }).pipe(map(({ items }) => items));
  }

  estimate(id: number): Observable<EstimateDetail> {
    return this.client.call(getEstimate, { params: { id } });
  }

  beginEstimate(setId: number, title: string): Observable<EstimateDetail> {
    return this.client.call(beginEstimate, { params: { id: setId }, body: { title } });
  }

  restate(amount: string, from: string): Observable<RestatementReply> {
    return this.client.call(getRestatement, { query: { series: PRICE_SERIES, amount, from } });
  }

  index(): Observable<IndexSeries> {
    return this.figures;
  }
}
