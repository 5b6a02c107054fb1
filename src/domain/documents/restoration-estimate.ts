import type { Line } from '../estimate/line';
import { Dec } from '../money/decimal';
import { formatMoney } from '../money/money';
import { LINE_KIND_LABELS, STAGE_LABELS, STAGES, TAX_TREATMENT_LABELS, type LineKind } from '../estimate/terms';
import { hasRange, type Sums } from '../estimate/totals';
import type { EstimateForPaper, PracticeForPaper, Preparer } from './inputs';
import type { Paper, PaperFigure, PaperSection } from './paper';
import {
  capacityOf,
  cautionsOf,
  costAgainstWorthInWords,
  costAgainstWorthOf,
  exactMoney,
  nameOfSet,
  OTHER_PROFESSIONS,
  paragraphsOf,
  plainNumber,
  practiceHead,
  worthFigure,
} from './phrases';

/** How many of the least certain labour lines are named. */
const LEAST_CERTAIN = 3;

/**
 * The restoration estimate for a set's owner: the work by stage, what it comes to with tax and deposit, how far it may
 * move, and the cost against what the work adds.
 *
 * Its figures are the estimate's own, to the cent; nothing is summed here but what the estimate has summed.
 *
 * @param options.preparedOn ISO date
 */
export function buildRestorationEstimate(options: {
  readonly estimate: EstimateForPaper;
  readonly practice: PracticeForPaper;
  readonly preparedBy: Preparer;
  readonly preparedOn: string;
}): Paper {
  const { estimate, practice, preparedBy, preparedOn } = options;
  const { set, verdict, totals } = estimate;
  const owner = set.ownerName === null ? '' : `, for ${set.ownerName}`;
  const priced = estimate.lines.length > 0;
  return {
    kind: 'restoration-estimate',
    title: 'Restoration estimate',
    subtitle: `${estimate.title}. ${nameOfSet(set)}, ${set.number}${owner}`,
    practice: practiceHead(practice),
    reference: estimate.number,
    preparedBy: { name: preparedBy.name, capacity: capacityOf(preparedBy, practice) },
    preparedOn,
    standing: 'An estimate for deciding on the work. Not an appraisal report: no appraiser has signed it.',
    figures: [
      totalFigure(estimate),
      depositFigure(estimate),
      worthFigure(set.worths, 'as-found'),
      worthFigure(set.worths, 'as-restored'),
    ],
    yearScale: null,
    costAgainstWorth: priced ? costAgainstWorthOf(verdict, set.worths, totals.currency) : null,
    sections: [
      ...(priced
        ? [
            {
              type: 'cost-against-worth' as const,
              heading: 'Cost against worth',
              paragraphs: costAgainstWorthInWords(verdict, set.worths, totals.currency),
            },
            stageTable(estimate),
            sumsTable(estimate),
            rangeInWords(estimate),
          ]
        : []),
      notKnown(estimate),
      ...notes(estimate.notes),
      cautionsOf(set.hazards),
      limits(),
    ],
    language: 'en',
  };
}

function totalFigure({ lines, totals }: EstimateForPaper): PaperFigure {
  const label = 'Likely cost';
  if (lines.length === 0)
    return { label, amount: 'Not priced yet', weight: 'words', range: null, basis: 'No work has been entered.' };
  const { likely, low, high, currency, hours } = totals;
  return {
    label,
    amount: formatMoney(likely.total, currency),
    weight: 'heavy',
    range: hasRange(totals) ? `${formatMoney(low.total, currency)} to ${formatMoney(high.total, currency)}` : null,
    basis: `Tax included, ${plainNumber(hours.likely)} h of work at likely hours`,
  };
}

function depositFigure({ lines, totals, depositPercent }: EstimateForPaper): PaperFigure {
  const label = 'Deposit';
  const percent = plainNumber(depositPercent);
  if (percent === '0')
    return { label, amount: 'None asked', weight: 'words', range: null, basis: 'The work begins without one.' };
  if (lines.length === 0)
    return { label, amount: 'Not known yet', weight: 'words', range: null, basis: `${percent}% of the likely cost` };
  return {
    label,
    amount: formatMoney(totals.deposit, totals.currency),
    weight: 'heavy',
    range: null,
    basis: `${percent}% of the likely cost`,
  };
}

/** Hours at likely, or the quantity of a part. */
function measureOf(content: Line): string {
  if (content.kind === 'labour') return `${plainNumber(content.hours.likely)} h`;
  return content.kind === 'part' ? plainNumber(content.quantity) : '';
}

function stageTable({ lines, totals }: EstimateForPaper): PaperSection {
  const { currency } = totals;
  const rows = STAGES.flatMap((stage) => {
    const ofStage = lines.filter((line) => line.content.stage === stage);
    const sum = totals.stages.find((entry) => entry.stage === stage);
    if (ofStage.length === 0 || sum === undefined) return [];
    return [
      { style: 'group' as const, cells: [STAGE_LABELS[stage], '', '', formatMoney(sum.subtotal, currency)] },
      ...ofStage.map(({ content, net }) => ({
        style: 'plain' as const,
        cells: [content.description, LINE_KIND_LABELS[content.kind], measureOf(content), formatMoney(net, currency)],
      })),
    ];
  });
  return {
    type: 'table',
    heading: 'The work, stage by stage',
    columns: [
      { label: 'Work', align: 'left' },
      { label: 'Kind', align: 'left' },
      { label: 'Hours or quantity', align: 'right' },
      { label: 'Amount', align: 'right' },
    ],
    rows: [
      ...rows,
      { style: 'total', cells: ['All stages, before tax', '', '', formatMoney(totals.likely.subtotal, currency)] },
    ],
    note: 'Amounts are before tax, at likely hours. A stage’s sum stands beside its name.',
  };
}

