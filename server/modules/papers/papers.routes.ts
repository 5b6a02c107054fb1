import { Router, type Response } from 'express';
import {
  getAppraisalSheet,
  getAppraisalSheetPdf,
  getRestorationEstimate,
  getRestorationEstimatePdf,
} from '../../../src/contracts/papers';
import { route } from '../../http/route';
import type { PaperFile, PapersService } from './papers.service';

/** Documents, as content for the printed page and as PDF. */
export function papersRoutes({ papers }: { readonly papers: PapersService }): Router {
  const router = Router();
  route(router, getAppraisalSheet, ({ auth, input }) =>
    papers.appraisalSheet(auth, input.params.id, input.query.estimateId),
  );
  route(router, getRestorationEstimate, ({ auth, input }) => papers.restorationEstimate(auth, input.params.id));
  route(router, getAppraisalSheetPdf, async ({ auth, input, res }) => {
    send(res, await papers.appraisalSheetFile(auth, input.params.id, input.query));
  });
  route(router, getRestorationEstimatePdf, async ({ auth, input, res }) => {
    send(res, await papers.restorationEstimateFile(auth, input.params.id, input.query));
  });
  return router;
}

/** Answers a file to save under its name; made anew for every request, it is never kept. */
function send(res: Response, { name, bytes }: PaperFile): void {
  res.attachment(name).type('pdf').set('Cache-Control', 'no-store').send(bytes);
}
