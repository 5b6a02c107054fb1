import { formatPeriod, yearOf } from '../calendar/period';
import { numeralsOf, round1, ticksOf, yearAxis, type Stretch, type YearAxis } from './axis';
import { amountScale, curvePaths, gridOf, readingsOf } from './curve';
import type { Label, Needle, NeedleInput, Tag, YearScaleDrawing, YearScaleInput } from './drawing';
import { apart, placeAmounts, tagAt, tagWidth } from './labels';
import { measuresFor, textWidth, type Measures } from './measures';

export type * from './drawing';

/**
 * Draws a year scale: what a price was then, what that is in later money, and the way between.
 *
 * The axis is linear in years from `first` to `last`; amounts are linear from zero. The curve is dotted before the
 * paid period and solid after. Lengths are px (points on paper), rounded to a tenth. Amounts come formatted: nothing
 * is rounded here but places. Never fails; needles outside the axis are drawn outside it.
 */
export function drawYearScale(input: YearScaleInput): YearScaleDrawing {
  const measures = measuresFor(input.size, input.width);
  const axis = yearAxis(input.first, input.last, input.width, measures);
  const hasCurve = measures.plotTop < measures.base;
  const { most, y } = amountScale(input, measures);
  const feet = drawFeet(input, axis, measures);
  const placed = placeAmounts(input, axis, measures, {
    then: `Paid in ${formatPeriod(input.then.period)}`,
    now: `Restated to ${formatPeriod(input.now.period)}`,
  });
  const numerals = numeralsOf(axis, measures, takenBy(input, axis, measures, feet));

  const needle = (who: 'then' | 'now', source: NeedleInput): Needle => {
    const x = axis.xOf(source.period);
    return {
      line: { x1: x, y1: placed?.top[who] ?? measures.needleTop, x2: x, y2: measures.needleFoot },
      head: { x, y: measures.headY ?? y(source.amount), radius: measures.headRadius },
      tag: feet.tags[who],
      year: feet.years[who],
      caption: placed?.caption[who] ?? null,
      amount: placed?.amount[who] ?? null,
    };
  };

  return {
    size: input.size,
    width: input.width,
    height: measures.height,
    base: { x1: measures.left, y1: measures.base, x2: input.width - measures.right, y2: measures.base },
    ticks: ticksOf(axis, measures),
    numerals: numerals.map(({ label }) => label),
    grid: hasCurve ? gridOf(input, measures, most, y) : [],
    ...(hasCurve ? curvePaths(input, axis, y, measures.base) : { curveBefore: '', curveAfter: '', area: '' }),
    readings: hasCurve ? readingsOf(input, axis, measures, y) : [],
    multipliers: drawMultipliers(input, measures, numerals),
    between: placed?.between ?? null,
    then: needle('then', input.then),
    now: needle('now', input.now),
    sentence: yearScaleSentence(input),
  };
}

/** The drawing in words. */
export function yearScaleSentence(input: Pick<YearScaleInput, 'first' | 'last' | 'then' | 'now'>): string {
  const { first, last, then, now } = input;
  return (
    `Year scale from ${yearOf(first)} to ${formatPeriod(last)}. ` +
    `${then.text} paid in ${formatPeriod(then.period)} is restated to ${now.text} in ${formatPeriod(now.period)}.`
  );
}

interface Feet {
  readonly tags: Readonly<Record<'then' | 'now', Tag | null>>;
  readonly years: Readonly<Record<'then' | 'now', Label | null>>;
}

/** What stands at the needles' feet: tags on the glass, the periods alone on strips, nothing in a row. */
function drawFeet(input: YearScaleInput, axis: YearAxis, measures: Measures): Feet {
  const none = { then: null, now: null };
  const thenText = formatPeriod(input.then.period);
  const nowText = formatPeriod(input.now.period);
  const x = { then: axis.xOf(input.then.period), now: axis.xOf(input.now.period) };
  if (measures.tag) {
    const width = { then: tagWidth(thenText, measures.tag.size), now: tagWidth(nowText, measures.tag.size) };
    const edges = { from: 8, to: input.width - 8 };
    const [then, now] = apart({ x: x.then, width: width.then }, { x: x.now, width: width.now }, edges, 6);
    return {
      tags: { then: tagAt(then, width.then, thenText, measures), now: tagAt(now, width.now, nowText, measures) },
      years: none,
    };
  }
  if (measures.yearSize === null || !measures.numerals) return { tags: none, years: none };
  const size = measures.yearSize;
  const { y } = measures.numerals;
  const width = { then: textWidth(thenText, size), now: textWidth(nowText, size) };
  const edges = { from: 2, to: input.width - 2 };
  const [then, now] = apart({ x: x.then, width: width.then }, { x: x.now, width: width.now }, edges, size * 0.6);
  const label = (from: number, wide: number, text: string): Label => ({
    x: round1(from + wide / 2),
    y,
    text,
    anchor: 'middle',
    size,
  });
  return { tags: none, years: { then: label(then, width.then, thenText), now: label(now, width.now, nowText) } };
}

/** Where no numeral may stand. */
function takenBy(input: YearScaleInput, axis: YearAxis, measures: Measures, feet: Feet): Stretch[] {
  const taken: Stretch[] = [];
  const clearance = measures.multipliers ? 8 : 4; // a multiplier is wider than its numeral
  for (const who of ['then', 'now'] as const) {
    const x = axis.xOf(input[who].period);
    taken.push({ from: x - clearance, to: x + clearance });
    const year = feet.years[who];
    if (!year) continue;
    const half = textWidth(year.text, year.size) / 2 + 8;
    taken.push({ from: year.x - half, to: year.x + half });
  }
  return taken;
}

/** The glass's second band: I(now) ÷ I(decade) under each lettered decade. */
function drawMultipliers(
  input: YearScaleInput,
  measures: Measures,
  numerals: readonly { readonly year: number; readonly label: Label }[],
): YearScaleDrawing['multipliers'] {
  if (!measures.multipliers || !measures.numerals || !input.multipliers) return null;
  const { y, rule, size } = measures.multipliers;
  const title = (at: number, text: string): Label => ({ x: 20, y: at, text, anchor: 'start', size });
  const titles = [title(measures.numerals.y, 'Year'), title(y, `To ${formatPeriod(input.now.period)}`)];
  const clearOf = Math.max(...titles.map((label) => label.x + textWidth(label.text, size))) + 6;
  const multipliers = new Map(input.multipliers.map((entry) => [entry.year, entry.multiplier]));
  const factors = numerals.flatMap(({ year, label }): Label[] => {
    const multiplier = multipliers.get(year);
    const text = `× ${multiplier}`;
    if (multiplier === undefined || label.x - textWidth(text, size) / 2 < clearOf) return [];
    return [{ x: label.x, y, text, anchor: 'middle', size }];
  });
  return {
    rule: { x1: 20, y1: rule, x2: input.width - measures.right, y2: rule },
    titles,
    factors,
  };
}
