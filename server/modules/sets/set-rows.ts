import type { Photo, registerSet, Worth } from '../../../src/contracts/sets';
import type { InputOf } from '../../../src/contracts/contract';
import { parsePeriod, type Period } from '../../../src/domain/calendar/period';
import { cents, centsToDecimal, toCents } from '../../../src/domain/money/money';
import { expectOk } from '../../../src/domain/result';
import { formatNumber } from '../../../src/domain/sets/numbers';
import type { PhotoRow } from './photos.repo';
import type { OwnedSet, SetValues, WorthRow } from './sets.repo';

/** Between the rows of the database and what the contracts say: amounts in cents here, decimals there. */

export type SetInput = InputOf<typeof registerSet>['body'];
type PriceColumns = Pick<OwnedSet, 'priceCents' | 'priceCurrency' | 'pricePeriod' | 'priceSource'>;

export function priceOf({ priceCents, pricePeriod, priceSource }: PriceColumns) {
  if (priceCents === null || pricePeriod === null || priceSource === null) return null;
  const period: Period = expectOk(parsePeriod(pricePeriod));
  return { amount: centsToDecimal(cents(priceCents)), currency: 'USD' as const, period, source: priceSource };
}

export function valuesOf({ priceWhenNew, hazards: _, ...same }: SetInput): SetValues {
  return {
    ...same,
    priceCents: priceWhenNew === null ? null : toCents(priceWhenNew.amount),
    priceCurrency: priceWhenNew?.currency ?? null,
    pricePeriod: priceWhenNew?.period ?? null,
    priceSource: priceWhenNew?.source ?? null,
  };
}

export function identityOf(set: OwnedSet) {
  return {
    id: set.id,
    number: formatNumber('S', set.id),
    version: set.version,
    kind: set.kind,
    maker: set.maker,
    model: set.model,
    description: set.description,
    chassis: set.chassis,
    serial: set.serial,
    year: set.year,
    ownerId: set.ownerId,
    ownerName: set.ownerName,
    priceIsPublic: set.priceIsPublic,
    provenance: set.provenance,
    alterations: set.alterations,
    notes: set.notes,
    archived: set.archived,
    updatedAt: new Date(set.updatedAt).toISOString(),
  };
}

export const moneyOf = (amount: number, currency: string) => ({ amount: centsToDecimal(cents(amount)), currency });
export const photoAddress = (id: number, size: 'large' | 'small') => `/api/photos/${id}/${size}`;

export const shownPhoto = ({ setId: _, ...photo }: PhotoRow): Photo => ({
  ...photo,
  large: photoAddress(photo.id, 'large'),
  small: photoAddress(photo.id, 'small'),
});

export function shownWorth(row: WorthRow & { readonly recorder: string }): Worth {
  const optional = (amount: number | null) => (amount === null ? null : moneyOf(amount, row.currency));
  return {
    id: row.id,
    kind: row.kind,
    amount: moneyOf(row.amountCents, row.currency),
    low: optional(row.lowCents),
    high: optional(row.highCents),
    valueType: row.valueType,
    effectiveOn: row.effectiveOn,
    saidBy: row.saidBy,
    basis: row.basis,
    recordedBy: row.recorder,
    recordedAt: new Date(row.recordedAt).toISOString(),
  };
}
