import type { SetDetail } from '../../../contracts/sets';
import { formatPeriod } from '../../../domain/calendar/period';
import { formatMoney } from '../../../domain/money/money';
import { CAUTIONS } from '../../../domain/sets/hazards';
import { SET_KIND_LABELS } from '../../../domain/sets/terms';

export interface Difference {
  readonly label: string;
  readonly before: string;
  readonly now: string;
}

const READINGS: readonly { readonly label: string; readonly read: (set: SetDetail) => string }[] = [
  { label: 'Kind', read: ({ kind }) => SET_KIND_LABELS[kind] },
  { label: 'Maker', read: ({ maker }) => maker },
  { label: 'Model', read: ({ model }) => model },
  { label: 'Description', read: ({ description }) => description },
  { label: 'Chassis', read: ({ chassis }) => chassis },
  { label: 'Serial', read: ({ serial }) => serial },
  { label: 'Year', read: ({ year }) => (year === null ? '' : String(year)) },
  { label: 'Owner', read: ({ ownerName }) => ownerName ?? '' },
  {
    label: 'Price when new',
    read: ({ priceWhenNew: price }) =>
      price === null
        ? ''
        : `${formatMoney(price.amount, price.currency)} in ${formatPeriod(price.period)}, ${price.source}`,
  },
  { label: 'Shown on Then and now', read: ({ priceIsPublic }) => (priceIsPublic ? 'Yes' : 'No') },
  { label: 'Provenance', read: ({ provenance }) => provenance },
  { label: 'Alterations', read: ({ alterations }) => alterations },
  { label: 'Notes', read: ({ notes }) => notes },
  {
    label: 'Hazards',
    read: ({ hazards }) =>
      hazards
        .map(({ hazard, volts, note }) =>
          [CAUTIONS[hazard].label, volts === null ? '' : `${volts} V`, note].filter((part) => part !== '').join(', '),
        )
        .join('; '),
  },
];

/** What of a set's record reads differently now, in words. Condition, worths and photographs are recorded apart. */
export function differences(before: SetDetail, now: SetDetail): Difference[] {
  return READINGS.map(({ label, read }) => ({ label, before: read(before), now: read(now) })).filter(
    (entry) => entry.before !== entry.now,
  );
}
