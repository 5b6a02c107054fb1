import type { InputOf } from '../../../src/contracts/contract';
import type {
  EstimateDetail,
  EstimateLine,
  EstimateSummary,
  LineContent,
  listEstimates,
  updateEstimate,
} from '../../../src/contracts/estimates';
import type { Action } from '../../../src/domain/access/policy';
import { lineNet, MOST_LINES, type Line } from '../../../src/domain/estimate/line';
import { estimateTotals, type Terms, type Totals } from '../../../src/domain/estimate/totals';
import { costAgainstWorth, type StatedWorth, type Verdict } from '../../../src/domain/estimate/verdict';
import { worthInForce } from '../../../src/domain/market/worth';
import { Dec } from '../../../src/domain/money/decimal';
import { cents, centsToDecimal, toCents } from '../../../src/domain/money/money';
import { percentToPpm, ppmToPercent } from '../../../src/domain/money/scaled';
import { formatNumber } from '../../../src/domain/sets/numbers';
import type { Worth } from '../../../src/contracts/sets';
import type { Authorized } from '../../db/authorized';
import { fieldError, ProblemError } from '../../http/problem';
import type { PracticeService } from '../practice/practice.service';
import type { SetsService } from '../sets/sets.service';
import type { EstimateRow, EstimatesRepo, FoundEstimate, LineRow } from './estimates.repo';
import { columnsOf, contentOf } from './line-columns';

export type EstimatesService = ReturnType<typeof createEstimatesService>;
type Editing = Authorized<'estimate.edit'>;
type Query = InputOf<typeof listEstimates>['query'];

export function createEstimatesService(deps: {
  readonly repo: EstimatesRepo;
  readonly sets: Pick<SetsService, 'get' | 'worthsOf'>;
  readonly practice: Pick<PracticeService, 'settings'>;
  readonly now: () => number;
}) {
  const { repo, sets, practice, now } = deps;

  function required(auth: Authorized<Action>, id: number): FoundEstimate {
    const estimate = repo.find(auth, id);
    if (estimate === undefined)
      throw new ProblemError('not-found', { detail: 'There is no such estimate, or it is not yours to see.' });
    return estimate;
  }

  function requiredLine(auth: Editing, estimateId: number, lineId: number): LineRow {
    required(auth, estimateId);
    const line = repo.line(auth, estimateId, lineId);
    if (line === undefined) throw new ProblemError('not-found', { detail: 'This line was removed meanwhile.' });
    return line;
  }

  /** Everything about one estimate, its sums made from the lines as they stand. Callers pass their own proof. */
  function get(auth: Authorized<Action>, id: number): EstimateDetail {
    const estimate = required(auth, id);
    const lines = repo.lines([id]);
    const { number, kind, maker, model, year, ownerName, hazards, worths } = sets.get(auth, estimate.setId);
    const totals = estimateTotals(lines.map(contentOf), termsOf(estimate));
    return {
      id,
      number: formatNumber('E', id),
      version: estimate.version,
      title: estimate.title,
      taxTreatment: estimate.taxTreatment,
      taxRatePercent: ppmToPercent(estimate.taxRatePpm),
      taxNote: estimate.taxNote,
      depositPercent: ppmToPercent(estimate.depositPpm),
      notes: estimate.notes,
      set: { id: estimate.setId, number, kind, maker, model, year, ownerName, hazards, worths },
      defaults: {
        labourRate: centsToDecimal(cents(estimate.labourRateCents)),
        partsMarkupPercent: ppmToPercent(estimate.partsMarkupPpm),
        outsideMarkupPercent: ppmToPercent(estimate.outsideMarkupPpm),
      },
      preparedBy: estimate.preparer,
      preparedByRole: estimate.preparerRole,
      archived: estimate.archived,
      createdAt: new Date(estimate.createdAt).toISOString(),
      updatedAt: new Date(estimate.updatedAt).toISOString(),
      lines: lines.map(shownLine),
      totals: { ...totals, stages: [...totals.stages] },
      verdict: verdictOf(worths, totals),
    };
  }

  function list(auth: Authorized<'estimate.view'>, query: Query): { items: EstimateSummary[]; total: number } {
    const { q = '', setId, state, sort, page, pageSize } = query;
    const found = repo.list(auth, { q, setId, state });
    const lines = new Map<number, Line[]>(found.map(({ id }) => [id, []]));
    for (const row of repo.lines([...lines.keys()])) lines.get(row.estimateId)?.push(contentOf(row));
    const worths = sets.worthsOf(found.map((estimate) => estimate.setId));
    const items = found.map((estimate): EstimateSummary => {
      const totals = estimateTotals(lines.get(estimate.id) ?? [], termsOf(estimate));
      const verdict = verdictOf(worths.get(estimate.setId) ?? [], totals);
      return {
        id: estimate.id,
        number: formatNumber('E', estimate.id),
        title: estimate.title,
        setId: estimate.setId,
        setNumber: formatNumber('S', estimate.setId),
        setName: `${estimate.maker} ${estimate.model}`,
        ownerName: estimate.ownerName,
        total: { amount: totals.likely.total, currency: totals.currency },
        gap: verdict?.gap.atLikely ?? null,
        archived: estimate.archived,
        updatedAt: new Date(estimate.updatedAt).toISOString(),
      };
    });
    items.sort(ORDER[sort]);
    return { items: items.slice((page - 1) * pageSize, page * pageSize), total: items.length };
  }

  return {
    get,
    list,

    /** Begins with the practice's rates and taxes of this moment. */
    begin(auth: Editing, setId: number, { title }: { readonly title: string }): EstimateDetail {
      sets.get(auth, setId);
      const settings = practice.settings();
      if (settings === null) throw new ProblemError('not-found', { detail: 'The practice is not set up yet.' });
      const id = repo.insert(auth, {
        setId,
        title,
        currency: settings.currency,
        labourRateCents: toCents(settings.labourRate),
        partsMarkupPpm: percentToPpm(settings.partsMarkupPercent),
        outsideMarkupPpm: percentToPpm(settings.outsideMarkupPercent),
        taxTreatment: settings.taxTreatment,
        taxRatePpm: percentToPpm(settings.taxRatePercent),
        taxNote: settings.taxNote,
        depositPpm: percentToPpm(settings.depositPercent),
        preparedBy: auth.actor.userId,
        createdAt: now(),
        updatedAt: now(),
      });
      return get(auth, id);
    },

    update(auth: Editing, id: number, { version, ...input }: InputOf<typeof updateEstimate>['body']): EstimateDetail {
      required(auth, id);
      const { taxRatePercent, depositPercent, ...same } = input;
      const values = { ...same, taxRatePpm: percentToPpm(taxRatePercent), depositPpm: percentToPpm(depositPercent) };
      if (!repo.update(auth, id, version, values, now()))
        throw new ProblemError('edit-conflict', { current: get(auth, id) });
      return get(auth, id);
    },

    archive(auth: Editing, id: number, archived: boolean): EstimateDetail {
      required(auth, id);
      repo.setArchived(auth, id, archived, now());
      return get(auth, id);
    },

    addLine(auth: Editing, id: number, input: { readonly content: LineContent; readonly afterLineId: number | null }) {
      required(auth, id);
      if (input.afterLineId !== null) requiredNeighbour(auth, id, input.afterLineId, input.content.stage);
      if (repo.lines([id]).length >= MOST_LINES)
        throw fieldError('content', `An estimate has at most ${MOST_LINES} lines; begin another for the rest.`);
      const lineId = repo.insertLine(auth, id, columnsOf(input.content), input.afterLineId, now());
      return { lineId, estimate: get(auth, id) };
    },

    updateLine(
      auth: Editing,
      id: number,
      lineId: number,
      input: { readonly content: LineContent; readonly version: number },
    ): EstimateDetail {
      const line = requiredLine(auth, id, lineId);
      if (!repo.updateLine(auth, line, input.version, columnsOf(input.content), now()))
        throw lineConflict(auth, id, lineId);
      return get(auth, id);
    },

    removeLine(auth: Editing, id: number, lineId: number, version: number): EstimateDetail {
      const line = requiredLine(auth, id, lineId);
      if (!repo.removeLine(auth, line, version, now())) throw lineConflict(auth, id, lineId);
      return get(auth, id);
    },

    moveLine(auth: Editing, id: number, lineId: number, afterLineId: number | null): EstimateDetail {
      const line = requiredLine(auth, id, lineId);
      if (afterLineId !== null) requiredNeighbour(auth, id, afterLineId, line.stage);
      repo.moveLine(auth, line, afterLineId, now());
      return get(auth, id);
    },
  };

  function requiredNeighbour(auth: Editing, id: number, lineId: number, stage: LineRow['stage']): void {
    const neighbour = repo.line(auth, id, lineId);
    if (neighbour?.stage !== stage)
      throw fieldError('afterLineId', 'Name a line of the same stage and estimate, or none.', String(lineId));
  }

  function lineConflict(auth: Editing, id: number, lineId: number): ProblemError {
    return new ProblemError('edit-conflict', { current: shownLine(requiredLine(auth, id, lineId)) });
  }
}

