import { fail, ok, type Result } from '../result';
import { Dec } from './decimal';

/** Integer minor units of a currency (US cents). Made only by the functions of this file. */
export type Cents = number & { readonly __brand: 'Cents' };

/** A plain decimal amount as typed or sent, such as `39.95`: no sign, exponent, grouping or currency sign. */
export type PlainDecimal = string & { readonly __brand: 'PlainDecimal' };

/** At most 9 digits before the point and 4 after. */
export const PLAIN_DECIMAL = /^\d{1,9}(?:\.\d{1,4})?$/;

export type AmountError = { readonly code: 'not-a-plain-decimal'; readonly text: string; readonly advice: string };

/** Reads a typed or sent amount; refuses signs, exponents, grouping and more than 9.4 digits. */
export function parsePlainDecimal(text: string): Result<PlainDecimal, AmountError> {
  if (PLAIN_DECIMAL.test(text)) return ok(text as PlainDecimal);
  return fail({
    code: 'not-a-plain-decimal',
    text,
    advice: 'Use a plain number such as 39.95: at most 9 digits before the point and 4 after, no sign or comma.',
  });
}

/** A whole number of minor units; throws on fractions and beyond ±2^53 (a bug in the caller). */
export function cents(minorUnits: number): Cents {
  if (!Number.isSafeInteger(minorUnits)) throw new RangeError(`not a whole number of minor units: ${minorUnits}`);
  return (minorUnits === 0 ? 0 : minorUnits) as Cents; // no −0
}

/** Rounds an exact amount to two decimals, half away from zero, and gives its minor units. */
export function toCents(amount: Dec | PlainDecimal | string): Cents {
  return cents(new Dec(amount).times(100).toDecimalPlaces(0).toNumber());
}

/** Minor units as a decimal string with two decimals: `123456` → `1234.56`. */
export function centsToDecimal(amount: Cents): string {
  return new Dec(amount).div(100).toFixed(2);
}

export function sumCents(amounts: Iterable<Cents>): Cents {
  let total = 0;
  for (const amount of amounts) total += amount;
  return cents(total);
}

const SIGN: Readonly<Record<string, string>> = { USD: '$', GBP: '£', CAD: 'C$', AUD: 'A$' };

/**
 * An amount for reading: `$1,234.56`, `−$355.00` (U+2212), `+$135` with `signed`, whole units with `whole`.
 * Whole units are rounded half away from zero.
 */
export function formatMoney(
  amount: Dec | string,
  currency: string,
  options: { readonly whole?: boolean; readonly signed?: boolean } = {},
): string {
  const rounded = new Dec(amount).toDecimalPlaces(options.whole ? 0 : 2);
  const [units = '0', fraction] = rounded
    .abs()
    .toFixed(options.whole ? 0 : 2)
    .split('.');
  const grouped = units.replace(/\B(?=(\d{3})+$)/g, ',');
  const sign = rounded.isZero() ? '' : rounded.isNegative() ? '−' : options.signed ? '+' : '';
  return `${sign}${SIGN[currency] ?? `${currency} `}${grouped}${fraction === undefined ? '' : `.${fraction}`}`;
}

export const formatCents = (amount: Cents, currency: string, options: { whole?: boolean; signed?: boolean } = {}) =>
  formatMoney(centsToDecimal(amount), currency, options);
