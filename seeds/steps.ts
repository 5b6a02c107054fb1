import type { Services } from '../server/composition';
import { authorize } from '../server/db/authorized';
import type { registerSet } from '../src/contracts/sets';
import type { InputOf } from '../src/contracts/contract';
import { parsePeriod } from '../src/domain/calendar/period';
import { expectOk } from '../src/domain/result';
import type { SetPart, WorthKind } from '../src/domain/sets/terms';
import { nameOf, type DemoSet, type Inspection, type Opined, type Opinion } from './demo-set';
import { drawPicture } from './drawings';
import type { DemoEstimate } from './estimate-lines';
import type { OpenPractice } from './opening';
import { SAID_BY } from './people';
import type { Step } from './timeline';

type SetBody = InputOf<typeof registerSet>['body'];
type Pictures = ReadonlyMap<DemoSet, readonly Buffer[]>;

interface Work {
  readonly services: Services;
  readonly practice: OpenPractice;
  readonly sets: readonly DemoSet[];
  readonly estimates: readonly DemoEstimate[];
  readonly pictures: Pictures;
}

/** Draws every picture of every set; nothing is written. */
export async function drawAll(sets: readonly DemoSet[]): Promise<Pictures> {
  const drawn = new Map<DemoSet, readonly Buffer[]>();
  for (const [place, set] of sets.entries()) {
    const { shape, pictures = [] } = set;
    if (shape === undefined) continue;
    // Front and nearer view share the seed, so that they show one set; each chassis differs.
    const seedOf = (view: string, nth: number) => place * 10 + (view === 'chassis' ? nth : 0);
    drawn.set(
      set,
      await Promise.all(pictures.map(({ view }, nth) => drawPicture({ shape, view, seed: seedOf(view, nth) }))),
    );
  }
  return drawn;
}

/** Everything done to sets and estimates, each on its day. */
export function stepsOf(work: Work): Step[] {
  return work.sets.flatMap((set) => {
    const registered = { id: 0 };
    return [
      ...stepsOfSet(work, set, registered),
      ...work.estimates.filter((e) => e.set === nameOf(set)).flatMap((e) => stepsOfEstimate(work, set, e, registered)),
    ];
  });
}

/** Where a set's first step leaves the id that the later ones need. */
interface Registered {
  id: number;
}

function stepsOfSet({ services: { sets }, practice, pictures }: Work, set: DemoSet, registered: Registered): Step[] {
  const { restorer } = practice.staff;
  const edit = authorize(restorer, 'set.edit');
  const day = (after: number) => set.registered - after;
  return [
    {
      daysAgo: day(0),
      run: async () => {
        registered.id = sets.register(edit, bodyOf(set, practice)).id;
        for (const [nth, { view, caption }] of (set.pictures ?? []).entries()) {
          const bytes = pictures.get(set)?.[nth];
          if (bytes === undefined) throw new Error(`${nameOf(set)} names a picture but no shape.`);
          await sets.addPhoto(edit, registered.id, { bytes, name: `${view}.jpg`, caption });
        }
      },
    },
    ...(set.inspections ?? []).map(({ after, parts }) => ({
      daysAgo: day(after),
      run: (notedOn: string) => sets.recordCondition(edit, registered.id, { notedOn, entries: entriesOf(parts) }),
    })),
    ...(set.opinions ?? []).map((opinion) => ({
      daysAgo: day(opinion.after),
      run: (effectiveOn: string) => {
        const record = authorize(practice.staff[opinion.by], 'worth.record');
        for (const worth of worthsOf(opinion, effectiveOn)) sets.recordWorth(record, registered.id, worth);
      },
    })),
    ...(set.archivedAfter === undefined
      ? []
      : [{ daysAgo: day(set.archivedAfter), run: () => sets.archive(edit, registered.id, true) }]),
  ];
}

function stepsOfEstimate(
  { services: { estimates }, practice }: Work,
  set: DemoSet,
  estimate: DemoEstimate,
  registered: Registered,
): Step[] {
  const edit = authorize(practice.staff.restorer, 'estimate.edit');
  const { title, lines, notes = '', archivedAfter } = estimate;
  const begun = { id: 0 };
  return [
    {
      daysAgo: set.registered - estimate.begun,
      run: () => {
        const draft = estimates.begin(edit, registered.id, { title });
        begun.id = draft.id;
        for (const content of lines) estimates.addLine(edit, begun.id, { content, afterLineId: null });
        if (notes === '') return;
        const { taxTreatment, taxRatePercent, taxNote, depositPercent, version } = estimates.get(edit, begun.id);
        estimates.update(edit, begun.id, {
          ...{ title, taxTreatment, taxRatePercent, taxNote, depositPercent, notes, version },
        });
      },
    },
    ...(archivedAfter === undefined
      ? []
      : [{ daysAgo: set.registered - archivedAfter, run: () => estimates.archive(edit, begun.id, true) }]),
  ];
}

/** The set as the register takes it. */
export function bodyOf(set: DemoSet, { ownerIds }: Pick<OpenPractice, 'ownerIds'>): SetBody {
  return {
    kind: set.kind,
    maker: set.maker,
    model: set.model,
    description: set.description ?? '',
    chassis: set.chassis ?? '',
    serial: set.serial ?? '',
    year: set.year ?? null,
    ownerId: set.owner === null ? null : (ownerIds.get(set.owner) ?? null),
    priceWhenNew: priceOf(set),
    priceIsPublic: set.priceIsPublic ?? false,
    provenance: set.provenance ?? '',
    alterations: set.alterations ?? '',
    notes: set.notes ?? '',
    hazards: [...(set.hazards ?? [])],
  };
}

function priceOf({ price }: DemoSet): SetBody['priceWhenNew'] {
  if (price === undefined) return null;
  const [amount, period, source] = price;
  return { amount, currency: 'USD', period: expectOk(parsePeriod(period)), source };
}

export const entriesOf = (parts: Inspection['parts']) =>
  (Object.entries(parts) as [SetPart, NonNullable<Inspection['parts'][SetPart]>][]).map(([part, [grade, note]]) => ({
    part,
    grade,
    note,
  }));

export function worthsOf({ by, basis, valueType = 'fair-market', found, restored }: Opinion, effectiveOn: string) {
  const said = { currency: 'USD', valueType, effectiveOn, saidBy: SAID_BY[by], basis } as const;
  const opined = (kind: WorthKind, worth: Opined | undefined) => {
    if (worth === undefined) return [];
    const [amount, low, high] = typeof worth === 'string' ? [worth, null, null] : worth;
    return [{ kind, amount, low, high, ...said }];
  };
  return [...opined('as-found', found), ...opined('as-restored', restored)];
}
