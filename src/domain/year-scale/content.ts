import { yearOf, type Period } from '../calendar/period';
import { formatMoney } from '../money/money';
import type { YearScaleInput } from './drawing';

/** What a year scale shows, whatever its size. Amounts are decimal strings. */
export interface YearScaleContent {
  readonly first: Period;
  readonly last: Period;
  readonly from: Period;
  readonly to: Period;
  readonly price: string;
  readonly restated: string;
  readonly currency: string;
  /** The price restated to each published year; may be empty. */
  readonly curve: readonly { readonly period: Period; readonly amount: string }[];
  readonly factor?: string;
  readonly multipliers?: readonly { readonly period: Period; readonly multiplier: string }[];
}

/** The content as the geometry takes it: prices when new with cents, restated amounts whole from a hundred up. */
export function yearScaleInput(content: YearScaleContent, size: YearScaleInput['size'], width: number): YearScaleInput {
  const { first, last, currency } = content;
  const restated = Number(content.restated);
  return {
    size,
    width,
    first,
    last,
    then: { period: content.from, amount: Number(content.price), text: formatMoney(content.price, currency) },
    now: {
      period: content.to,
      amount: restated,
      text: formatMoney(content.restated, currency, { whole: restated >= WHOLE_FROM }),
    },
    curve: content.curve.map(({ period, amount }) => ({ year: yearOf(period), amount: Number(amount) })),
    ...(content.factor === undefined ? {} : { factor: content.factor }),
    ...(content.multipliers === undefined
      ? {}
      : {
          multipliers: content.multipliers.map(({ period, multiplier }) => ({ year: yearOf(period), multiplier })),
        }),
    formatAmount: (amount) =>
      formatMoney(String(amount), currency, {
        whole: amount >= WHOLE_FROM || (Number.isInteger(amount) && restated >= CENTS_BELOW),
      }),
  };
}

/** From this amount on, cents say more than an index of one decimal supports. */
const WHOLE_FROM = 100;

/** Below this amount the axis counts in cents. */
const CENTS_BELOW = 5;
