import { formatDate } from '../calendar/period';
import { worthInForce } from '../market/worth';
import { formatMoney } from '../money/money';
import {
  GRADE_LABELS,
  SET_KIND_LABELS,
  SET_PART_LABELS,
  SET_PARTS,
  VALUE_TYPE_LABELS,
  type Grade,
} from '../sets/terms';
import { priceFigure, priceSections, restatedFigure, yearScaleOf } from './cost-when-new';
import type {
  EstimateForPaper,
  PracticeForPaper,
  Preparer,
  RestatedForPaper,
  SetForPaper,
  WorthForPaper,
} from './inputs';
import type { Paper, PaperSection } from './paper';
import {
  capacityOf,
  cautionsOf,
  costAgainstWorthInWords,
  costAgainstWorthOf,
  exactMoney,
  nameOfSet,
  OTHER_PROFESSIONS,
  paragraphsOf,
  practiceHead,
  worthFigure,
  worthRange,
} from './phrases';

/**
 * The appraisal sheet of a set: what it is, what it cost, what that is in today's money, what it is worth before and
 * after the work and who says so, its condition, and the cost of the work against that worth.
 *
 * Always a working sheet: no appraiser signs it. What is unknown stands in words.
 *
 * @param options.restated null without a price when new
 * @param options.estimate the estimate set against the worth, if there is one
 * @param options.preparedOn ISO date
 */
export function buildAppraisalSheet(options: {
  readonly set: SetForPaper;
  readonly restated: RestatedForPaper | null;
  readonly estimate: EstimateForPaper | null;
  readonly practice: PracticeForPaper;
  readonly preparedBy: Preparer;
  readonly preparedOn: string;
}): Paper {
  const { set, restated, estimate, practice, preparedBy, preparedOn } = options;
  const owner = set.ownerName === null ? '' : `, for ${set.ownerName}`;
  return {
    kind: 'appraisal-sheet',
    title: 'Appraisal sheet',
    subtitle: `${nameOfSet(set)}${owner}`,
    practice: practiceHead(practice),
    reference: set.number,
    preparedBy: { name: preparedBy.name, capacity: capacityOf(preparedBy, practice) },
    preparedOn,
    standing: 'Working sheet for deciding on the work. Not an appraisal report: no appraiser has signed it.',
    figures: [
      priceFigure(set.priceWhenNew),
      restatedFigure(set.priceWhenNew, restated),
      worthFigure(set.worths, 'as-found'),
      worthFigure(set.worths, 'as-restored'),
    ],
    yearScale: yearScaleOf(set.priceWhenNew, restated),
    costAgainstWorth:
      estimate === null || estimate.lines.length === 0
        ? null
        : costAgainstWorthOf(estimate.verdict, set.worths, estimate.totals.currency),
    sections: [
      costSection(set, estimate),
      identity(set),
      provenance(set.provenance),
      ...priceSections(set.priceWhenNew, restated),
      worthTable(set.worths),
      conditionTable(set.condition),
      {
        type: 'paragraphs',
        heading: 'Alterations',
        paragraphs: set.alterations === '' ? ['None is on record.'] : paragraphsOf(set.alterations),
      },
      cautionsOf(set.hazards),
      limits(),
    ],
    language: 'en',
  };
}

function costSection(set: SetForPaper, estimate: EstimateForPaper | null): PaperSection {
  return { type: 'cost-against-worth', heading: 'Cost against worth', paragraphs: costInWords(set, estimate) };
}

function costInWords(set: SetForPaper, estimate: EstimateForPaper | null): string[] {
  if (estimate === null) return ['No estimate of the work is on record, so there is no cost to set against the worth.'];
  const { currency, likely } = estimate.totals;
  if (estimate.lines.length === 0) return [`Estimate ${estimate.number} has nothing priced yet.`];
  return [
    `Estimate ${estimate.number}, ${estimate.title}: ${formatMoney(likely.total, currency)} likely, tax included.`,
    ...costAgainstWorthInWords(estimate.verdict, set.worths, currency),
  ];
}

