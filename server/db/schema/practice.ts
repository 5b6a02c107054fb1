import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { PAPER_SIZES, TAX_TREATMENTS } from '../../../src/domain/estimate/terms';

/** The one practice of this installation: its single row has id 1. */
export const practice = sqliteTable(
  'practice',
  {
    id: integer('id').primaryKey(),
    version: integer('version').notNull().default(1),
    name: text('name').notNull(),
    address: text('address').notNull().default(''),
    phone: text('phone').notNull().default(''),
    email: text('email').notNull().default(''),
    currency: text('currency').notNull().default('USD'),
    labourRateCents: integer('labour_rate_cents').notNull(),
    partsMarkupPpm: integer('parts_markup_ppm').notNull(),
    outsideMarkupPpm: integer('outside_markup_ppm').notNull(),
    taxTreatment: text('tax_treatment', { enum: TAX_TREATMENTS }).notNull(),
    taxRatePpm: integer('tax_rate_ppm').notNull(),
    taxNote: text('tax_note').notNull().default(''),
    depositPpm: integer('deposit_ppm').notNull(),
    paperSize: text('paper_size', { enum: PAPER_SIZES }).notNull(),
    /** True in the demo practice only. */
    demo: integer('demo', { mode: 'boolean' }).notNull().default(false),
  },
  (t) => [
    check('practice_single', sql`${t.id} = 1`),
    check('practice_deposit', sql`${t.depositPpm} between 0 and 1000000`),
    check(
      'practice_amounts',
      sql`${t.labourRateCents} >= 0 and ${t.partsMarkupPpm} >= 0 and ${t.outsideMarkupPpm} >= 0 and ${t.taxRatePpm} >= 0`,
    ),
  ],
);
