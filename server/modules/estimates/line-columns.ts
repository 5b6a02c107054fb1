import type { LineContent } from '../../../src/contracts/estimates';
import { cents, centsToDecimal, toCents } from '../../../src/domain/money/money';
import { percentToPpm, ppmToPercent, scaled, unscaled } from '../../../src/domain/money/scaled';
import type { Line } from '../../../src/domain/estimate/line';
import type { LineRow } from './estimates.repo';

export type LineColumns = Omit<LineRow, 'id' | 'estimateId' | 'version' | 'position'>;

const EMPTY = {
  hoursLowHundredths: null,
  hoursLikelyHundredths: null,
  hoursHighHundredths: null,
  rateCents: null,
  quantityThousandths: null,
  unitCostTenThousandths: null,
  quoteCents: null,
  markupPpm: null,
};

/** A line's content as the columns of its kind; the others stay empty. */
export function columnsOf(content: LineContent): LineColumns {
  const { kind, stage, description } = content;
  const common = { ...EMPTY, kind, stage, description };
  switch (content.kind) {
    case 'labour':
      return {
        ...common,
        hoursLowHundredths: scaled(content.hours.low, 2),
        hoursLikelyHundredths: scaled(content.hours.likely, 2),
        hoursHighHundredths: scaled(content.hours.high, 2),
        rateCents: toCents(content.rate),
      };
    case 'part':
      return {
        ...common,
        quantityThousandths: scaled(content.quantity, 3),
        unitCostTenThousandths: scaled(content.unitCost, 4),
        markupPpm: percentToPpm(content.markupPercent),
      };
    case 'outside':
      return { ...common, quoteCents: toCents(content.quote), markupPpm: percentToPpm(content.markupPercent) };
  }
}

/** A row's content. The table's CHECK keeps the columns of its kind filled; one that is not is a bug, and throws. */
export function contentOf(row: LineColumns): Line {
  const { kind, stage, description } = row;
  switch (kind) {
    case 'labour':
      return {
        kind,
        stage,
        description,
        hours: {
          low: hoursText(row.hoursLowHundredths),
          likely: hoursText(row.hoursLikelyHundredths),
          high: hoursText(row.hoursHighHundredths),
        },
        rate: moneyText(row.rateCents),
      };
    case 'part':
      return {
        kind,
        stage,
        description,
        quantity: unscaled(filled(row.quantityThousandths), 3),
        unitCost: costText(filled(row.unitCostTenThousandths)),
        markupPercent: ppmToPercent(filled(row.markupPpm)),
      };
    case 'outside':
      return {
        kind,
        stage,
        description,
        quote: moneyText(row.quoteCents),
        markupPercent: ppmToPercent(filled(row.markupPpm)),
      };
  }
}

function filled(value: number | null): number {
  if (value === null) throw new Error('an estimate line lacks a column of its kind');
  return value;
}

const moneyText = (amount: number | null) => centsToDecimal(cents(filled(amount)));
/** Hours always show two decimals: `4.50`. */
const hoursText = (hundredths: number | null) => (filled(hundredths) / 100).toFixed(2);

/** A unit cost with two decimals, or as many as it needs: `0.035`, `12.50`. */
function costText(tenThousandths: number): string {
  const text = unscaled(tenThousandths, 4);
  const decimals = text.split('.')[1]?.length ?? 0;
  return decimals >= 2 ? text : (tenThousandths / 10_000).toFixed(2);
}
