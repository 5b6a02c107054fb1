import * as z from 'zod';
import type { Period } from '../domain/calendar/period';
import type { IndexSeries } from '../domain/series/series';
import { listOf } from './common';
import { contract } from './contract';

/** An index figure, exactly as published. */
export const indexFigure = z.object({ period: z.string(), index: z.string() });

export const seriesSummary = z.object({
  /** Our id, such as `us-cpi-u`. */
  id: z.string(),
  title: z.string(),
  publisher: z.string(),
  publisherSeriesId: z.string(),
  country: z.string(),
  currency: z.string(),
  base: z.string(),
  /** First and newest month. */
  first: z.string(),
  last: z.string(),
  /** Newest year with a published annual average. */
  lastYear: z.string().nullable(),
  release: z.string(),
  /** Periods inside the range that were never published. */
  missing: z.array(z.string()),
  /** Remarks on single figures. */
  notes: z.array(z.object({ period: z.string(), text: z.string() })),
  licence: z.string(),
  /** How the publisher is named beside the figures. */
  credit: z.string(),
});
export type SeriesSummary = z.infer<typeof seriesSummary>;

export const listSeries = contract({
  method: 'GET',
  path: '/api/series',
  access: 'public',
  summary: 'The price indexes a price can be restated by',
  reply: listOf(seriesSummary),
});

export const getSeriesFigures = contract({
  method: 'GET',
  path: '/api/series/:id/figures',
  access: 'public',
  summary: 'Every published figure of an index',
  params: z.object({ id: z.string().max(60) }),
  reply: z.object({ series: z.string(), release: z.string(), figures: z.array(indexFigure) }),
});

/** The series as the domain's functions take it, from both answers. */
export function toIndexSeries(
  summary: SeriesSummary,
  figures: readonly { readonly period: string; readonly index: string }[],
): IndexSeries {
  return {
    ...summary,
    figures: new Map(figures.map(({ period, index }) => [period as Period, index])),
    missing: summary.missing as Period[],
    notes: new Map(summary.notes.map(({ period, text }) => [period as Period, text])),
  };
}
