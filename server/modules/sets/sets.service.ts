import type { InputOf } from '../../../src/contracts/contract';
import type {
  listSets,
  Photo,
  recordCondition,
  recordWorth,
  registerSet,
  SetDetail,
  SetSummary,
  Worth,
} from '../../../src/contracts/sets';
import { parsePeriod, type Period } from '../../../src/domain/calendar/period';
import { cents, centsToDecimal, toCents } from '../../../src/domain/money/money';
import { expectOk } from '../../../src/domain/result';
import { formatNumber } from '../../../src/domain/sets/numbers';
import type { Action } from '../../../src/domain/access/policy';
import type { Authorized } from '../../db/authorized';
import { fieldError, ProblemError } from '../../http/problem';
import type { RestatementsService } from '../restatements/restatements.service';
import type { PhotoRow, PhotosRepo } from './photos.repo';
import { preparePhoto } from './prepare-photo';
import type { OwnedSet, SetsRepo, SetValues, WorthRow } from './sets.repo';

export type SetsService = ReturnType<typeof createSetsService>;
type SetInput = InputOf<typeof registerSet>['body'];
type Editing = Authorized<'set.edit'>;

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
      const who = { setId: id, notedOn, recordedBy: auth.actor.userId, recordedAt: now() };
      repo.insertConditions(
        auth,
        entries.map((entry) => ({ ...entry, ...who })),
      );
      repo.touch(auth, id, now());
      return detail(auth, id);
    },

    recordWorth(auth: Authorized<'worth.record'>, id: number, input: InputOf<typeof recordWorth>['body']): SetDetail {
      required(auth, id);
      const { amount, low, high, ...same } = input;
      repo.insertWorth(auth, {
        ...same,
        setId: id,
        amountCents: toCents(amount),
        lowCents: low === null ? null : toCents(low),
        highCents: high === null ? null : toCents(high),
        recordedBy: auth.actor.userId,
        recordedAt: now(),
      });
      repo.touch(auth, id, now());
      return detail(auth, id);
    },

    async addPhoto(
      auth: Editing,
      id: number,
      file: { readonly bytes: Buffer; readonly name: string; readonly caption?: string },
    ): Promise<Photo> {
      required(auth, id);
      const prepared = await preparePhoto(file.bytes, file.name);
      required(auth, id); // it may have gone while the picture was prepared
      const row = photos.append(auth, {
        ...prepared,
        setId: id,
        caption: file.caption ?? '',
        addedBy: auth.actor.userId,
        addedAt: now(),
      });
      repo.touch(auth, id, now());
      return shownPhoto(row);
    },

    captionPhoto(auth: Editing, id: number, photoId: number, caption: string): Photo {
      required(auth, id);
      const row = photos.caption(auth, id, photoId, caption);
      if (row === undefined) throw new ProblemError('not-found');
      return shownPhoto(row);
    },

    removePhoto(auth: Editing, id: number, photoId: number): void {
      required(auth, id);
      if (!photos.remove(auth, id, photoId)) throw new ProblemError('not-found');
      repo.touch(auth, id, now());
    },

    orderPhotos(auth: Editing, id: number, photoIds: readonly number[]): { items: Photo[]; total: number } {
      required(auth, id);
      if (!photos.order(auth, id, photoIds))
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

type PriceColumns = Pick<OwnedSet, 'priceCents' | 'priceCurrency' | 'pricePeriod' | 'priceSource'>;

function priceOf({ priceCents, pricePeriod, priceSource }: PriceColumns) {
  if (priceCents === null || pricePeriod === null || priceSource === null) return null;
  const period: Period = expectOk(parsePeriod(pricePeriod));
  return { amount: centsToDecimal(cents(priceCents)), currency: 'USD' as const, period, source: priceSource };
}

function valuesOf({ priceWhenNew, hazards: _, ...same }: SetInput): SetValues {
  return {
    ...same,
    priceCents: priceWhenNew === null ? null : toCents(priceWhenNew.amount),
    priceCurrency: priceWhenNew?.currency ?? null,
    pricePeriod: priceWhenNew?.period ?? null,
    priceSource: priceWhenNew?.source ?? null,
  };
}

function identityOf(set: OwnedSet) {
  return {
    id: set.id,
    number: formatNumber('S', set.id),
    version: set.version,
    kind: set.kind,
    maker: set.maker,
    model: set.model,
    description: set.description,
    chassis: set.chassis,
    serial: set.serial,
    year: set.year,
    ownerId: set.ownerId,
    ownerName: set.ownerName,
    priceIsPublic: set.priceIsPublic,
    provenance: set.provenance,
    alterations: set.alterations,
    notes: set.notes,
    archived: set.archived,
    updatedAt: new Date(set.updatedAt).toISOString(),
  };
}

const moneyOf = (amount: number, currency: string) => ({ amount: centsToDecimal(cents(amount)), currency });
const photoAddress = (id: number, size: 'large' | 'small') => `/api/photos/${id}/${size}`;

const shownPhoto = ({ setId: _, ...photo }: PhotoRow): Photo => ({
  ...photo,
  large: photoAddress(photo.id, 'large'),
  small: photoAddress(photo.id, 'small'),
});

function shownWorth(row: WorthRow & { readonly recorder: string }): Worth {
  const optional = (amount: number | null) => (amount === null ? null : moneyOf(amount, row.currency));
  return {
    id: row.id,
    kind: row.kind,
    amount: moneyOf(row.amountCents, row.currency),
    low: optional(row.lowCents),
    high: optional(row.highCents),
    valueType: row.valueType,
    effectiveOn: row.effectiveOn,
    saidBy: row.saidBy,
    basis: row.basis,
    recordedBy: row.recorder,
    recordedAt: new Date(row.recordedAt).toISOString(),
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
