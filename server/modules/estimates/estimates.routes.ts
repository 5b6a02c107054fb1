import { Router } from 'express';
import {
  addLine,
  archiveEstimate,
  beginEstimate,
  getEstimate,
  listEstimates,
  moveLine,
  removeLine,
  updateEstimate,
  updateLine,
} from '../../../src/contracts/estimates';
import { route } from '../../http/route';
import type { EstimatesService } from './estimates.service';

export function estimatesRoutes({ estimates }: { readonly estimates: EstimatesService }): Router {
  const router = Router();
  route(router, listEstimates, ({ auth, input }) => estimates.list(auth, input.query));
  route(router, getEstimate, ({ auth, input }) => estimates.get(auth, input.params.id));
  route(router, beginEstimate, ({ auth, input }) => estimates.begin(auth, input.params.id, input.body));
  route(router, updateEstimate, ({ auth, input }) => estimates.update(auth, input.params.id, input.body));
  route(router, archiveEstimate, ({ auth, input }) => estimates.archive(auth, input.params.id, input.body.archived));
  route(router, addLine, ({ auth, input }) => estimates.addLine(auth, input.params.id, input.body));
  route(router, updateLine, ({ auth, input }) =>
    estimates.updateLine(auth, input.params.id, input.params.lineId, input.body),
  );
  route(router, removeLine, ({ auth, input }) =>
    estimates.removeLine(auth, input.params.id, input.params.lineId, input.query.version),
  );
  route(router, moveLine, ({ auth, input }) =>
    estimates.moveLine(auth, input.params.id, input.params.lineId, input.body.afterLineId),
  );
  return router;
}
