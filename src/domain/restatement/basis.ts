import { formatPeriod, periodKind, type Period } from '../calendar/period';
import type { IndexFigure } from '../series/figures';
import type { IndexSeries } from '../series/series';

/** `1938 average` for a year, `Mar 2026` for a month. */
export function describePeriod(period: Period): string {
  return periodKind(period) === 'year' ? `${period} average` : formatPeriod(period);
}

/**
 * What a restated price rests on: method, figures with their periods, series and release, and the publisher's remarks
 * on the figures used.
 */
export function basisLine(options: {
  readonly series: IndexSeries;
  readonly from: IndexFigure;
  readonly to: IndexFigure;
}): string {
  const { series, from, to } = options;
  const remarks = [...new Set([from.period, to.period])].flatMap((period) => series.notes.get(period) ?? []);
  return [
    `Price × ${to.index} (${describePeriod(to.period)}) ÷ ${from.index} (${describePeriod(from.period)})`,
    `${series.publisher}, ${series.title}, ${series.publisherSeriesId}, ${series.base}`,
    `release ${series.release}`,
    ...remarks,
  ]
    .join('; ')
    .concat('.');
}
