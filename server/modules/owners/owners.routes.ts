import { Router } from 'express';
import { addOwner, listOwners } from '../../../src/contracts/owners';
import { route } from '../../http/route';
import type { OwnersService } from './owners.service';

export function ownersRoutes({ owners }: { readonly owners: OwnersService }): Router {
  const router = Router();
  route(router, listOwners, ({ auth }) => owners.list(auth));
  route(router, addOwner, ({ auth, input }) => owners.add(auth, input.body));
  return router;
}
