import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import type { BodyOf } from '../../../contracts/contract';
import {
  addLine,
  archiveEstimate,
  getEstimate,
  listEstimates,
  moveLine,
  removeLine,
  updateEstimate,
  updateLine,
  type EstimateDetail,
  type LineContent,
} from '../../../contracts/estimates';
import { ApiClient } from '../../core/api-client';
import type { EstimatesQuery } from './estimates-query';

export const PAGE_SIZE = 25;

@Injectable({ providedIn: 'root' })
export class EstimatesApi {
  private readonly api = inject(ApiClient);

  list(query: EstimatesQuery) {
    return this.api.call(listEstimates, { query: { ...query, pageSize: PAGE_SIZE } });
  }

  get(id: number): Observable<EstimateDetail> {
    return this.api.call(getEstimate, { params: { id } });
  }

  update(id: number, body: BodyOf<typeof updateEstimate>): Observable<EstimateDetail> {
    return this.api.call(updateEstimate, { params: { id }, body });
  }

  archive(id: number, archived: boolean): Observable<EstimateDetail> {
    return this.api.call(archiveEstimate, { params: { id }, body: { archived } });
  }

  addLine(id: number, content: LineContent, afterLineId: number | null) {
    return this.api.call(addLine, { params: { id }, body: { content, afterLineId } });
  }

  updateLine(id: number, lineId: number, content: LineContent, version: number): Observable<EstimateDetail> {
    return this.api.call(updateLine, { params: { id, lineId }, body: { content, version } });
  }

  removeLine(id: number, lineId: number, version: number): Observable<EstimateDetail> {
    return this.api.call(removeLine, { params: { id, lineId }, query: { version } });
  }

  moveLine(id: number, lineId: number, afterLineId: number | null): Observable<EstimateDetail> {
    return this.api.call(moveLine, { params: { id, lineId }, body: { afterLineId } });
  }
}
