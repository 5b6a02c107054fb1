import type { InputOf, ReplyOf } from '../../../src/contracts/contract';
import type { getRestatement, RestatementReply } from '../../../src/contracts/restatements';
import type { getSeriesFigures, SeriesSummary } from '../../../src/contracts/series';
import type { RestatedPrice } from '../../../src/contracts/sets';
import type { Period } from '../../../src/domain/calendar/period';
import { parsePlainDecimal } from '../../../src/domain/money/money';
import { describeNotPublished, type PeriodNotPublished } from '../../../src/domain/restatement/not-published';
import { restate, restatedCurve, type Restatement } from '../../../src/domain/restatement/restate';
import { expectOk, fail, ok, type Result } from '../../../src/domain/result';
import { firstPeriod, newestPeriod, newestYear } from '../../../src/domain/series/figures';
import { fieldError, ProblemError } from '../../http/problem';
import type { ReferenceData } from '../../reference-data/reference-data';
import type { PublishedSeries } from '../../reference-data/series-file';

/** A price as sold: a plain decimal such as `39.95` (else a bug, thrown), its currency, and its year or month. */
export interface DatedPrice {
  readonly amount: string;
  readonly currency: string;
  readonly period: Period;
}

/** A dated price with its restatement and the price in every published year's money, for the year scale. */
export interface RestatedOverTime {
  readonly series: PublishedSeries;
  readonly restatement: Restatement;
  readonly curve: readonly { readonly period: Period; readonly amount: string }[];
}

/** Why a dated price has no restatement, in words, with the nearest published periods. */
export interface NotRestated {
  readonly reason: string;
  readonly neighbours: readonly Period[];
}

export type RestatementsService = ReturnType<typeof createRestatementsService>;

export function createRestatementsService({ referenceData }: { readonly referenceData: ReferenceData }) {
  return {
    listSeries(): { items: SeriesSummary[]; total: number } {
      const items = referenceData.list.map(summaryOf);
      return { items, total: items.length };
    },

    /** Every published figure, ascending. Throws `not-found` for an unknown series. */
    listFigures(id: string): ReplyOf<typeof getSeriesFigures> {
      const series = referenceData.seriesById(id);
      if (series === undefined) throw new ProblemError('not-found', { detail: 'No such series.' });
      const figures = Array.from(series.figures, ([period, index]) => ({ period, index }));
      return { series: series.id, release: series.release, figures };
    },

    /**
     * Restates a price; `to` left out is the newest published month.
     * Throws `invalid-input` for an unknown series and `period-not-published` with the nearest published periods.
     */
    restate({ series: id, amount, from, to }: InputOf<typeof getRestatement>['query']): RestatementReply {
      const series = referenceData.seriesById(id);
      if (series === undefined) {
        const known = referenceData.list.map((one) => one.id).join(', ');
        throw fieldError('series', `Use one of the series kept: ${known}.`, id.slice(0, 80));
      }
      const result = restate({ series, amount, from, to: to ?? newestPeriod(series) });
      if (!result.ok) throw periodProblem(result.error);
      return replyOf(series, result.value);
    },

    /** A set's price when new in the newest published month's money, or why that is unknown. Never throws for data. */
    restatePrice(price: DatedPrice): RestatedPrice {
      const result = inNewestMoney(referenceData, price);
      if (!result.ok) return { known: false, reason: result.error.reason, neighbours: [...result.error.neighbours] };
      const { series, release, from, to, factor, restated, bands, basis } = replyOf(
        result.value.series,
        result.value.restatement,
      );
      return { known: true, series, release, from, to, factor, restated, ...bands, basis };
    },

    /** A set's price when new in the newest month's money and in every published year's, for the year scale. */
    restateOverTime: (price: DatedPrice): Result<RestatedOverTime, NotRestated> => overTime(referenceData, price),
  };
}

function inNewestMoney(
  referenceData: ReferenceData,
  price: DatedPrice,
): Result<Omit<RestatedOverTime, 'curve'>, NotRestated> {
  const series = referenceData.seriesByCurrency(price.currency);
  if (series === undefined) return fail({ reason: `No price index for ${price.currency} is kept.`, neighbours: [] });
  const amount = expectOk(parsePlainDecimal(price.amount));
  const restatement = restate({ series, amount, from: price.period, to: newestPeriod(series) });
  return restatement.ok ? ok({ series, restatement: restatement.value }) : fail(notRestated(restatement.error));
}

function overTime(referenceData: ReferenceData, price: DatedPrice): Result<RestatedOverTime, NotRestated> {
  const newest = inNewestMoney(referenceData, price);
  if (!newest.ok) return newest;
  const { series, restatement } = newest.value;
  const curve = restatedCurve(series, expectOk(parsePlainDecimal(price.amount)), price.period);
  return curve.ok ? ok({ series, restatement, curve: curve.value }) : fail(notRestated(curve.error));
}

const notRestated = (failure: PeriodNotPublished): NotRestated => ({
  reason: describeNotPublished(failure),
  neighbours: failure.neighbours,
});

const periodProblem = (failure: PeriodNotPublished) =>
  new ProblemError('period-not-published', {
    detail: describeNotPublished(failure),
    fields: [{ field: failure.which, value: failure.period, message: describeNotPublished(failure) }],
    neighbours: [...failure.neighbours],
  });

function replyOf(series: PublishedSeries, restatement: Restatement): RestatementReply {
  const { from, to, factor, original, restated, rounding, withinYear, basis } = restatement;
  const { id, release, currency } = series;
  return {
    series: id,
    release,
    from,
    to,
    factor,
    original: { amount: original, currency },
    restated: { amount: restated, currency },
    bands: { rounding, withinYear },
    basis,
  };
}

function summaryOf(series: PublishedSeries): SeriesSummary {
  return {
    id: series.id,
    title: series.title,
    publisher: series.publisher,
    publisherSeriesId: series.publisherSeriesId,
    country: series.country,
    currency: series.currency,
    base: series.base,
    first: firstPeriod(series),
    last: newestPeriod(series),
    lastYear: newestYear(series) ?? null,
    release: series.release,
    missing: [...series.missing],
    notes: Array.from(series.notes, ([period, text]) => ({ period, text })),
    licence: series.licence,
    credit: series.credit,
  };
}
