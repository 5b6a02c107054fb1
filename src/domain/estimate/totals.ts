import { Dec } from '../money/decimal';
import { centsToDecimal, sumCents, toCents, type Cents } from '../money/money';
import { lineNet, POINTS, type Line, type Point, type ThreePoints } from './line';
import { STAGES, type LineKind, type Stage, type TaxTreatment } from './terms';

export interface Terms {
  readonly currency: string;
  readonly taxTreatment: TaxTreatment;
  readonly taxRatePercent: string;
  readonly depositPercent: string;
}

/** Sums at one point, decimal texts with two decimals. */
export interface Sums {
  readonly labour: string;
  readonly parts: string;
  readonly outside: string;
  readonly subtotal: string;
  /** What of the subtotal bears tax. */
  readonly taxable: string;
  readonly tax: string;
  readonly total: string;
}

export interface Totals extends Readonly<Record<Point, Sums>> {
  readonly currency: string;
  readonly hours: ThreePoints;
  /** Of the likely total. */
  readonly deposit: string;
  /** In the order of the job, stages with lines only; hours and subtotal at likely. */
  readonly stages: readonly { readonly stage: Stage; readonly hours: string; readonly subtotal: string }[];
}

/**
 * Adds an estimate up at low, likely and high hours.
 *
 * Each line is rounded once (`lineNet`); sums of rounded lines are not rounded again. Tax is on the summed taxable
 * lines at one rate, rounded once, half away from zero (EN 16931, BR-CO-17): lines are not taxed one by one.
 * Low and high are the sums of all lines' lows and highs: bounds, not a forecast.
 */
export function estimateTotals(lines: readonly Line[], terms: Terms): Totals {
  const at = (point: Point) => sums(lines, terms, point);
  const likely = at('likely');
  return {
    currency: terms.currency,
    hours: { low: hoursOf(lines, 'low'), likely: hoursOf(lines, 'likely'), high: hoursOf(lines, 'high') },
    low: at('low'),
    likely,
    high: at('high'),
    deposit: centsToDecimal(percentOf(likely.total, terms.depositPercent)),
    stages: STAGES.flatMap((stage) => {
      const own = lines.filter((line) => line.stage === stage);
      if (own.length === 0) return [];
      const subtotal = sumCents(own.map((line) => lineNet(line, 'likely')));
      return [{ stage, hours: hoursOf(own, 'likely'), subtotal: centsToDecimal(subtotal) }];
    }),
  };
}

function sums(lines: readonly Line[], { taxTreatment, taxRatePercent }: Terms, point: Point): Sums {
  const net = (...kinds: readonly LineKind[]) =>
    sumCents(lines.filter(({ kind }) => kinds.includes(kind)).map((line) => lineNet(line, point)));
  const [labour, parts, outside] = [net('labour'), net('part'), net('outside')];
  const subtotal = sumCents([labour, parts, outside]);
  const taxable = net(...TAXED_KINDS[taxTreatment]);
  const tax = percentOf(centsToDecimal(taxable), taxRatePercent);
  return {
    labour: centsToDecimal(labour),
    parts: centsToDecimal(parts),
    outside: centsToDecimal(outside),
    subtotal: centsToDecimal(subtotal),
    taxable: centsToDecimal(taxable),
    tax: centsToDecimal(tax),
    total: centsToDecimal(sumCents([subtotal, tax])),
  };
}

/** Outside work is taxed as labour is: what is bought in is a service. */
const TAXED_KINDS: Readonly<Record<TaxTreatment, readonly LineKind[]>> = {
  none: [],
  parts: ['part'],
  labour: ['labour', 'outside'],
  both: ['labour', 'part', 'outside'],
};

/** `percent` of an amount, rounded once to two decimals, half away from zero. */
export const percentOf = (amount: string, percent: string): Cents => toCents(new Dec(amount).times(percent).div(100));

/**
 * The tax on single amounts, each rounded by itself, then added: the item basis that some states let a seller choose.
 * It can differ by cents from the tax on their sum, which this product uses; kept to show the difference.
 */
export const taxPerItem = (amounts: readonly string[], ratePercent: string): Cents =>
  sumCents(amounts.map((amount) => percentOf(amount, ratePercent)));

function hoursOf(lines: readonly Line[], point: Point): string {
  let hours = new Dec(0);
  for (const line of lines) if (line.kind === 'labour') hours = hours.plus(line.hours[point]);
  return hours.toFixed(2);
}

/** Whether the three totals differ at all. */
export const hasRange = (totals: Totals): boolean => new Set(POINTS.map((point) => totals[point].total)).size > 1;
