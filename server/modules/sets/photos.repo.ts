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

export function createPhotosRepo(db: Database) {
  const of = (setId: number): PhotoRow[] =>
    db
      .select(shownColumns)
      .from(setPhotos)
      .where(eq(setPhotos.setId, setId))
      .orderBy(asc(setPhotos.position), asc(setPhotos.id))
      .all();

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
      db.transaction(
        (tx) => {
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
        },
        { behavior: 'immediate' },
      ),

    caption: (_auth: Editing, setId: number, photoId: number, caption: string): PhotoRow | undefined =>
      db
        .update(setPhotos)
        .set({ caption })
        .where(and(eq(setPhotos.id, photoId), eq(setPhotos.setId, setId)))
        .returning(shownColumns)
        .get(),

    remove: (_auth: Editing, setId: number, photoId: number): boolean =>
      db
        .delete(setPhotos)
        .where(and(eq(setPhotos.id, photoId), eq(setPhotos.setId, setId)))
        .run().changes === 1,

    /** Puts the set's photographs in the order given, if these are exactly its photographs. */
    order: (_auth: Editing, setId: number, photoIds: readonly number[]): boolean =>
      db.transaction(
        (tx) => {
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
        },
        { behavior: 'immediate' },
      ),
  };
}
