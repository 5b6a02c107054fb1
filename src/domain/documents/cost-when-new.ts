import { formatPeriod, yearOf } from '../calendar/period';
import { formatMoney } from '../money/money';
import { describePeriod } from '../restatement/basis';
import { formatAbout } from '../restatement/precision';
import type { PriceForPaper, RestatedForPaper } from './inputs';
import type { PaperFigure, PaperSection, PaperYearScale } from './paper';

/** What a set cost when new and what that is in today's money, as figures, year scale and sections of a document. */

export function priceFigure(price: PriceForPaper | null): PaperFigure {
  const label = 'Cost when new';
  if (price === null)
    return { label, amount: 'Not on record', weight: 'words', range: null, basis: 'No price when new has been found.' };
  return {
    label,
    amount: formatMoney(price.amount, price.currency),
    weight: 'light',
    range: null,
    basis: `In ${formatPeriod(price.period)}. Source: ${price.source}`,
  };
}

export function restatedFigure(price: PriceForPaper | null, restated: RestatedForPaper | null): PaperFigure {
  const label = 'In today’s money';
  if (price === null || restated === null)
    return { label, amount: 'Not known', weight: 'words', range: null, basis: 'It needs a price when new.' };
  if (!restated.known) return { label, amount: 'Not restated', weight: 'words', range: null, basis: restated.reason };
  const { restatement, series } = restated;
  const { rounding, withinYear, from, to } = restatement;
  const ranges = [
    `${bandText(rounding, price.currency)} by index rounding`,
    ...(withinYear === null ? [] : [`${bandText(withinYear, price.currency)} by month of ${yearOf(from.period)}`]),
  ];
  return {
    label,
    amount: formatAbout(restatement, price.currency),
    weight: 'heavy',
    range: ranges.join('; '),
    basis:
      `${series.publisherSeriesId}, release ${series.release}, ` +
      `${describePeriod(from.period)} to ${describePeriod(to.period)}. Not what the set is worth.`,
  };
}

/** Whole units where both ends are 100 or more, else to the cent. */
function bandText(band: { readonly low: string; readonly high: string }, currency: string): string {
  const whole = Number(band.low) >= 100;
  return `${formatMoney(band.low, currency, { whole })} to ${formatMoney(band.high, currency, { whole })}`;
}

/** Null where the price or its restatement is not known. */
export function yearScaleOf(price: PriceForPaper | null, restated: RestatedForPaper | null): PaperYearScale | null {
  if (price === null || restated === null || !restated.known) return null;
  const { restatement, series, curve } = restated;
  const { from, to } = restatement;
  const paid = formatMoney(price.amount, price.currency);
  const now = formatAbout(restatement, price.currency);
  return {
    price: paid,
    restated: now,
    priceAmount: Number(price.amount),
    restatedAmount: Number(restatement.restated),
    from: from.period,
    to: to.period,
    first: series.first,
    last: series.last,
    curve: curve.map(({ period, amount }) => ({ year: yearOf(period), amount: Number(amount) })),
    sentence: `${paid} paid in ${formatPeriod(from.period)} is ${now} in the money of ${formatPeriod(to.period)}.`,
  };
}

/** The sum with its bands and basis, and that it is not worth; nothing without a price when new. */
export function priceSections(price: PriceForPaper | null, restated: RestatedForPaper | null): PaperSection[] {
  if (price === null) return [];
  const paid = formatMoney(price.amount, price.currency);
  const heading = 'Cost when new, and in today’s money';
  const rows = [
    { label: 'Cost when new', value: `${paid}, ${formatPeriod(price.period)}` },
    { label: 'Source', value: price.source },
  ];
  if (restated === null || !restated.known) {
    const reason = restated === null ? 'It has not been restated.' : restated.reason;
    return [{ type: 'facts', heading, rows: [...rows, { label: 'In today’s money', value: reason }] }];
  }
  const { restatement } = restated;
  const { rounding, withinYear, from, to } = restatement;
  const exactBand = (band: { readonly low: string; readonly high: string }) =>
    `${formatMoney(band.low, price.currency)} to ${formatMoney(band.high, price.currency)}`;
  const about = formatAbout(restatement, price.currency);
  return [
    {
      type: 'facts',
      heading,
      rows: [
        ...rows,
        {
          label: 'In today’s money',
          value: `${about}; worked to the cent, ${formatMoney(restatement.restated, price.currency)}`,
        },
        {
          label: 'Rounding band',
          value: `${exactBand(rounding)}: what the rounding of the published indexes leaves open`,
        },
        ...(withinYear === null
          ? []
          : [
              {
                label: 'Within-year band',
                value: `${exactBand(withinYear)}: lowest and highest by the month of ${yearOf(from.period)} it was paid in`,
              },
            ]),
        { label: 'Basis', value: restatement.basis },
      ],
    },
    {
      type: 'paragraphs',
      heading: 'A restated price is not worth',
      paragraphs: [
        `${capitalised(about)} says what a buyer of ${formatPeriod(from.period)} gave up, in the money of ${formatPeriod(to.period)}. ` +
          'It is not what the set is worth. What sets like this one sell for is a separate question, and only the worth figures speak to it.',
      ],
    },
  ];
}

const capitalised = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
