import { Decimal } from 'decimal.js';

/**
 * The project's own decimal.js constructor: 40 significant digits, half away from zero, never an exponent in text.
 * A private clone, so that no other code can change its settings. Nothing outside `money/` imports decimal.js.
 */
export const Dec = Decimal.clone({
  precision: 40,
  rounding: Decimal.ROUND_HALF_UP, // decimal.js: "rounds towards nearest neighbour; if equidistant, away from zero"
  toExpNeg: -60,
  toExpPos: 60,
});
export type Dec = InstanceType<typeof Dec>;
