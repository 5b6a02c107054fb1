import { createHash } from 'node:crypto';
import { Router, type RequestHandler } from 'express';
import {
  addPhoto,
  archiveSet,
  captionPhoto,
  getPhoto,
  getSet,
  listPublicPrices,
  listSets,
  orderPhotos,
  recordCondition,
  recordWorth,
  registerSet,
  removePhoto,
  updateSet,
} from '../../../src/contracts/sets';
import { authorize, type Actor } from '../../db/authorized';
import { fieldError, ProblemError } from '../../http/problem';
import { route } from '../../http/route';
import { oneFile } from '../../http/uploads';
import type { SetsService } from './sets.service';

const PHOTO_MEGABYTES = 25;

export function setsRoutes({ sets }: { readonly sets: SetsService }): Router {
  const router = Router();
  route(router, listPublicPrices, () => sets.publicPrices());
  route(router, listSets, ({ auth, input }) => sets.list(auth, input.query));
  route(router, registerSet, ({ auth, input }) => sets.register(auth, input.body));
  route(router, getSet, ({ auth, input }) => sets.get(auth, input.params.id));
  route(router, updateSet, ({ auth, input }) => sets.update(auth, input.params.id, input.body));
  route(router, archiveSet, ({ auth, input }) => sets.archive(auth, input.params.id, input.body.archived));
  route(router, recordCondition, ({ auth, input }) => sets.recordCondition(auth, input.params.id, input.body));
  route(router, recordWorth, ({ auth, input }) => sets.recordWorth(auth, input.params.id, input.body));

  // Nobody who may not add a photograph has 25 MB of theirs read into memory.
  router.post(addPhoto.path, mayAddPhotos, oneFile('photo', PHOTO_MEGABYTES));
  route(router, addPhoto, ({ auth, input, req }) => {
    if (req.file === undefined) throw fieldError('photo', 'Send one photograph in this field.');
    return sets.addPhoto(auth, input.params.id, { bytes: req.file.buffer, name: req.file.originalname });
  });
  route(router, captionPhoto, ({ auth, input }) =>
    sets.captionPhoto(auth, input.params.id, input.params.photoId, input.body.caption),
  );
  route(router, removePhoto, ({ auth, input }) => sets.removePhoto(auth, input.params.id, input.params.photoId));
  route(router, orderPhotos, ({ auth, input }) => sets.orderPhotos(auth, input.params.id, input.body.photoIds));
  route(router, getPhoto, ({ auth, input, req, res }) => {
    const bytes = sets.picture(auth, input.params.photoId, input.params.size);
    res
      .set('Cache-Control', 'private, no-cache')
      .set('ETag', `"${createHash('sha256').update(bytes).digest('base64url')}"`);
    if (req.fresh) res.status(304).end();
    else res.type('jpeg').send(bytes);
  });
  return router;
}

const mayAddPhotos: RequestHandler = (req, _res, next) => {
  const actor = req.user as Actor | undefined;
  if (actor === undefined) throw new ProblemError('not-signed-in');
  authorize(actor, addPhoto.access);
  next();
};
