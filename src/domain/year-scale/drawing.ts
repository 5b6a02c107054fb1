import type { Period } from '../calendar/period';

/** The sizes of the year scale: glass (large), its drawing for phones, strip (wide and narrow), row, print. */
export type YearScaleSize = 'glass' | 'phone' | 'strip' | 'strip-narrow' | 'row' | 'print';

/** A needle: where it stands, what it says, and the amount as a number for the height of its head alone. */
export interface NeedleInput {
  readonly period: Period;
  readonly amount: number;
  readonly text: string;
}

export interface YearScaleInput {
  readonly size: YearScaleSize;
  /** In px on screen, in points on paper. */
  readonly width: number;
  /** The ends of the axis: the series' first and newest published period. */
  readonly first: Period;
  readonly last: Period;
  readonly then: NeedleInput;
  readonly now: NeedleInput;
  /** The price restated to each published year, oldest first; a year left out is left open. */
  readonly curve: readonly { readonly year: number; readonly amount: number }[];
  /** By how much prices rose from then to now, such as `22.4`; shown between the amounts where there is room. */
  readonly factor?: string;
  /** By how much prices rose from a decade's year to now, such as `16.4`; the glass's second band. */
  readonly multipliers?: readonly { readonly year: number; readonly multiplier: string }[];
  /** Says an amount of the axis and of a reading, such as `$1,000`. */
  readonly formatAmount: (amount: number) => string;
}

export interface Point {
  readonly x: number;
  readonly y: number;
}

export interface Segment {
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
}

export type Anchor = 'start' | 'middle' | 'end';

/** A line of text; `y` is its baseline, `size` the font size in the unit of the width. */
export interface Label extends Point {
  readonly text: string;
  readonly anchor: Anchor;
  readonly size: number;
}

export interface Tick extends Segment {
  readonly kind: 'year' | 'five' | 'decade';
}

export interface Tag {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  readonly label: Label;
}

export interface Needle {
  readonly line: Segment;
  /** Ring (then) or disc (now). */
  readonly head: Point & { readonly radius: number };
  /** Outlined (then) or filled (now); null where the size has none. */
  readonly tag: Tag | null;
  /** The period in needle colour under the axis, where the size has no tag. */
  readonly year: Label | null;
  /** Such as `Paid in 1941`. */
  readonly caption: Label | null;
  readonly amount: Label | null;
}

/** What a year scale looks like: plain numbers and strings, for SVG and PDF alike. */
export interface YearScaleDrawing {
  readonly size: YearScaleSize;
  readonly width: number;
  readonly height: number;
  readonly base: Segment;
  readonly ticks: readonly Tick[];
  readonly numerals: readonly Label[];
  /** Lines of equal amount with their labels, at most five. */
  readonly grid: readonly { readonly line: Segment; readonly label: Label }[];
  /** SVG path data (also what pdfkit's `path` takes); empty where there is nothing to draw. */
  readonly curveBefore: string;
  readonly curveAfter: string;
  readonly area: string;
  /** Amounts read off the curve. */
  readonly readings: readonly { readonly at: Point; readonly label: Label }[];
  /** The second band: by how much prices rose from each decade to the now needle's period. */
  readonly multipliers: {
    readonly rule: Segment;
    readonly titles: readonly Label[];
    readonly factors: readonly Label[];
  } | null;
  /** How far apart the two amounts are: `× 22.4`, `over 85 years`. */
  readonly between: { readonly lines: readonly Segment[]; readonly labels: readonly Label[] } | null;
  readonly then: Needle;
  readonly now: Needle;
  /** The whole drawing in a sentence, for those who do not see it. */
  readonly sentence: string;
}
