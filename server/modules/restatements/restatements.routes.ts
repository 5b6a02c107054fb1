import { Router } from 'express';
import { getRestatement } from '../../../src/contracts/restatements';
import { getSeriesFigures, listSeries } from '../../../src/contracts/series';
import { route } from '../../http/route';
import type { RestatementsService } from './restatements.service';

/** Published figures may be kept by anyone who asks whether they changed first. */
const KEEP_BUT_ASK = 'public, no-cache';

/** Restating, open to anyone. */
export function restatementsRoutes({ restatements }: { readonly restatements: RestatementsService }): Router {
  const router = Router();
  route(router, listSeries, ({ res }) => {
    res.set('Cache-Control', KEEP_BUT_ASK);
    return restatements.listSeries();
  });
  route(router, getSeriesFigures, ({ input, res }) => {
    const figures = restatements.listFigures(input.params.id);
    res.set('Cache-Control', KEEP_BUT_ASK);
    return figures;
  });
  route(router, getRestatement, ({ input, res }) => {
    const restatement = restatements.restate(input.query);
    res.set('Cache-Control', KEEP_BUT_ASK);
    return restatement;
  });
  return router;
}
