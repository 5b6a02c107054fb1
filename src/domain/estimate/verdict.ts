import { formatDate } from '../calendar/period';
import { Dec } from '../money/decimal';
import { formatMoney } from '../money/money';
import { VALUE_TYPE_LABELS, type ValueType } from '../sets/terms';
import type { ThreePoints } from './line';
import type { Totals } from './totals';

/** A recorded worth as the verdict needs it. */
export interface StatedWorth {
  /** Decimal text. */
  readonly amount: string;
  readonly valueType: ValueType;
  readonly effectiveOn: string;
  readonly saidBy: string;
}

/** Cost against worth; amounts are decimal texts with two decimals, gaps may be negative. */
export interface Verdict {
  readonly asFound: string;
  readonly asRestored: string;
  /** As restored − as found. */
  readonly uplift: string;
  /** With tax: what the owner pays. */
  readonly cost: ThreePoints;
  /** Uplift − cost, at low, likely and high hours. */
  readonly gap: { readonly atLow: string; readonly atLikely: string; readonly atHigh: string };
  readonly words: string;
  readonly basis: string;
}

/**
 * Whether the work adds more than it costs: as restored − as found − cost with tax, at low, likely and high hours.
 * The sum is stated and the choice left: an owner may have other reasons than money.
 */
export function costAgainstWorth(found: StatedWorth, restored: StatedWorth, totals: Totals): Verdict {
  const uplift = new Dec(restored.amount).minus(found.amount);
  const gap = (cost: string) => uplift.minus(cost).toFixed(2);
  const cost = { low: totals.low.total, likely: totals.likely.total, high: totals.high.total };
  const gaps = { atLow: gap(cost.low), atLikely: gap(cost.likely), atHigh: gap(cost.high) };
  return {
    asFound: new Dec(found.amount).toFixed(2),
    asRestored: new Dec(restored.amount).toFixed(2),
    uplift: uplift.toFixed(2),
    cost,
    gap: gaps,
    words: verdictWords(gaps, totals.currency),
    basis: verdictBasis(found, restored),
  };
}

function verdictWords({ atLow, atLikely, atHigh }: Verdict['gap'], currency: string): string {
  const amount = (gap: string) => formatMoney(new Dec(gap).abs(), currency, { whole: new Dec(gap).abs().gte(1) });
  const likely = new Dec(atLikely);
  const sentence = likely.isZero()
    ? 'At likely hours the work costs just what it adds.'
    : likely.isPositive()
      ? `At likely hours the work adds ${amount(atLikely)} more than it costs.`
      : `At likely hours the work costs ${amount(atLikely)} more than it adds.`;
  return [
    sentence,
    turning({ atLow, atLikely, atHigh }, amount),
    'Money is one reason among others: the choice is yours.',
  ]
    .filter((part) => part !== '')
    .join(' ');
}

/** What changes at the ends of the range, where the sign does. */
function turning({ atLow, atLikely, atHigh }: Verdict['gap'], amount: (gap: string) => string): string {
  const [low, likely, high] = [new Dec(atLow), new Dec(atLikely), new Dec(atHigh)];
  if (!likely.isNegative() && high.isNegative())
    return `If every line runs to its high hours, it costs ${amount(atHigh)} more than it adds.`;
  if (!likely.isPositive() && low.gt(0))
    return `Only if every line keeps to its low hours does it add ${amount(atLow)} more than it costs.`;
  return '';
}

function verdictBasis(found: StatedWorth, restored: StatedWorth): string {
  const said = ({ valueType, saidBy, effectiveOn }: StatedWorth) =>
    `${VALUE_TYPE_LABELS[valueType].toLowerCase()}, ${saidBy}, ${formatDate(effectiveOn)}`;
  return `As restored (${said(restored)}) − as found (${said(found)}) − cost with tax at low, likely and high hours. The ends are sums of all lines’ ends: bounds, not a forecast.`;
}
