import { inject, Injectable } from '@angular/core';
import type { Observable } from 'rxjs';
import {
  getAppraisalSheet,
  getAppraisalSheetPdf,
  getRestorationEstimate,
  getRestorationEstimatePdf,
} from '../../../contracts/papers';
import type { Paper } from '../../../domain/documents/paper';
import { PAPER_SIZES, type PaperSize } from '../../../domain/estimate/terms';
import { addressOf, ApiClient } from '../../core/api-client';

/** The addresses of a document's files, a paper each. */
export type PaperFiles = readonly { readonly size: PaperSize; readonly address: string }[];

@Injectable({ providedIn: 'root' })
export class PapersApi {
  private readonly api = inject(ApiClient);

  /** The sheet of a set, set against the estimate named, or else against its newest. */
  appraisalSheet(setId: number, estimateId?: number): Observable<Paper> {
    return this.api.call(getAppraisalSheet, { params: { id: setId }, query: { estimateId } });
  }

  restorationEstimate(id: number): Observable<Paper> {
    return this.api.call(getRestorationEstimate, { params: { id } });
  }

  appraisalSheetFiles(setId: number, estimateId?: number): PaperFiles {
    const estimate = estimateId === undefined ? '' : `&estimateId=${estimateId}`;
    return filesAt(addressOf(getAppraisalSheetPdf, { id: setId }), estimate);
  }

  restorationEstimateFiles(id: number): PaperFiles {
    return filesAt(addressOf(getRestorationEstimatePdf, { id }));
  }
}

const filesAt = (path: string, query = ''): PaperFiles =>
  PAPER_SIZES.map((size) => ({ size, address: `${path}?paper=${size}${query}` }));
