import { midYear, yearOf, type Period } from '../calendar/period';

/**
 * Where a needle can come to rest: the years with a published annual average and, where its year has none, the newest
 * published period. Oldest first.
 */
export function needleStops(years: readonly Period[], newest: Period): Period[] {
  const stops = [...years].sort((a, b) => midYear(a) - midYear(b));
  const last = stops.at(-1);
  return last === undefined || yearOf(newest) > yearOf(last) ? [...stops, newest] : stops;
}

export interface Limits {
  readonly least: Period;
  readonly most: Period;
}

/** How far a needle may go: to the ends of the stops, and never past the other needle. */
export function needleLimits(stops: readonly Period[], needle: Period, other: Period, who: 'then' | 'now'): Limits {
  const first = stops.at(0) ?? needle;
  const last = stops.at(-1) ?? needle;
  const side = midYear(needle) - midYear(other);
  const isLeft = side === 0 ? who === 'then' : side < 0;
  return isLeft ? { least: first, most: other } : { least: other, most: last };
}

const within = (stops: readonly Period[], limits: Limits) =>
  stops.filter((stop) => midYear(stop) >= midYear(limits.least) && midYear(stop) <= midYear(limits.most));

/** The stop nearest to a place on the axis, within the limits; null where no stop lies within them. */
export function nearestStop(stops: readonly Period[], time: number, limits: Limits): Period | null {
  let nearest: Period | null = null;
  for (const stop of within(stops, limits)) {
    if (nearest === null || Math.abs(midYear(stop) - time) < Math.abs(midYear(nearest) - time)) nearest = stop;
  }
  return nearest;
}

export type Step = -10 | -1 | 1 | 10 | 'first' | 'last';

/**
 * Where a step takes a needle: so many years on or back, or to an end, halted by the limits. A needle on a month goes
 * to a year. Gives the same period back where the step leads nowhere.
 */
export function stepNeedle(stops: readonly Period[], needle: Period, step: Step, limits: Limits): Period {
  const allowed = within(stops, limits);
  const first = allowed.at(0);
  const last = allowed.at(-1);
  if (first === undefined || last === undefined) return needle;
  if (step === 'first') return first;
  if (step === 'last') return last;
  const target = yearOf(needle) + step;
  const found =
    step > 0
      ? (allowed.find((stop) => yearOf(stop) >= target) ?? last)
      : (allowed.filter((stop) => yearOf(stop) <= target).at(-1) ?? first);
  const moves = Math.sign(midYear(found) - midYear(needle));
  return moves === Math.sign(step) ? found : needle;
}
