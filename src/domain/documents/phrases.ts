import { ROLE_LABELS } from '../access/policy';
import { formatDate } from '../calendar/period';
import type { Verdict } from '../estimate/verdict';
import { worthInForce } from '../market/worth';
import { Dec } from '../money/decimal';
import { formatMoney } from '../money/money';
import { CAUTION_LIMITS, CAUTIONS } from '../sets/hazards';
import { SET_KIND_LABELS, VALUE_TYPE_LABELS, WORTH_KIND_LABELS, type WorthKind } from '../sets/terms';
import type { HazardForPaper, PracticeForPaper, Preparer, SetForPaper, WorthForPaper } from './inputs';
import type { Paper, PaperCostAgainstWorth, PaperFigure, PaperSection } from './paper';

/** Wording and small parts that every document shares. */

/** Whole units where the amount has no cents, cents where it has: nothing is rounded away on paper. */
export function exactMoney(amount: string, currency: string, options: { readonly signed?: boolean } = {}): string {
  return formatMoney(amount, currency, { ...options, whole: new Dec(amount).isInteger() });
}

/** A decimal without trailing zeros: `4.50` → `4.5`. */
export const plainNumber = (decimal: string): string => new Dec(decimal).toString();

/** `Halloway 712, radio, 1938`. */
export function nameOfSet(set: Pick<SetForPaper, 'maker' | 'model' | 'kind' | 'year'>): string {
  const kind = SET_KIND_LABELS[set.kind].toLowerCase();
  return [`${set.maker} ${set.model}`, kind, ...(set.year === null ? [] : [String(set.year)])].join(', ');
}

/** The lines under the practice's name. */
export function practiceHead(practice: PracticeForPaper): Paper['practice'] {
  const contact = [practice.phone, practice.email].filter((text) => text !== '').join(', ');
  const address = practice.address.split('\n').map((line) => line.trim());
  return { name: practice.name, lines: [...address, contact].filter((line) => line !== '') };
}

/** In which capacity somebody prepared a document. */
export function capacityOf(preparer: Preparer, practice: PracticeForPaper): string {
  if (preparer.role === null) return 'from the practice’s records';
  return `${ROLE_LABELS[preparer.role].toLowerCase()}, ${practice.name}`;
}

/** `$380 to $520`, or null where no range is on record. */
export function worthRange(worth: WorthForPaper): string | null {
  const { low, high } = worth;
  if (low === null || high === null) return null;
  return `${exactMoney(low.amount, low.currency)} to ${exactMoney(high.amount, high.currency)}`;
}

const NO_WORTH: Readonly<Record<WorthKind, string>> = {
  'as-found': 'No one has put a figure on the set as it stands.',
  'as-restored': 'No one has put a figure on the set as it would be after the work.',
};

export function worthFigure(worths: readonly WorthForPaper[], kind: WorthKind): PaperFigure {
  const worth = worthInForce(worths, kind);
  const label = WORTH_KIND_LABELS[kind];
  if (worth === undefined)
    return { label, amount: 'Not on record', weight: 'words', range: null, basis: NO_WORTH[kind] };
  return {
    label,
    amount: exactMoney(worth.amount.amount, worth.amount.currency),
    weight: 'heavy',
    range: worthRange(worth),
    basis: `${VALUE_TYPE_LABELS[worth.valueType]}, effective ${formatDate(worth.effectiveOn)}, says ${worth.saidBy}`,
  };
}

/** The chart's input, where there is a verdict. Numbers serve the drawing alone. */
export function costAgainstWorthOf(
  verdict: Verdict | null,
  worths: readonly WorthForPaper[],
  currency: string,
): PaperCostAgainstWorth | null {
  if (verdict === null) return null;
  const restored = worthInForce(worths, 'as-restored');
  const low = restored?.low ?? null;
  const high = restored?.high ?? null;
  return {
    currency,
    asFound: Number(verdict.asFound),
    asRestored: Number(verdict.asRestored),
    restoredLow: low === null ? null : Number(low.amount),
    restoredHigh: high === null ? null : Number(high.amount),
    cost: {
      low: Number(verdict.cost.low),
      likely: Number(verdict.cost.likely),
      high: Number(verdict.cost.high),
    },
    sentence: verdict.words,
  };
}

