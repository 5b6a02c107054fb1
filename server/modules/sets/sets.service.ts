import type { InputOf } from '../../../src/contracts/contract';
import type {
  listSets,
  Photo,
  recordCondition,
  recordWorth,
  SetDetail,
  SetSummary,
  Worth,
} from '../../../src/contracts/sets';
import { toCents } from '../../../src/domain/money/money';
import { formatNumber } from '../../../src/domain/sets/numbers';
import type { Action } from '../../../src/domain/access/policy';
import type { Authorized } from '../../db/authorized';
import { fieldError, ProblemError } from '../../http/problem';
import type { RestatementsService } from '../restatements/restatements.service';
import type { PhotosRepo } from './photos.repo';
import { preparePhoto } from './prepare-photo';
import {
  identityOf,
  moneyOf,
  photoAddress,
  priceOf,
  shownPhoto,
  shownWorth,
  valuesOf,
  type SetInput,
} from './set-rows';
import type { OwnedSet, SetsRepo, WorthRow } from './sets.repo';

export type SetsService = ReturnType<typeof createSetsService>;
type Editing = Authorized<'set.edit'>;
/** As many as one ordering may name. */
const MOST_PHOTOS = 200;

export function createSetsService(deps: {
  readonly repo: SetsRepo;
  readonly photos: PhotosRepo;
  readonly restatements: RestatementsService;
  readonly now: () => number;
}) {
  const { repo, photos, restatements, now } = deps;

  /** The set, if the proof reaches it: another's answers 404 like one that does not exist. */
  function required(auth: Authorized<Action>, id: number): OwnedSet {
    const set = repo.find(auth, id);
    if (set === undefined)
      throw new ProblemError('not-found', { detail: 'There is no such set, or it is not yours to see.' });
    return set;
  }

  /** Everything about one set. Callers of other modules pass their own proof. */
  function detail(auth: Authorized<Action>, id: number): SetDetail {
    const set = required(auth, id);
    const price = priceOf(set);
    return {
      ...identityOf(set),
      priceWhenNew: price,
      hazards: repo.hazards([id]).map(({ hazard, volts, note }) => ({ hazard, volts, note })),
      restated: price === null ? null : restatements.restatePrice(price),
      condition: repo
        .conditions(id)
        .map((c) => ({ id: c.id, part: c.part, grade: c.grade, note: c.note, notedOn: c.notedOn })),
      worths: repo.worths([id]).map(shownWorth),
      photos: photos.of(id).map(shownPhoto),
    };
  }

  function list(auth: Authorized<'set.view'>, query: InputOf<typeof listSets>['query']) {
    const { rows, total } = repo.list(auth, query);
    const ids = rows.map(({ id }) => id);
    const worths = repo.worths(ids);
    const firstPhotos = repo.firstPhotos(ids);
    const inForce = (setId: number, kind: WorthRow['kind']) => worths.find((w) => w.setId === setId && w.kind === kind);
    const items = rows.map((set): SetSummary => {
      const price = priceOf(set);
      const restated = price === null ? null : restatements.restatePrice(price);
      const photoId = firstPhotos.get(set.id);
      const [found, restored] = [inForce(set.id, 'as-found'), inForce(set.id, 'as-restored')];
      return {
        id: set.id,
        number: formatNumber('S', set.id),
        kind: set.kind,
        maker: set.maker,
        model: set.model,
        year: set.year,
        ownerName: set.ownerName,
        photo: photoId === undefined ? null : photoAddress(photoId, 'small'),
        priceWhenNew: price,
        restated: restated?.known === true ? restated.restated : null,
        worthAsFound: found === undefined ? null : moneyOf(found.amountCents, found.currency),
        worthRestored: restored === undefined ? null : moneyOf(restored.amountCents, restored.currency),
        archived: set.archived,
        updatedAt: new Date(set.updatedAt).toISOString(),
      };
    });
    return { items, total, makers: repo.makers(auth) };
  }

  return {
    get: detail,
    list,

    register: (auth: Editing, input: SetInput): SetDetail =>
      detail(
        auth,
        knownOwner(() => repo.insert(auth, valuesOf(input), input.hazards, now())),
      ),

    update(auth: Editing, id: number, { version, ...input }: SetInput & { readonly version: number }): SetDetail {
      required(auth, id);
      const changed = knownOwner(() => repo.update(auth, id, version, valuesOf(input), input.hazards, now()));
      if (!changed) throw new ProblemError('edit-conflict', { current: detail(auth, id) });
      return detail(auth, id);
    },

    archive(auth: Editing, id: number, archived: boolean): SetDetail {
      required(auth, id);
      repo.setArchived(auth, id, archived, now());
      return detail(auth, id);
    },

    recordCondition(
      auth: Editing,
      id: number,
      { notedOn, entries }: InputOf<typeof recordCondition>['body'],
    ): SetDetail {
      required(auth, id);
      refuseFuture('notedOn', notedOn, now());
      const rows = entries.map((entry) => ({ ...entry, notedOn, recordedBy: auth.actor.userId }));
      repo.insertConditions(auth, id, rows, now());
      return detail(auth, id);
    },

    recordWorth(auth: Authorized<'worth.record'>, id: number, input: InputOf<typeof recordWorth>['body']): SetDetail {
      required(auth, id);
      const { amount, low, high, ...same } = input;
      const row = {
        ...same,
        amountCents: toCents(amount),
        lowCents: low === null ? null : toCents(low),
        highCents: high === null ? null : toCents(high),
        recordedBy: auth.actor.userId,
      };
      repo.insertWorth(auth, id, row, now());
      return detail(auth, id);
    },

    async addPhoto(
      auth: Editing,
      id: number,
      file: { readonly bytes: Buffer; readonly name: string; readonly caption?: string },
    ): Promise<Photo> {
      required(auth, id);
      if (photos.of(id).length >= MOST_PHOTOS)
        throw fieldError('photo', `A set has room for ${MOST_PHOTOS} photographs. Remove one first.`);
      const prepared = await preparePhoto(file.bytes, file.name);
      required(auth, id); // it may have gone while the picture was prepared
      const row = photos.append(auth, {
        ...prepared,
        setId: id,
        caption: file.caption ?? '',
        addedBy: auth.actor.userId,
        addedAt: now(),
      });
      return shownPhoto(row);
    },

    captionPhoto(auth: Editing, id: number, photoId: number, caption: string): Photo {
      required(auth, id);
      const row = photos.caption(auth, { setId: id, photoId }, caption, now());
      if (row === undefined) throw new ProblemError('not-found');
      return shownPhoto(row);
    },

    removePhoto(auth: Editing, id: number, photoId: number): void {
      required(auth, id);
      if (!photos.remove(auth, { setId: id, photoId }, now())) throw new ProblemError('not-found');
    },

    orderPhotos(auth: Editing, id: number, photoIds: readonly number[]): { items: Photo[]; total: number } {
      required(auth, id);
      if (!photos.order(auth, id, photoIds, now()))
        throw fieldError('photoIds', 'Name every photograph of the set once. Load the page again and repeat.');
      const items = photos.of(id).map(shownPhoto);
      return { items, total: items.length };
    },

    /** The recorded worths of sets that the caller has already found with a proof of its own, by set. */
    worthsOf: (setIds: readonly number[]): ReadonlyMap<number, readonly Worth[]> =>
      groupBy(repo.worths([...new Set(setIds)]), ({ setId }) => setId, shownWorth),

    picture(auth: Authorized<'set.view'>, photoId: number, size: 'large' | 'small'): Buffer {
      const bytes = photos.picture(auth, photoId, size);
      if (bytes === undefined) throw new ProblemError('not-found');
      return bytes;
    },

    /** Facts about models for anyone: no owner, serial or set number. */
    publicPrices() {
      const items = repo.publicPrices().map((row) => {
        const price = priceOf(row);
        if (price === null) throw new Error('a public price without an amount');
        const restated = restatements.restatePrice(price);
        return {
          kind: row.kind,
          maker: row.maker,
          model: row.model,
          price,
          restated: restated.known ? restated.restated : null,
          to: restated.known ? restated.to.period : null,
        };
      });
      return { items, total: items.length };
    },
  };
}

/** A day from tomorrow on, anywhere in the world, cannot have been noted. */
function refuseFuture(field: string, isoDate: string, now: number): void {
  const newestDayAnywhere = new Date(now + 14 * 60 * 60 * 1000).toISOString().slice(0, 10);
  if (isoDate > newestDayAnywhere)
    throw fieldError(field, 'This day is still to come. Use today or a day before.', isoDate);
}

/** The only foreign key a person types is the owner: SQLite refuses one that is not there. */
function knownOwner<T>(write: () => T): T {
  try {
    return write();
  } catch (error) {
    if (
      (error as { code?: string }).code === 'SQLITE_CONSTRAINT_FOREIGNKEY' ||
      (error as { cause?: { code?: string } }).cause?.code === 'SQLITE_CONSTRAINT_FOREIGNKEY'
    )
      throw fieldError('ownerId', 'There is no such owner. Choose one of the list or add one.');
    throw error;
  }
}

function groupBy<T, K, V>(items: readonly T[], keyOf: (item: T) => K, valueOf: (item: T) => V): Map<K, V[]> {
  const groups = new Map<K, V[]>();
  for (const item of items) groups.set(keyOf(item), [...(groups.get(keyOf(item)) ?? []), valueOf(item)]);
  return groups;
}
