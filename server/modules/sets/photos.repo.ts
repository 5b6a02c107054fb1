import { and, asc, eq, max } from 'drizzle-orm';
import type { Authorized } from '../../db/authorized';
import type { Database } from '../../db/client';
import { owners, setPhotos, sets } from '../../db/schema';
import { reach } from './sets.query.repo';

const shownColumns = {
  id: setPhotos.id,
  setId: setPhotos.setId,
  caption: setPhotos.caption,
  position: setPhotos.position,
  width: setPhotos.width,
  height: setPhotos.height,
};
export type PhotoRow = Pick<typeof setPhotos.$inferSelect, keyof typeof shownColumns>;
export type PhotosRepo = ReturnType<typeof createPhotosRepo>;
type Editing = Authorized<'set.edit'>;
/** A photograph's id, and the set it must belong to. */
interface PhotoOfSet {
  readonly setId: number;
  readonly photoId: number;
}

export function createPhotosRepo(db: Database) {
  const of = (setId: number): PhotoRow[] =>
    db
      .select(shownColumns)
      .from(setPhotos)
      .where(eq(setPhotos.setId, setId))
      .orderBy(asc(setPhotos.position), asc(setPhotos.id))
      .all();

  /** One change of the set's photographs; where it changed something, the set has changed too. */
  const change = <T>(
    setId: number,
    now: number,
    act: (tx: Pick<Database, 'select' | 'insert' | 'update' | 'delete'>) => T,
  ): T =>
    db.transaction(
      (tx) => {
        const done = act(tx);
        if (done !== false && done !== undefined)
          tx.update(sets).set({ updatedAt: now }).where(eq(sets.id, setId)).run();
        return done;
      },
      { behavior: 'immediate' },
    );

  return {
    /** The photographs of a set already found with a proof. */
    of,

    picture: (auth: Authorized<'set.view'>, photoId: number, size: 'large' | 'small'): Buffer | undefined =>
      db
        .select({ bytes: setPhotos[size] })
        .from(setPhotos)
        .innerJoin(sets, eq(setPhotos.setId, sets.id))
        .leftJoin(owners, eq(sets.ownerId, owners.id))
        .where(and(eq(setPhotos.id, photoId), reach(auth)))
        .get()?.bytes,

    /** Adds at the end; the place is found inside the insert, so two uploads at once do not share one. */
    append: (_auth: Editing, photo: Omit<typeof setPhotos.$inferInsert, 'id' | 'position'>): PhotoRow =>
      change(photo.setId, photo.addedAt, (tx) => {
        const last = tx
          .select({ at: max(setPhotos.position) })
          .from(setPhotos)
          .where(eq(setPhotos.setId, photo.setId))
          .get();
        return tx
          .insert(setPhotos)
          .values({ ...photo, position: (last?.at ?? 0) + 1 })
          .returning(shownColumns)
          .get();
      }),

    /** Captions a photograph of this set; undefined when it has no such photograph. */
    caption: (_auth: Editing, photo: PhotoOfSet, caption: string, now: number): PhotoRow | undefined =>
      change(photo.setId, now, (tx) =>
        tx.update(setPhotos).set({ caption }).where(is(photo)).returning(shownColumns).all().at(0),
      ),

    remove: (_auth: Editing, photo: PhotoOfSet, now: number): boolean =>
      change(photo.setId, now, (tx) => tx.delete(setPhotos).where(is(photo)).run().changes === 1),

    /** Puts the set's photographs in the order given, if these are exactly its photographs. */
    order: (_auth: Editing, setId: number, photoIds: readonly number[], now: number): boolean =>
      change(setId, now, (tx) => {
        const present = of(setId).map(({ id }) => id);
        if (present.length !== photoIds.length || !present.every((id) => photoIds.includes(id))) return false;
        photoIds.forEach((id, at) =>
          tx
            .update(setPhotos)
            .set({ position: at + 1 })
            .where(eq(setPhotos.id, id))
            .run(),
        );
        return true;
      }),
  };
}

const is = ({ setId, photoId }: PhotoOfSet) => and(eq(setPhotos.id, photoId), eq(setPhotos.setId, setId));
