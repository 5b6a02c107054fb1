import type { Period } from '../calendar/period';
import type { YearScaleInput } from '../year-scale/drawing';
import type { PaperYearScale } from './paper';

/** A document's year scale as the geometry takes it, on screen and on paper: the amounts are the document's own text. */
export function paperYearScaleInput(
  scale: PaperYearScale,
  size: YearScaleInput['size'],
  width: number,
): YearScaleInput {
  return {
    size,
    width,
    first: scale.first as Period,
    last: scale.last as Period,
    then: { period: scale.from as Period, amount: scale.priceAmount, text: scale.price },
    now: { period: scale.to as Period, amount: scale.restatedAmount, text: scale.restated },
    curve: scale.curve,
    formatAmount: String,
  };
}
