import { midYear } from '../calendar/period';
import type { Label, Point, Segment, YearScaleInput } from './drawing';
import { round1, type YearAxis } from './axis';
import { textWidth, type Measures } from './measures';

const MOST_GRID_LINES = 5;

/** Amounts for lines of equal amount: at most five, above zero, in steps of 1, 2 or 5 times a power of ten. */
export function gridAmounts(most: number): number[] {
  if (!(most > 0) || !Number.isFinite(most)) return [];
  const power = Math.floor(Math.log10(most));
  for (const [digit, exponent] of [
    [1, power - 1],
    [2, power - 1],
    [5, power - 1],
    [1, power],
    [2, power],
  ] as const) {
    const step = exponent < 0 ? digit / 10 ** -exponent : digit * 10 ** exponent;
    const count = Math.floor(most / step);
    if (count <= MOST_GRID_LINES) return Array.from({ length: count }, (_, i) => round(step * (i + 1), -exponent));
  }
  return [];
}

const round = (value: number, decimals: number) => Number(value.toFixed(Math.min(Math.max(decimals, 0), 20)));

/** Heights of amounts: linear from zero at the axis to the largest amount at the plot's top. */
export function amountScale(input: YearScaleInput, measures: Measures) {
  const most = Math.max(input.then.amount, input.now.amount, ...input.curve.map((point) => point.amount));
  const y = (amount: number) =>
    round1(most > 0 ? measures.base - (amount / most) * (measures.base - measures.plotTop) : measures.base);
  return { most, y };
}

interface Timed extends Point {
  readonly time: number;
}

/** Path of a line; it begins anew where a year is missing, for nothing is interpolated. */
function linePath(points: readonly Timed[]): string {
  let path = '';
  points.forEach((point, i) => {
    const previous = points[i - 1];
    path += `${previous && point.time - previous.time < 1.75 ? 'L' : 'M'}${point.x} ${point.y}`;
  });
  return points.length > 1 ? path : '';
}

/** The curve before and after the paid period, and the area under it between the needles. */
export function curvePaths(input: YearScaleInput, axis: YearAxis, y: (amount: number) => number, base: number) {
  const then = { time: midYear(input.then.period), x: axis.xOf(input.then.period), y: y(input.then.amount) };
  const now = { time: midYear(input.now.period), x: axis.xOf(input.now.period), y: y(input.now.amount) };
  const points: Timed[] = input.curve
    .map(({ year, amount }) => ({ time: year + 0.5, x: axis.xOfYear(year), y: y(amount) }))
    .filter((point) => point.time !== then.time && point.time !== now.time)
    .concat(then.time === now.time ? [then] : [then, now])
    .sort((a, b) => a.time - b.time);
  const [low, high] = then.time <= now.time ? [then, now] : [now, then];
  const between = points.filter((point) => point.time >= low.time && point.time <= high.time);
  const line = linePath(between);
  return {
    curveBefore: linePath(points.filter((point) => point.time <= then.time)),
    curveAfter: linePath(points.filter((point) => point.time >= then.time)),
    area: line && !line.slice(1).includes('M') ? `${line}L${high.x} ${base}L${low.x} ${base}Z` : '',
  };
}

export function gridOf(input: YearScaleInput, measures: Measures, most: number, y: (amount: number) => number) {
  const size = measures.gridSize;
  if (size === null) return [];
  return gridAmounts(most).map((amount) => {
    const line: Segment = { x1: measures.left, y1: y(amount), x2: input.width - measures.right, y2: y(amount) };
    const label: Label = {
      x: measures.left,
      y: round1(line.y1 - 6),
      text: input.formatAmount(amount),
      anchor: 'start',
      size,
    };
    return { line, label };
  });
}

const READING_SIZE = 14;

/** Amounts read off the curve at round years after the price was paid, clear of needles, grid labels and each other. */
export function readingsOf(input: YearScaleInput, axis: YearAxis, measures: Measures, y: (amount: number) => number) {
  const { readingEvery } = measures;
  if (readingEvery === 0) return [];
  const needles = [axis.xOf(input.then.period), axis.xOf(input.now.period)];
  const from = axis.xOf(input.then.period);
  return input.curve
    .filter(({ year }) => (year + (readingEvery === 40 ? 20 : 0)) % readingEvery === 0 && axis.xOfYear(year) > from)
    .map(({ year, amount }) => {
      const at: Point = { x: axis.xOfYear(year), y: y(amount) };
      const text = input.formatAmount(amount);
      const label: Label = { x: at.x - 8, y: round1(at.y - 10), text, anchor: 'end', size: READING_SIZE };
      return { at, label, from: label.x - textWidth(text, READING_SIZE) };
    })
    .filter(
      ({ at, label, from: start }) =>
        start > measures.left && needles.every((x) => x < start - 6 || x > at.x + 8) && label.y > measures.plotTop - 30,
    )
    .map(({ at, label }) => ({ at, label }));
}
