import type { RestatementReply } from '../../../contracts/restatements';
import { formatPeriod, type Period } from '../../../domain/calendar/period';
import { Dec } from '../../../domain/money/decimal';
import { formatMoney } from '../../../domain/money/money';
import { roundToBand } from '../../../domain/restatement/precision';
import type { Restatement } from '../../../domain/restatement/restate';

/** A restatement as the page shows it, whether the server answered it or the browser worked it out meanwhile. */
export interface ShownRestatement extends Restatement {
  readonly series: string;
  readonly release: string;
  readonly currency: string;
}

export function fromReply(reply: RestatementReply): ShownRestatement {
  const { restated, bands, original } = reply;
  const { low, high } = bands.rounding;
  return {
    series: reply.series,
    release: reply.release,
    currency: restated.currency,
    from: { ...reply.from, period: reply.from.period as Period },
    to: { ...reply.to, period: reply.to.period as Period },
    factor: reply.factor,
    original: original.amount,
    restated: restated.amount,
    precisionAmount: roundToBand(new Dec(restated.amount), { low: new Dec(low), high: new Dec(high) }),
    rounding: bands.rounding,
    withinYear: bands.withinYear,
    basis: reply.basis,
  };
}

/** The price as typed: with cents, or all of its decimals where there are more. */
export function formatPrice(amount: string, currency: string): string {
  const [units = '0', decimals = ''] = amount.split('.');
  if (decimals.length <= 2) return formatMoney(amount, currency);
  return `${formatMoney(units, currency, { whole: true })}.${decimals}`;
}

/** Whole units are shown from a hundred up: the band is wider than cents there. */
export function formatFigure(shown: ShownRestatement, amount: string): string {
  return formatMoney(amount, shown.currency, { whole: new Dec(shown.restated).gte(100) });
}

export const formatBand = (shown: ShownRestatement, band: { readonly low: string; readonly high: string }) =>
  `${formatFigure(shown, band.low)} to ${formatFigure(shown, band.high)}`;

/** `× 22.80`; small factors keep four significant digits. */
export function formatFactor(factor: string): string {
  const value = new Dec(factor);
  return `× ${value.gte('0.1') ? value.toFixed(2) : value.toSignificantDigits(4).toFixed()}`;
}

/** `4.4¢` or `$1.32`: what a unit of the later money bought in the earlier period. */
export function formatPurchasingPower(amount: string, currency: string): string {
  const value = new Dec(amount);
  return currency === 'USD' && value.lt(1) ? `${value.times(100).toFixed(1)}¢` : formatMoney(value, currency);
}

/** What an index figure stands for, published rounded: 14.7 → 14.65 to 14.75. */
export function roundedFrom(index: string): string {
  const decimals = index.split('.')[1]?.length ?? 0;
  const half = new Dec(10).pow(-decimals).div(2);
  return `${new Dec(index).minus(half).toFixed(decimals + 1)} to ${new Dec(index).plus(half).toFixed(decimals + 1)}`;
}

/** `1941 average`, `Jul 2026`. */
export const periodWords = (period: Period) => (period.length === 4 ? `${period} average` : formatPeriod(period));
