import { Dec } from '../money/decimal';
import { toCents, type Cents } from '../money/money';
import type { Stage } from './terms';

/** Low, likely and high of one quantity, as decimal texts, in that order of size. */
export interface ThreePoints {
  readonly low: string;
  readonly likely: string;
  readonly high: string;
}
export type Point = keyof ThreePoints;
export const POINTS = ['low', 'likely', 'high'] as const satisfies readonly Point[];

interface Placed {
  readonly stage: Stage;
  readonly description: string;
}

/** Hours × rate per hour. */
export interface LabourLine extends Placed {
  readonly kind: 'labour';
  readonly hours: ThreePoints;
  readonly rate: string;
}
/** Quantity × unit cost × (1 + markup). */
export interface PartLine extends Placed {
  readonly kind: 'part';
  readonly quantity: string;
  readonly unitCost: string;
  readonly markupPercent: string;
}
/** The other shop's quote × (1 + markup). */
export interface OutsideLine extends Placed {
  readonly kind: 'outside';
  readonly quote: string;
  readonly markupPercent: string;
}
export type Line = LabourLine | PartLine | OutsideLine;

/**
 * What a line comes to, before tax, at low, likely or high hours (a part or outside work is the same at each).
 * Exact until the end, then rounded once to two decimals, half away from zero: the line's net amount of EN 16931,
 * which later sums take as it stands.
 */
export const lineNet = (line: Line, point: Point): Cents => toCents(exactNet(line, point));

/** The most a line may come to: nine digits before the point, like every amount typed. */
export const LARGEST_NET = '999999999.99';
/** The most lines an estimate may have. With `LARGEST_NET` and any tax below 1,000 %, its total stays exact in cents. */
export const MOST_LINES = 1000;

/** Whether a line comes to more than `LARGEST_NET` at its high hours. */
export const isTooLarge = (line: Line): boolean => exactNet(line, 'high').gt(LARGEST_NET);

function exactNet(line: Line, point: Point): Dec {
  switch (line.kind) {
    case 'labour':
      return new Dec(line.hours[point]).times(line.rate);
    case 'part':
      return withMarkup(new Dec(line.quantity).times(line.unitCost), line.markupPercent);
    case 'outside':
      return withMarkup(new Dec(line.quote), line.markupPercent);
  }
}

/** Cost × (1 + markup ÷ 100). Markup is on the cost; a margin would be on the price. */
export const withMarkup = (cost: Dec, markupPercent: string): Dec =>
  cost.times(new Dec(markupPercent).div(100).plus(1));

/**
 * The margin that a markup amounts to: markup ÷ (1 + markup), in percent with at most two decimals.
 * `50` → `33.33`, `100` → `50`.
 */
export const marginOfMarkup = (markupPercent: string): string =>
  new Dec(markupPercent).div(new Dec(markupPercent).plus(100)).times(100).toDecimalPlaces(2).toFixed();

/** The mean of a beta-PERT with λ = 4: (low + 4 × likely + high) ÷ 6, hours with two decimals. */
export const expectedHours = ({ low, likely, high }: ThreePoints): string =>
  new Dec(low).plus(new Dec(likely).times(4)).plus(high).div(6).toFixed(2);
