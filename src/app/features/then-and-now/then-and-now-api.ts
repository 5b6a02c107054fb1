import { inject, Injectable } from '@angular/core';
import { map, type Observable } from 'rxjs';
import { getRestatement, type RestatementReply } from '../../../contracts/restatements';
import { getSeriesFigures, listSeries, toIndexSeries, type SeriesSummary } from '../../../contracts/series';
import { listPublicPrices } from '../../../contracts/sets';
import type { IndexSeries } from '../../../domain/series/series';
import { ApiClient } from '../../core/api-client';
import type { AnswerableInquiry } from './inquiry';

@Injectable({ providedIn: 'root' })
export class ThenAndNowApi {
  private readonly client = inject(ApiClient);

  series(): Observable<SeriesSummary[]> {
    return this.client.call(listSeries).pipe(map(({ items }) => items));
  }

  figures(summary: SeriesSummary): Observable<IndexSeries> {
    return this.client
      .call(getSeriesFigures, { params: { id: summary.id } })
      .pipe(map(({ figures }) => toIndexSeries(summary, figures)));
  }

  restate(inquiry: AnswerableInquiry): Observable<RestatementReply> {
    return this.client.call(getRestatement, { query: { ...inquiry } });
  }

  knownPrices() {
    return this.client.call(listPublicPrices).pipe(map(({ items }) => items));
  }
}
