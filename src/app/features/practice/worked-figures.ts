import { Dec } from '../../../domain/money/decimal';
import { formatCents, formatMoney, toCents } from '../../../domain/money/money';
import { marginOfMarkup, withMarkup } from '../../../domain/estimate/line';
import { percentOf } from '../../../domain/estimate/totals';
import type { TaxTreatment } from '../../../domain/estimate/terms';

const CURRENCY = 'USD';
const COST = '10.00';
const PARTS = '100.00';
const LABOUR = '300.00';
const TOTAL = '1000.00';

/** What a markup does to a cost of ten, and why it is not a margin. */
export function markupFigure(markupPercent: string): string {
  const price = formatCents(toCents(withMarkup(new Dec(COST), markupPercent)), CURRENCY);
  return `A cost of ${formatMoney(COST, CURRENCY)} is billed at ${price}. Markup counts on the cost, margin on the price: this is a margin of ${marginOfMarkup(markupPercent)} %.`;
}

/** What the treatment and the rate come to on a small job. */
export function taxFigure(treatment: TaxTreatment, ratePercent: string): string {
  const taxed = { none: '0', parts: PARTS, labour: LABOUR, both: new Dec(PARTS).plus(LABOUR).toFixed(2) }[treatment];
  const tax = formatCents(percentOf(taxed, ratePercent), CURRENCY);
  return `On parts of ${formatMoney(PARTS, CURRENCY)} and labour of ${formatMoney(LABOUR, CURRENCY)} the tax is ${tax}.`;
}

/** What the deposit comes to on a total of a thousand. */
export function depositFigure(depositPercent: string): string {
  const deposit = formatCents(percentOf(TOTAL, depositPercent), CURRENCY);
  return `On a total of ${formatMoney(TOTAL, CURRENCY)}, ${deposit} is due before work starts.`;
}
