import { Router } from 'express';
import { getPractice, updatePractice } from '../../../src/contracts/practice';
import { route } from '../../http/route';
import type { PracticeService } from './practice.service';

export function practiceRoutes({ practice }: { readonly practice: PracticeService }): Router {
  const router = Router();
  route(router, getPractice, ({ auth }) => practice.get(auth));
  route(router, updatePractice, ({ auth, input }) => practice.update(auth, input.body));
  return router;
}
