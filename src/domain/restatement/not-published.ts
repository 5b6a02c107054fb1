import { formatPeriod, periodKind, yearOf, type Period } from '../calendar/period';
import { neighbours, publishedFigures, publishedMonths } from '../series/figures';
import type { IndexSeries } from '../series/series';

/** Why a price cannot be restated: one of its periods has no published figure. Nothing is interpolated instead. */
export interface PeriodNotPublished {
  readonly code: 'period-not-published';
  readonly period: Period;
  readonly which: 'from' | 'to';
  readonly reason: 'never-published' | 'not-yet-published' | 'before-series' | 'no-annual-average';
  /** The nearest published periods, the one before first; one only at an end of the series. */
  readonly neighbours: readonly Period[];
}

/** The failure for a period that the series has no figure for. */
export function notPublished(series: IndexSeries, period: Period, which: 'from' | 'to'): PeriodNotPublished {
  return {
    code: 'period-not-published',
    period,
    which,
    reason: reasonFor(series, period),
    neighbours: neighbours(series, period),
  };
}

function reasonFor(series: IndexSeries, period: Period): PeriodNotPublished['reason'] {
  const kind = periodKind(period);
  if (kind === 'year' && publishedMonths(series, yearOf(period)).length > 0) return 'no-annual-average';
  const sameKind = publishedFigures(series, kind);
  const first = sameKind.at(0)?.period;
  const last = sameKind.at(-1)?.period;
  if (first === undefined || last === undefined) return 'never-published';
  return period < first ? 'before-series' : period > last ? 'not-yet-published' : 'never-published';
}

const REASONS: Readonly<Record<PeriodNotPublished['reason'], (period: string) => string>> = {
  'never-published': (period) => `No figure was ever published for ${period}.`,
  'not-yet-published': (period) => `No figure is published yet for ${period}.`,
  'before-series': (period) => `The index begins after ${period}.`,
  'no-annual-average': (period) => `No annual average is published for ${period}, though some of its months are.`,
};

/** The failure in words, with the neighbours named: `No figure was ever published for Oct 2025. …` */
export function describeNotPublished(failure: PeriodNotPublished): string {
  const nearest = failure.neighbours.map(formatPeriod).join(' and ');
  const offer = nearest === '' ? '' : ` The nearest published: ${nearest}.`;
  return `${REASONS[failure.reason](formatPeriod(failure.period))}${offer}`;
}