/** Cost against worth in words: the sum, its basis, and what to keep in mind; or what is missing for it. */
export function costAgainstWorthInWords(
  verdict: Verdict | null,
  worths: readonly WorthForPaper[],
  currency: string,
): string[] {
  if (verdict === null) {
    const missing = (['as-found', 'as-restored'] as const)
      .filter((kind) => worthInForce(worths, kind) === undefined)
      .map((kind) => WORTH_KIND_LABELS[kind].toLowerCase());
    const what = missing.length === 0 ? 'A figure' : `The ${missing.join(' and the ')}`;
    return [`${what} is not on record, so the cost of the work cannot be set against what it adds.`];
  }
  const money = (amount: string, signed = false) => exactMoney(amount, currency, { signed });
  const { asFound, asRestored, uplift, cost, gap } = verdict;
  return [
    verdict.words,
    `Worth restored ${money(asRestored)} less worth as found ${money(asFound)} is ${money(uplift, true)}; ` +
      `less the likely cost of ${money(cost.likely)} leaves ${money(gap.atLikely, true)}. ` +
      `At low hours (${money(cost.low)}) it leaves ${money(gap.atLow, true)}, ` +
      `at high hours (${money(cost.high)}) ${money(gap.atHigh, true)}.`,
    `Basis: ${verdict.basis}`,
    ...mixedValueTypes(worths),
  ];
}

function mixedValueTypes(worths: readonly WorthForPaper[]): string[] {
  const found = worthInForce(worths, 'as-found');
  const restored = worthInForce(worths, 'as-restored');
  if (found === undefined || restored === undefined || found.valueType === restored.valueType) return [];
  return [
    `The two worths are of different types: ${VALUE_TYPE_LABELS[found.valueType].toLowerCase()} as found, ` +
      `${VALUE_TYPE_LABELS[restored.valueType].toLowerCase()} restored. Their difference mixes the two.`,
  ];
}

/** The cautions recorded for a set; where none is, that nothing recorded does not mean safe. */
export function cautionsOf(hazards: readonly HazardForPaper[]): PaperSection {
  const recorded = hazards.map(({ hazard, volts, note }) => {
    const { title, whatToDo } = CAUTIONS[hazard];
    return {
      title: volts === null ? title : `${title}: ${volts.toLocaleString('en-US')} V`,
      whatToDo: note === '' ? whatToDo : `${whatToDo} ${note}`,
    };
  });
  const none = {
    title: 'No hazard is recorded, which does not make the set safe',
    whatToDo: 'Old sets can carry lethal voltages and hold charge after switch-off. Do not plug in an untested set.',
  };
  return {
    type: 'cautions',
    heading: 'Cautions',
    items: recorded.length === 0 ? [none] : recorded,
    note: CAUTION_LIMITS,
  };
}

/** Questions that other professionals answer. */
export const OTHER_PROFESSIONS =
  'Questions of tax, insurance and law go to the professionals who answer for them. ' +
  'A value for their use needs a signed appraisal made for that use.';

/** What a typed text says, paragraph by paragraph. */
export const paragraphsOf = (text: string): string[] =>
  text
    .split(/\n+/)
    .map((paragraph) => paragraph.trim())
    .filter((paragraph) => paragraph !== '');

/** The name of a document's file: `S-0318 appraisal sheet.pdf`. */
export const fileNameOf = (paper: Pick<Paper, 'reference' | 'title'>): string =>
  `${paper.reference} ${paper.title.toLowerCase()}.pdf`;
