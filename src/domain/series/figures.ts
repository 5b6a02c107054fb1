import { periodKind, type Period, type PeriodKind, yearOf } from '../calendar/period';
import type { IndexSeries } from './series';

/** A period with its figure, exactly as published. */
export interface IndexFigure {
  readonly period: Period;
  readonly index: string;
}

/** The published figure of a period, or undefined: nothing is ever estimated in its place. */
export const figureAt = (series: IndexSeries, period: Period): string | undefined => series.figures.get(period);

/** Decimals a figure was published to: `14.7` → 1, `270.970` → 3. */
export function publishedDecimals(figure: string): number {
  const point = figure.indexOf('.');
  return point === -1 ? 0 : figure.length - point - 1;
}

/** Every published figure of a kind, oldest first. Periods of one kind sort as text. */
export function publishedFigures(series: IndexSeries, kind: PeriodKind): IndexFigure[] {
  const figures: IndexFigure[] = [];
  for (const [period, index] of series.figures) if (periodKind(period) === kind) figures.push({ period, index });
  return figures.sort((a, b) => (a.period < b.period ? -1 : 1));
}

/** The first published month, or the first period of a series without months. Throws on a series without figures. */
export const firstPeriod = (series: IndexSeries): Period => mostDetailed(series)(0);

/** The newest published month, or the newest period of a series without months. Throws on a series without figures. */
export const newestPeriod = (series: IndexSeries): Period => mostDetailed(series)(-1);

/** The newest year with a published annual average, if the series has any. */
export const newestYear = (series: IndexSeries): Period | undefined => publishedFigures(series, 'year').at(-1)?.period;

/** The published months of a year, January first; 2025 has eleven. */
export const publishedMonths = (series: IndexSeries, year: number): IndexFigure[] =>
  publishedFigures(series, 'month').filter(({ period }) => yearOf(period) === year);

/** Every published annual average, oldest first. */
export const annualAverages = (series: IndexSeries): IndexFigure[] => publishedFigures(series, 'year');

/**
 * The nearest published periods of the same kind, the one before first; one only at an end of the series.
 * Where the series has nothing of that kind, such as quarters in a monthly index, they are its nearest months.
 */
export function neighbours(series: IndexSeries, period: Period): Period[] {
  const sameKind = publishedFigures(series, periodKind(period));
  if (sameKind.length > 0) return around(sameKind, period);
  return around(publishedFigures(series, 'month'), middleMonth(period));
}

function around(published: readonly IndexFigure[], period: string): Period[] {
  const before = published.filter((figure) => figure.period < period).at(-1);
  const after = published.find((figure) => figure.period > period);
  return [before, after].flatMap((figure) => (figure === undefined ? [] : [figure.period]));
}

function middleMonth(period: Period): string {
  const month = periodKind(period) === 'quarter' ? Number(period.slice(6)) * 3 - 1 : 6;
  return `${period.slice(0, 4)}-${String(month).padStart(2, '0')}`;
}

function mostDetailed(series: IndexSeries): (index: number) => Period {
  const kinds = ['month', 'quarter', 'year'] as const;
  const figures = kinds.map((kind) => publishedFigures(series, kind)).find((found) => found.length > 0) ?? [];
  return (index) => {
    const figure = figures.at(index);
    if (figure === undefined) throw new Error(`series ${series.id} has no figures`);
    return figure.period;
  };
}
