/**
 * A document as content, without a layout: the printed page and the PDF both render this, so their figures agree
 * to the cent. Amounts arrive formatted; nothing is computed when rendering.
 */
export interface Paper {
  readonly kind: 'appraisal-sheet' | 'restoration-estimate';
  readonly title: string;
  readonly subtitle: string;
  /** The practice's name and address lines, for the head of the page. */
  readonly practice: { readonly name: string; readonly lines: readonly string[] };
  /** The practice's number of the set or estimate. */
  readonly reference: string;
  readonly preparedBy: { readonly name: string; readonly capacity: string };
  /** ISO date. */
  readonly preparedOn: string;
  /** What this paper is and is not: a working sheet unless an appraiser signs. */
  readonly standing: string;
  readonly figures: readonly PaperFigure[];
  readonly yearScale: PaperYearScale | null;
  readonly costAgainstWorth: PaperCostAgainstWorth | null;
  readonly sections: readonly PaperSection[];
  readonly language: 'en';
}

export interface PaperFigure {
  readonly label: string;
  readonly amount: string;
  /** Then is light, now is heavy. */
  readonly weight: 'light' | 'heavy' | 'words';
  readonly range: string | null;
  readonly basis: string;
}

/** Input of the year scale's geometry (`drawYearScale` with size `print`). */
export interface PaperYearScale {
  /** Formatted. */
  readonly price: string;
  readonly restated: string;
  /** The same two amounts as numbers, for the height of the needles' heads alone. */
  readonly priceAmount: number;
  readonly restatedAmount: number;
  readonly from: string;
  readonly to: string;
  /** The ends of the series: its first and newest published period. */
  readonly first: string;
  readonly last: string;
  /** Price restated to each published year, oldest first. */
  readonly curve: readonly { readonly year: number; readonly amount: number }[];
  readonly sentence: string;
}

/** Input of the cost-against-worth chart's geometry, in whole currency units or cents as decimal numbers. */
export interface PaperCostAgainstWorth {
  readonly currency: string;
  readonly asFound: number;
  readonly asRestored: number;
  readonly restoredLow: number | null;
  readonly restoredHigh: number | null;
  readonly cost: { readonly low: number; readonly likely: number; readonly high: number };
  readonly sentence: string;
}

export type PaperSection =
  | {
      readonly type: 'facts';
      readonly heading: string;
      readonly rows: readonly { readonly label: string; readonly value: string }[];
    }
  | { readonly type: 'paragraphs'; readonly heading: string; readonly paragraphs: readonly string[] }
  /** The document's `costAgainstWorth` chart, where it has one, above its words. */
  | { readonly type: 'cost-against-worth'; readonly heading: string; readonly paragraphs: readonly string[] }
  | {
      readonly type: 'table';
      readonly heading: string;
      readonly columns: readonly { readonly label: string; readonly align: 'left' | 'right' }[];
      readonly rows: readonly { readonly style: 'plain' | 'group' | 'total'; readonly cells: readonly string[] }[];
      readonly note: string | null;
    }
  | {
      readonly type: 'cautions';
      readonly heading: string;
      readonly items: readonly { readonly title: string; readonly whatToDo: string }[];
      readonly note: string;
    };
