import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { LINE_KINDS, STAGES, TAX_TREATMENTS } from '../../../src/domain/estimate/terms';
import { users } from './people';
import { sets } from './sets';

/** An estimate keeps the rates and taxes it was begun with; later changes of the practice's settings leave it alone. */
export const estimates = sqliteTable(
  'estimates',
  {
    /** Its number is `E-` and this, four digits at least. */
    id: integer('id').primaryKey({ autoIncrement: true }),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id),
    version: integer('version').notNull().default(1),
    title: text('title').notNull(),
    currency: text('currency').notNull(),
    labourRateCents: integer('labour_rate_cents').notNull(),
    partsMarkupPpm: integer('parts_markup_ppm').notNull(),
    outsideMarkupPpm: integer('outside_markup_ppm').notNull(),
    taxTreatment: text('tax_treatment', { enum: TAX_TREATMENTS }).notNull(),
    taxRatePpm: integer('tax_rate_ppm').notNull(),
    taxNote: text('tax_note').notNull().default(''),
    depositPpm: integer('deposit_ppm').notNull(),
    notes: text('notes').notNull().default(''),
    archived: integer('archived', { mode: 'boolean' }).notNull().default(false),
    preparedBy: integer('prepared_by')
      .notNull()
      .references(() => users.id),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('estimates_set').on(t.setId),
    index('estimates_updated').on(t.updatedAt),
    check('estimates_deposit', sql`${t.depositPpm} between 0 and 1000000`),
  ],
);

/** One line; the columns of its kind are filled, the others null. */
export const estimateLines = sqliteTable(
  'estimate_lines',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    estimateId: integer('estimate_id')
      .notNull()
      .references(() => estimates.id, { onDelete: 'cascade' }),
    version: integer('version').notNull().default(1),
    stage: text('stage', { enum: STAGES }).notNull(),
    /** Order within the stage. */
    position: integer('position').notNull(),
    kind: text('kind', { enum: LINE_KINDS }).notNull(),
    description: text('description').notNull(),
    hoursLowHundredths: integer('hours_low_hundredths'),
    hoursLikelyHundredths: integer('hours_likely_hundredths'),
    hoursHighHundredths: integer('hours_high_hundredths'),
    rateCents: integer('rate_cents'),
    quantityThousandths: integer('quantity_thousandths'),
    unitCostTenThousandths: integer('unit_cost_ten_thousandths'),
    quoteCents: integer('quote_cents'),
    markupPpm: integer('markup_ppm'),
  },
  (t) => [
    index('estimate_lines_estimate').on(t.estimateId, t.stage, t.position),
    check(
      'estimate_lines_kind',
      sql`case ${t.kind}
        when 'labour' then ${t.hoursLowHundredths} >= 0 and ${t.hoursLowHundredths} <= ${t.hoursLikelyHundredths} and ${t.hoursLikelyHundredths} <= ${t.hoursHighHundredths} and ${t.rateCents} >= 0
        when 'part' then ${t.quantityThousandths} >= 0 and ${t.unitCostTenThousandths} >= 0 and ${t.markupPpm} >= 0
        when 'outside' then ${t.quoteCents} >= 0 and ${t.markupPpm} >= 0
      end is true`,
    ),
  ],
);