function sumsTable(estimate: EstimateForPaper): PaperSection {
  const { lines, totals, taxTreatment, taxNote, depositPercent } = estimate;
  const { currency, likely, low, high } = totals;
  const money = (amount: string) => formatMoney(amount, currency);
  const row = (label: string, pick: (sums: Sums) => string, style: 'plain' | 'total' = 'plain') => ({
    style,
    cells: [label, ...[low, likely, high].map((sums) => money(pick(sums)))],
  });
  const rate = plainNumber(estimate.taxRatePercent);
  const untaxed = taxTreatment === 'none' || rate === '0';
  const taxRows = untaxed
    ? [{ style: 'plain' as const, cells: ['Tax', 'None', 'None', 'None'] }]
    : [row(TAXED[taxTreatment], (sums) => sums.taxable), row(`Tax at ${rate}%`, (sums) => sums.tax)];
  const deposit = plainNumber(depositPercent);
  return {
    type: 'table',
    heading: 'What it comes to',
    columns: [
      { label: '', align: 'left' },
      { label: 'At low hours', align: 'right' },
      { label: 'Likely', align: 'right' },
      { label: 'At high hours', align: 'right' },
    ],
    rows: [
      ...KINDS.filter(({ kind }) => lines.some(({ content }) => content.kind === kind)).map(({ label, pick }) =>
        row(label, pick),
      ),
      row('Before tax', (sums) => sums.subtotal),
      ...taxRows,
      row('Total', (sums) => sums.total, 'total'),
      ...(deposit === '0'
        ? []
        : [{ style: 'plain' as const, cells: [`Deposit, ${deposit}% of likely`, '', money(totals.deposit), ''] }]),
    ],
    note: [`${TAX_TREATMENT_LABELS[taxTreatment]}.`, taxNote].filter((text) => text !== '').join(' '),
  };
}

/** Kinds of work as the sums name them; a kind without lines has no row. */
const KINDS: readonly { readonly kind: LineKind; readonly label: string; readonly pick: (sums: Sums) => string }[] = [
  { kind: 'labour', label: 'Labour', pick: (sums) => sums.labour },
  { kind: 'part', label: 'Parts', pick: (sums) => sums.parts },
  { kind: 'outside', label: 'Outside work', pick: (sums) => sums.outside },
];

/** The row that names what of the subtotal bears tax. */
const TAXED = {
  parts: 'Taxed: parts',
  labour: 'Taxed: labour, outside work',
  both: 'Taxed: all of it',
} as const;

function rangeInWords({ totals }: EstimateForPaper): PaperSection {
  const { currency, hours, likely, low, high } = totals;
  const money = (amount: string) => formatMoney(amount, currency);
  const paragraph = !hasRange(totals)
    ? `The likely cost is ${money(likely.total)}. Its hours are fixed, so it moves only if the work does.`
    : `The likely cost is ${money(likely.total)}, for ${plainNumber(hours.likely)} hours of work. ` +
      `If every job ran to its low hours (${plainNumber(hours.low)}), it would be ${money(low.total)}; ` +
      `if every job ran to its high hours (${plainNumber(hours.high)}), ${money(high.total)}. ` +
      'Parts and outside work stand as quoted in all three.';
  return { type: 'paragraphs', heading: 'How far it may move', paragraphs: [paragraph] };
}

function notKnown({ lines, totals }: EstimateForPaper): PaperSection {
  const spread = ({ netLow, netHigh }: (typeof lines)[number]) => new Dec(netHigh).minus(netLow);
  const widest = lines
    .filter((line) => line.content.kind === 'labour' && spread(line).gt(0))
    .sort((a, b) => spread(b).comparedTo(spread(a)))
    .slice(0, LEAST_CERTAIN)
    .flatMap(({ content, netLow, netHigh }) =>
      content.kind === 'labour'
        ? `${content.description}, ${plainNumber(content.hours.low)} to ${plainNumber(content.hours.high)} h ` +
          `(${exactMoney(netLow, totals.currency)} to ${exactMoney(netHigh, totals.currency)})`
        : [],
    );
  return {
    type: 'paragraphs',
    heading: 'What is not known yet',
    paragraphs: [
      ...(lines.length === 0 ? ['Nothing has been priced yet.'] : []),
      ...(widest.length === 0 ? [] : [`Least certain: ${widest.join('; ')}.`]),
      'Some faults show only once the chassis is open or first powered. They are in these figures only where a line names them.',
      'If more turns up, you will have it in writing with its cost, and it waits for your word.',
    ],
  };
}

function notes(text: string): PaperSection[] {
  const paragraphs = paragraphsOf(text);
  return paragraphs.length === 0 ? [] : [{ type: 'paragraphs', heading: 'Notes and terms', paragraphs }];
}

const limits = (): PaperSection => ({
  type: 'paragraphs',
  heading: 'Limits',
  paragraphs: [
    'This is an estimate, made from what could be seen and measured on its date, at the rates and prices of that date. It is not an invoice.',
    'The worths are those of the people named beside them and serve to decide on the work. This is not an appraisal report: an appraisal carries the signature of an appraiser, who answers for it.',
    OTHER_PROFESSIONS,
  ],
});
