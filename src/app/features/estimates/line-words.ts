import type { LineContent } from '../../../contracts/estimates';
import { formatMoney } from '../../../domain/money/money';

/** How a line's amount comes about, in a few words: `1.00 / 1.50 / 2.50 h at $68.00`. */
export function lineWords(content: LineContent, currency: string): string {
  switch (content.kind) {
    case 'labour': {
      const { low, likely, high } = content.hours;
      const hours = low === high ? `${likely} h` : `${low} / ${likely} / ${high} h`;
      return `${hours} at ${formatMoney(content.rate, currency)}`;
    }
    case 'part':
      return `${content.quantity} × ${costWords(content.unitCost, currency)}, markup ${content.markupPercent}%`;
    case 'outside':
      return `Quote ${formatMoney(content.quote, currency)}, markup ${content.markupPercent}%`;
  }
}

/** A unit cost keeps more than two decimals where it has them. */
function costWords(unitCost: string, currency: string): string {
  const decimals = unitCost.split('.')[1]?.length ?? 0;
  return decimals > 2
    ? `${formatMoney('0', currency).replace('0.00', '')}${unitCost}`
    : formatMoney(unitCost, currency);
}
