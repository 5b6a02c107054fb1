import type { YearScaleSize } from './drawing';

/** The measures of one size, in px (points on paper). A null measure: the size has no such part. */
export interface Measures {
  readonly left: number;
  readonly right: number;
  readonly height: number;
  /** Top and foot of the curve; the foot is the axis. */
  readonly plotTop: number;
  readonly base: number;
  readonly tickTop: number;
  readonly tickLengths: { readonly year: number; readonly five: number; readonly decade: number };
  readonly numerals: { readonly y: number; readonly size: number } | null;
  readonly multipliers: { readonly y: number; readonly rule: number; readonly size: number } | null;
  readonly gridSize: number | null;
  /** How many years lie between two readings off the curve; 0 for none. */
  readonly readingEvery: number;
  readonly needleTop: number;
  readonly needleFoot: number;
  readonly headRadius: number;
  /** Fixed height of the heads where the size has no curve. */
  readonly headY: number | null;
  readonly tag: { readonly height: number; readonly size: number } | null;
  readonly yearSize: number | null;
  readonly amounts: {
    readonly captionSize: number | null;
    readonly thenSize: number;
    readonly nowSize: number;
    /** From the top of the needle's row to the baselines. */
    readonly captionY: number;
    readonly thenY: number;
    readonly nowY: number;
    /** How much lower the second row lies, and whether the then amount always takes it. */
    readonly rowHeight: number;
    readonly alwaysStacked: boolean;
  } | null;
  readonly between: boolean;
}

const GLASS: Measures = {
  left: 56,
  right: 44,
  height: 448,
  plotTop: 128,
  base: 316,
  tickTop: 321,
  tickLengths: { year: 9, five: 15, decade: 24 },
  numerals: { y: 366, size: 15 },
  multipliers: { y: 392, rule: 375, size: 13 },
  gridSize: 12,
  readingEvery: 20,
  needleTop: 22,
  needleFoot: 408,
  headRadius: 6,
  headY: null,
  tag: { height: 30, size: 15 },
  yearSize: null,
  amounts: {
    captionSize: 14,
    thenSize: 46,
    nowSize: 56,
    captionY: 14,
    thenY: 69,
    nowY: 69,
    rowHeight: 74,
    alwaysStacked: false,
  },
  between: true,
};

const PHONE: Measures = {
  left: 20,
  right: 24,
  height: 420,
  plotTop: 150,
  base: 328,
  tickTop: 333,
  tickLengths: { year: 8, five: 15, decade: 24 },
  numerals: { y: 374, size: 12 },
  multipliers: null,
  gridSize: 12,
  readingEvery: 40,
  needleTop: 20,
  needleFoot: 384,
  headRadius: 6,
  headY: null,
  tag: { height: 28, size: 14 },
  yearSize: null,
  amounts: {
    captionSize: 13,
    thenSize: 32,
    nowSize: 44,
    captionY: 14,
    thenY: 46,
    nowY: 56,
    rowHeight: 66,
    alwaysStacked: true,
  },
  between: false,
};

const STRIP_AMOUNTS = {
  captionSize: null,
  thenSize: 18,
  nowSize: 18,
  captionY: 0,
  thenY: 14,
  nowY: 14,
  rowHeight: 20,
  alwaysStacked: false,
};

const STRIP: Measures = {
  left: 20,
  right: 26,
  height: 128,
  plotTop: 34,
  base: 90,
  tickTop: 93,
  tickLengths: { year: 5, five: 8, decade: 13 },
  numerals: { y: 121, size: 12 },
  multipliers: null,
  gridSize: null,
  readingEvery: 0,
  needleTop: 4,
  needleFoot: 108,
  headRadius: 4.5,
  headY: null,
  tag: null,
  yearSize: 13,
  amounts: STRIP_AMOUNTS,
  between: false,
};

const NARROW_STRIP: Measures = {
  ...STRIP,
  left: 14,
  right: 16,
  height: 122,
  plotTop: 44,
  base: 80,
  tickTop: 83,
  tickLengths: { year: 5, five: 8, decade: 13 },
  numerals: { y: 110, size: 12 },
  needleFoot: 98,
  amounts: { ...STRIP_AMOUNTS, alwaysStacked: true },
};

const ROW: Measures = {
  ...STRIP,
  left: 4,
  right: 4,
  height: 24,
  plotTop: 15,
  base: 15,
  tickTop: 16,
  tickLengths: { year: 0, five: 0, decade: 5 },
  numerals: null,
  needleTop: 3,
  needleFoot: 22,
  headRadius: 3.4,
  headY: 5,
  yearSize: null,
  amounts: null,
};

const PRINT: Measures = {
  ...STRIP,
  left: 14,
  right: 26,
  height: 84,
  plotTop: 24,
  base: 54,
  tickTop: 56,
  tickLengths: { year: 3, five: 5, decade: 9 },
  numerals: { y: 76, size: 8 },
  needleTop: 3,
  needleFoot: 67,
  headRadius: 3,
  yearSize: 8.5,
  amounts: { ...STRIP_AMOUNTS, thenSize: 12, nowSize: 12, thenY: 10, nowY: 10, rowHeight: 14 },
};

const MEASURES: Readonly<Record<YearScaleSize, Measures>> = {
  glass: GLASS,
  phone: PHONE,
  strip: STRIP,
  'strip-narrow': NARROW_STRIP,
  row: ROW,
  print: PRINT,
};

const LOW_GLASS_UNDER = 1100;
const LOW_GLASS_BY = 68;

/** The measures of a size at a width: a glass under 1,100 px is lower by 68. */
export function measuresFor(size: YearScaleSize, width: number): Measures {
  const measures = MEASURES[size];
  if (size !== 'glass' || width >= LOW_GLASS_UNDER || !measures.numerals || !measures.multipliers) return measures;
  return {
    ...measures,
    height: measures.height - LOW_GLASS_BY,
    base: measures.base - LOW_GLASS_BY,
    tickTop: measures.tickTop - LOW_GLASS_BY,
    numerals: { ...measures.numerals, y: measures.numerals.y - LOW_GLASS_BY },
    multipliers: {
      ...measures.multipliers,
      y: measures.multipliers.y - LOW_GLASS_BY,
      rule: measures.multipliers.rule - LOW_GLASS_BY,
    },
    needleFoot: measures.needleFoot - LOW_GLASS_BY,
  };
}

/** Under this many px a year there are no year ticks, and under so many a numeral stands at every twentieth year only. */
export const LEAST_PX_A_YEAR_TICK = 4.6;
export const LEAST_PX_A_YEAR_DECADE_NUMERALS = 7.2;

const NARROW = new Map([
  [' ', 0.19],
  [',', 0.25],
  ['.', 0.25],
]);

/** Width of a text in Lato, good to a few percent: every digit, `$`, `+` and `−` is 0.58 em wide at every weight. */
export function textWidth(text: string, size: number): number {
  let ems = 0;
  for (const character of text) ems += NARROW.get(character) ?? 0.58;
  return ems * size;
}