const ORDER: Readonly<Record<Query['sort'], (a: EstimateSummary, b: EstimateSummary) => number>> = {
  '-updated': (a, b) => compare(b.updatedAt, a.updatedAt) || b.id - a.id,
  number: (a, b) => a.id - b.id,
  '-total': (a, b) => new Dec(b.total.amount).comparedTo(a.total.amount) || a.id - b.id,
  set: (a, b) => compare(a.setName.toLowerCase(), b.setName.toLowerCase()) || a.id - b.id,
};
const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);

const termsOf = (row: EstimateRow): Terms => ({
  currency: row.currency,
  taxTreatment: row.taxTreatment,
  taxRatePercent: ppmToPercent(row.taxRatePpm),
  depositPercent: ppmToPercent(row.depositPpm),
});

function shownLine(row: LineRow): EstimateLine {
  const content: Line = contentOf(row);
  const net = (point: 'low' | 'likely' | 'high') => centsToDecimal(lineNet(content, point));
  return { id: row.id, version: row.version, content, net: net('likely'), netLow: net('low'), netHigh: net('high') };
}

/** Cost against the worths in force; null while one of the two is not on record. */
function verdictOf(worths: readonly Worth[], totals: Totals): Verdict | null {
  const stated = (kind: Worth['kind']): StatedWorth | undefined => {
    const worth = worthInForce(worths, kind);
    return worth && { ...worth, amount: worth.amount.amount };
  };
  const [found, restored] = [stated('as-found'), stated('as-restored')];
  return found === undefined || restored === undefined ? null : costAgainstWorth(found, restored, totals);
}
