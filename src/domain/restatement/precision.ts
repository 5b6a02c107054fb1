import { Dec } from '../money/decimal';
import { formatMoney } from '../money/money';

const CENT = new Dec('0.01');

/**
 * An amount to the precision its band supports: rounded to the largest power of ten, at least a cent, of which half a
 * unit still lies inside the band on both sides, so that the rounded amount never leaves the band.
 * 1469.50 within 1464.50 to 1474.50 gives `1470`; whole amounts have no decimals, others two.
 */
export function roundToBand(amount: Dec, band: { readonly low: Dec; readonly high: Dec }): string {
  const room = Dec.min(amount.minus(band.low), band.high.minus(amount)).times(2);
  const exponent = room.lt(CENT) ? -2 : room.e; // `e` is the power of ten of the leading digit
  const unit = new Dec(10).pow(exponent);
  return amount
    .div(unit)
    .toDecimalPlaces(0)
    .times(unit)
    .toFixed(exponent < 0 ? 2 : 0);
}

/** For reading: `about $1,470`; to the cent and without «about» where the band is closed. */
export function formatAbout(
  restatement: {
    readonly restated: string;
    readonly precisionAmount: string;
    readonly rounding: { readonly low: string; readonly high: string };
  },
  currency: string,
): string {
  const { precisionAmount, rounding, restated } = restatement;
  if (rounding.low === rounding.high) return formatMoney(restated, currency);
  return `about ${formatMoney(precisionAmount, currency, { whole: !precisionAmount.includes('.') })}`;
}
