import type { EstimateDetail } from '../../../src/contracts/estimates';
import type { Practice } from '../../../src/contracts/practice';
import type { SetDetail } from '../../../src/contracts/sets';
import { buildAppraisalSheet } from '../../../src/domain/documents/appraisal-sheet';
import type { Preparer, RestatedForPaper } from '../../../src/domain/documents/inputs';
import type { Paper } from '../../../src/domain/documents/paper';
import { fileNameOf } from '../../../src/domain/documents/phrases';
import { buildRestorationEstimate } from '../../../src/domain/documents/restoration-estimate';
import type { PaperSize } from '../../../src/domain/estimate/terms';
import { firstPeriod, newestPeriod } from '../../../src/domain/series/figures';
import { authorize, type Actor, type Authorized } from '../../db/authorized';
import { ProblemError } from '../../http/problem';
import type { EstimatesService } from '../estimates/estimates.service';
import type { PracticeService } from '../practice/practice.service';
import type { RestatementsService } from '../restatements/restatements.service';
import type { SetsService } from '../sets/sets.service';
import { renderPaperPdf } from './paper-pdf';
import { readFonts, type FontBytes } from './pdf-style';

export type PapersService = ReturnType<typeof createPapersService>;
type Viewing = Authorized<'paper.view'>;

/** A document's file. */
export interface PaperFile {
  readonly name: string;
  readonly bytes: Buffer;
}

export interface OnPaper {
  readonly paper?: PaperSize | undefined;
}

/** Documents written from the saved data at the moment they are asked for. */
export function createPapersService(deps: {
  readonly sets: Pick<SetsService, 'get'>;
  readonly estimates: Pick<EstimatesService, 'get' | 'list'>;
  readonly practice: Pick<PracticeService, 'settings'>;
  readonly restatements: Pick<RestatementsService, 'restateOverTime'>;
  readonly fontsFolder: string;
  readonly now: () => number;
}) {
  const { sets, estimates, practice, restatements, fontsFolder, now } = deps;
  let fonts: FontBytes | undefined;

  function settings(): Practice {
    const found = practice.settings();
    if (found === null) throw new ProblemError('not-found', { detail: 'The practice is not set up yet.' });
    return found;
  }

  /** The price when new in the newest month's money, with the curve for the year scale. */
  function restatedPrice(set: SetDetail): RestatedForPaper | null {
    if (set.priceWhenNew === null) return null;
    const result = restatements.restateOverTime(set.priceWhenNew);
    if (!result.ok) return { known: false, reason: result.error.reason };
    const { series, restatement, curve } = result.value;
    return {
      known: true,
      restatement,
      curve,
      series: { ...series, first: firstPeriod(series), last: newestPeriod(series) },
    };
  }

  /** The estimate asked for, which must be of this set, or the set's newest. */
  function estimateOf(actor: Actor, setId: number, estimateId: number | undefined): EstimateDetail | null {
    const auth = authorize(actor, 'estimate.view');
    if (estimateId !== undefined) {
      const estimate = estimates.get(auth, estimateId);
      if (estimate.set.id !== setId) throw new ProblemError('not-found', { detail: 'No such estimate of this set.' });
      return estimate;
    }
    const newest = estimates.list(auth, { setId, state: 'active', sort: '-updated', page: 1, pageSize: 1 }).items[0];
    return newest === undefined ? null : estimates.get(auth, newest.id);
  }

  function appraisalSheet({ actor }: Viewing, setId: number, estimateId?: number): Paper {
    const set = sets.get(authorize(actor, 'set.view'), setId);
    const ours = settings();
    return buildAppraisalSheet({
      set,
      restated: restatedPrice(set),
      estimate: estimateOf(actor, setId, estimateId),
      practice: ours,
      preparedBy: preparerOf(actor, ours),
      preparedOn: new Date(now()).toISOString().slice(0, 10),
    });
  }

  function restorationEstimate({ actor }: Viewing, estimateId: number): Paper {
    const estimate = estimates.get(authorize(actor, 'estimate.view'), estimateId);
    return buildRestorationEstimate({
      estimate,
      practice: settings(),
      preparedBy: { name: estimate.preparedBy, role: estimate.preparedByRole },
      preparedOn: estimate.updatedAt.slice(0, 10),
    });
  }

  /** On the paper named, or else on the practice's own. */
  async function fileOf(paper: Paper, size: PaperSize | undefined): Promise<PaperFile> {
    fonts ??= readFonts(fontsFolder);
    const bytes = await renderPaperPdf(paper, { size: size ?? settings().paperSize, fonts });
    return { name: fileNameOf(paper), bytes };
  }

  return {
    /** The sheet of a set, with the estimate named or else the set's newest. Throws `not-found`. */
    appraisalSheet,
    /** The estimate for the owner. Throws `not-found`. */
    restorationEstimate,
    appraisalSheetFile: (auth: Viewing, setId: number, options: { estimateId?: number | undefined } & OnPaper) =>
      fileOf(appraisalSheet(auth, setId, options.estimateId), options.paper),
    restorationEstimateFile: (auth: Viewing, estimateId: number, options: OnPaper) =>
      fileOf(restorationEstimate(auth, estimateId), options.paper),
  };
}

/** Whoever works here prepares the sheet they ask for; an owner gets it from the practice's records. */
function preparerOf(actor: Actor, practice: Practice): Preparer {
  return actor.role === 'collector' ? { name: practice.name, role: null } : { name: actor.name, role: actor.role };
}