function identity(set: SetForPaper): PaperSection {
  const recorded = (text: string) => (text === '' ? 'Not recorded' : text);
  return {
    type: 'facts',
    heading: 'The set',
    rows: [
      { label: 'Kind', value: SET_KIND_LABELS[set.kind] },
      { label: 'Maker and model', value: `${set.maker} ${set.model}` },
      ...(set.description === '' ? [] : [{ label: 'Description', value: set.description }]),
      { label: 'Year', value: set.year === null ? 'Not known' : String(set.year) },
      { label: 'Chassis', value: recorded(set.chassis) },
      { label: 'Serial number', value: recorded(set.serial) },
      { label: 'Owner', value: set.ownerName ?? 'Not recorded' },
    ],
  };
}

const provenance = (text: string): PaperSection => ({
  type: 'paragraphs',
  heading: 'Provenance',
  paragraphs: text === '' ? ['Nothing is on record.'] : paragraphsOf(text),
});

function worthTable(worths: readonly WorthForPaper[]): PaperSection {
  const found = worthInForce(worths, 'as-found');
  const restored = worthInForce(worths, 'as-restored');
  if (found === undefined && restored === undefined)
    return {
      type: 'paragraphs',
      heading: 'Worth',
      paragraphs: ['No worth is on record yet, neither as the set was found nor as it would be restored.'],
    };
  const row = (label: string, say: (worth: WorthForPaper) => string) => ({
    style: 'plain' as const,
    cells: [label, ...[found, restored].map((worth) => (worth === undefined ? 'Not on record' : say(worth)))],
  });
  return {
    type: 'table',
    heading: 'Worth',
    columns: [
      { label: '', align: 'left' },
      { label: 'As found', align: 'left' },
      { label: 'As restored', align: 'left' },
    ],
    rows: [
      row('Worth', (worth) => exactMoney(worth.amount.amount, worth.amount.currency)),
      row('Range', (worth) => worthRange(worth) ?? 'None given'),
      row('Type of value', (worth) => VALUE_TYPE_LABELS[worth.valueType]),
      row('Effective', (worth) => formatDate(worth.effectiveOn)),
      row('Who says so', (worth) => worth.saidBy),
      row('Basis', (worth) => worth.basis),
    ],
    note: 'As restored supposes that the work has been done and done well. That is an assumption, not a fact, until it is.',
  };
}

function conditionTable(condition: SetForPaper['condition']): PaperSection {
  const present = SET_PARTS.flatMap((part) => condition.find((entry) => entry.part === part) ?? []);
  if (present.length === 0)
    return { type: 'paragraphs', heading: 'Condition by part', paragraphs: ['No condition is on record yet.'] };
  return {
    type: 'table',
    heading: 'Condition by part',
    columns: [
      { label: 'Part', align: 'left' },
      { label: 'Condition', align: 'left' },
      { label: 'Note', align: 'left' },
      { label: 'Noted', align: 'right' },
    ],
    rows: present.map(({ part, grade, note, notedOn }) => ({
      style: 'plain',
      cells: [SET_PART_LABELS[part], `${grade} ${GRADE_LABELS[grade as Grade]}`, note, formatDate(notedOn)],
    })),
    note: 'Graded 1 (poor) to 5 (as new). Parts that are not listed have not been looked at.',
  };
}

const limits = (): PaperSection => ({
  type: 'paragraphs',
  heading: 'Limits',
  paragraphs: [
    'This is a working sheet, made to decide whether the work is worth doing. It is not an appraisal report and should not be used as one. An appraisal carries the name and signature of an appraiser, who answers for it under the standards and credentials of that profession.',
    'The worths are those of the people named beside them, on the day named. They can change with the market and with what is found inside the set.',
    OTHER_PROFESSIONS,
  ],
});
