import type { SetDetail, SetSummary, Worth } from '../../../contracts/sets';
import { formatDate } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { VALUE_TYPE_LABELS } from '../../../domain/sets/terms';

export interface Money {
  readonly amount: string;
  readonly currency: string;
}

/** What stands where no amount is on record; never a zero. */
export const NOT_KNOWN = 'Not known';

/** A price when new with its cents, or words. */
export const priceText = (price: SetSummary['priceWhenNew']): string =>
  price === null ? NOT_KNOWN : formatMoney(price.amount, price.currency);

/** A present amount in whole units, or words. */
export const wholeText = (money: Money | null): string =>
  money === null ? NOT_KNOWN : formatMoney(money.amount, money.currency, { whole: true });

/** A band in whole units: `$550 to $750`; null where an end is missing. */
export function rangeText({ low, high }: Pick<Worth, 'low' | 'high'>): string | null {
  if (low === null || high === null) return null;
  return `${wholeText(low)} to ${wholeText(high)}`;
}

/** `Fair market value, Maud Ferris, 9 Apr 2026`: type of value, who says so, from when it holds. */
export const worthBasis = ({ valueType, saidBy, effectiveOn }: Worth): string =>
  `${VALUE_TYPE_LABELS[valueType]}, ${saidBy}, ${formatDate(effectiveOn)}`;

export const setName = ({ maker, model }: Pick<SetDetail, 'maker' | 'model'>): string => `${maker} ${model}`;

/** `1941, eleven tubes, AM and two short-wave bands`: the year, and the description going on in small letters. */
export function inALine({ year, description }: Pick<SetDetail, 'year' | 'description'>): string {
  if (year === null) return description;
  if (description === '') return String(year);
  const goesOn = /^[A-Z][a-z]/.test(description)
    ? description.charAt(0).toLowerCase() + description.slice(1)
    : description;
  return `${year}, ${goesOn}`;
}
