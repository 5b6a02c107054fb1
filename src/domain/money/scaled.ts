import { Dec } from './decimal';

/** A decimal text as a whole number of its smallest stored unit: `scaled('7.25', 4)` → 72500. Throws when it does not fit. */
export function scaled(text: string, decimals: number): number {
  const value = new Dec(text).times(new Dec(10).pow(decimals));
  if (!value.isInteger() || value.abs().gt(Number.MAX_SAFE_INTEGER))
    throw new RangeError(`«${text}» does not fit ${decimals} decimals`);
  return value.toNumber();
}

/** The decimal text of a stored whole number, without trailing zeros: `unscaled(72500, 4)` → `7.25`. */
export const unscaled = (stored: number, decimals: number): string =>
  new Dec(stored).div(new Dec(10).pow(decimals)).toFixed();

/** A percentage is kept in parts per million: `7.25` ↔ 72500. */
export const percentToPpm = (percent: string): number => scaled(percent, 4);
export const ppmToPercent = (ppm: number): string => unscaled(ppm, 4);
