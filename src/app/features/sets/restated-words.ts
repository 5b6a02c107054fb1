import type { RestatedPrice } from '../../../contracts/sets';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { Dec } from '../../../domain/money/decimal';
import { formatMoney } from '../../../domain/money/money';
import { describePeriod } from '../../../domain/restatement/basis';
import { formatAbout, roundToBand } from '../../../domain/restatement/precision';

export type KnownRestatement = Extract<RestatedPrice, { known: true }>;

/** `about $3,870`: to the precision that the rounding band supports. */
export function aboutText({ restated, rounding }: KnownRestatement): string {
  const band = { low: new Dec(rounding.low), high: new Dec(rounding.high) };
  const precisionAmount = roundToBand(new Dec(restated.amount), band);
  return formatAbout({ restated: restated.amount, precisionAmount, rounding }, restated.currency);
}

export const exactText = ({ restated }: KnownRestatement): string => formatMoney(restated.amount, restated.currency);

/** `$3,789 to $3,815`; cents under a hundred. */
export function bandText(
  { restated }: KnownRestatement,
  { low, high }: { readonly low: string; readonly high: string },
): string {
  const whole = new Dec(restated.amount).gte(100);
  return `${formatMoney(low, restated.currency, { whole })} to ${formatMoney(high, restated.currency, { whole })}`;
}

/** `US CPI-U, release 2026-07, 1941 average`. */
export const releaseText = ({ series, release, from }: KnownRestatement): string =>
  `${series === 'us-cpi-u' ? 'US CPI-U' : series}, release ${release}, ${describePeriod(from.period as Period)}`;

/** Both bands in sentences, each for what it is. */
export function bandSentences(restated: KnownRestatement): string[] {
  const { from, to, rounding, withinYear } = restated;
  const sentences = [
    `The published figures are rounded, which leaves ${bandText(restated, rounding)} open.`,
    withinYear === null
      ? `The price is dated to ${formatPeriod(from.period as Period)}, so no months are left open.`
      : `The month of ${from.period} is not known: by its months it comes to ${bandText(restated, withinYear)}.`,
  ];
  return from.period === to.period ? [] : sentences;
}
