import { midYear, type Period } from '../calendar/period';
import type { Label, Tick, YearScaleSize } from './drawing';
import {
  LEAST_PX_A_YEAR_DECADE_NUMERALS,
  LEAST_PX_A_YEAR_TICK,
  measuresFor,
  textWidth,
  type Measures,
} from './measures';

/** One decimal is finer than any screen or printer shows. */
export const round1 = (value: number) => Math.round(value * 10) / 10;

/** The linear axis of years. A year stands at its middle, where its average belongs; so does a month. */
export interface YearAxis {
  readonly pxAYear: number;
  readonly firstYear: number;
  readonly lastYear: number;
  xOfYear(year: number): number;
  xOf(period: Period): number;
}

export function yearAxis(first: Period, last: Period, width: number, measures: Measures): YearAxis {
  const begin = midYear(first);
  const span = Math.max(midYear(last) - begin, 1 / 12);
  const pxAYear = (width - measures.left - measures.right) / span;
  const at = (time: number) => round1(measures.left + (time - begin) * pxAYear);
  return {
    pxAYear,
    firstYear: Math.ceil(begin - 0.5),
    lastYear: Math.floor(begin + span - 0.5),
    xOfYear: (year) => at(year + 0.5),
    xOf: (period) => at(midYear(period)),
  };
}

/** The time, in years, at a place on the axis of a size, for a pointer; may lie outside the axis. */
export function timeOnScale(x: number, first: Period, last: Period, width: number, size: YearScaleSize): number {
  const measures = measuresFor(size, width);
  const begin = midYear(first);
  return begin + ((x - measures.left) / (width - measures.left - measures.right)) * (midYear(last) - begin);
}

/** Ticks for years, taller for fives, tallest for decades; no year ticks under 4.6 px a year. */
export function ticksOf(axis: YearAxis, measures: Measures): Tick[] {
  const ticks: Tick[] = [];
  for (let year = axis.firstYear; year <= axis.lastYear; year++) {
    const kind = year % 10 === 0 ? 'decade' : year % 5 === 0 ? 'five' : 'year';
    const length = measures.tickLengths[kind];
    if (length === 0 || (kind === 'year' && axis.pxAYear < LEAST_PX_A_YEAR_TICK)) continue;
    const x = axis.xOfYear(year);
    ticks.push({ kind, x1: x, y1: measures.tickTop, x2: x, y2: measures.tickTop + length });
  }
  return ticks;
}

/** A stretch of the axis that numerals keep clear of: a needle, or the period written under it. */
export interface Stretch {
  readonly from: number;
  readonly to: number;
}

/** A numeral for each decade, or each second one when tight; one that a needle would cross is dropped. */
export function numeralsOf(
  axis: YearAxis,
  measures: Measures,
  taken: readonly Stretch[],
): { year: number; label: Label }[] {
  if (!measures.numerals) return [];
  const { y, size } = measures.numerals;
  const every = axis.pxAYear * (15 / size) < LEAST_PX_A_YEAR_DECADE_NUMERALS ? 20 : 10;
  const half = textWidth('0000', size) / 2;
  const numerals: { year: number; label: Label }[] = [];
  for (let year = Math.ceil(axis.firstYear / every) * every; year <= axis.lastYear; year += every) {
    const x = axis.xOfYear(year);
    if (taken.some((stretch) => x + half > stretch.from && x - half < stretch.to)) continue;
    numerals.push({ year, label: { x, y, text: String(year), anchor: 'middle', size } });
  }
  return numerals;
}

/** How long lies between two periods: `85 years`, `5 months`. Whole years, half up. */
export function spanText(from: Period, to: Period): string {
  const years = Math.abs(midYear(to) - midYear(from));
  const whole = Math.round(years);
  if (years >= 1) return whole === 1 ? '1 year' : `${whole} years`;
  const months = Math.round(years * 12);
  return months === 1 ? '1 month' : `${months} months`;
}
