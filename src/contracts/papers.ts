import * as z from 'zod';
import type { Paper } from '../domain/documents/paper';
import { PAPER_SIZES } from '../domain/estimate/terms';
import { id, idParams } from './common';
import { contract } from './contract';

/** Built by `src/domain/documents`; its shape is that of the type `Paper`. */
const paper = z.custom<Paper>((value) => typeof value === 'object' && value !== null && 'sections' in value);

/** The estimate that the sheet sets against the worth; left out: the newest of the set. */
const sheetQuery = z.object({ estimateId: id.optional() });
const size = z.enum(PAPER_SIZES).optional();

export const getAppraisalSheet = contract({
  method: 'GET',
  path: '/api/sets/:id/appraisal-sheet',
  access: 'paper.view',
  summary: 'The appraisal sheet of a set',
  params: idParams,
  query: sheetQuery,
  reply: paper,
});

export const getAppraisalSheetPdf = contract({
  method: 'GET',
  path: '/api/sets/:id/appraisal-sheet.pdf',
  access: 'paper.view',
  summary: 'The appraisal sheet as PDF, on the practice’s paper or the one named',
  params: idParams,
  query: sheetQuery.extend({ paper: size }),
  reply: 'binary',
});

export const getRestorationEstimate = contract({
  method: 'GET',
  path: '/api/estimates/:id/restoration-estimate',
  access: 'paper.view',
  summary: 'The restoration estimate for the owner',
  params: idParams,
  reply: paper,
});

export const getRestorationEstimatePdf = contract({
  method: 'GET',
  path: '/api/estimates/:id/restoration-estimate.pdf',
  access: 'paper.view',
  summary: 'The restoration estimate as PDF',
  params: idParams,
  query: z.object({ paper: size }),
  reply: 'binary',
});
