import { sql } from 'drizzle-orm';
import { blob, check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { HAZARDS } from '../../../src/domain/sets/hazards';
import { SET_KINDS, SET_PARTS, VALUE_TYPES, WORTH_KINDS } from '../../../src/domain/sets/terms';
import { owners, users } from './people';

export const sets = sqliteTable(
  'sets',
  {
    /** Its number is `S-` and this, four digits at least. */
    id: integer('id').primaryKey({ autoIncrement: true }),
    version: integer('version').notNull().default(1),
    kind: text('kind', { enum: SET_KINDS }).notNull(),
    maker: text('maker').notNull(),
    model: text('model').notNull(),
    description: text('description').notNull().default(''),
    chassis: text('chassis').notNull().default(''),
    serial: text('serial').notNull().default(''),
    year: integer('year'),
    ownerId: integer('owner_id').references(() => owners.id),
    priceCents: integer('price_cents'),
    priceCurrency: text('price_currency'),
    pricePeriod: text('price_period'),
    priceSource: text('price_source'),
    priceIsPublic: integer('price_is_public', { mode: 'boolean' }).notNull().default(false),
    provenance: text('provenance').notNull().default(''),
    alterations: text('alterations').notNull().default(''),
    notes: text('notes').notNull().default(''),
    archived: integer('archived', { mode: 'boolean' }).notNull().default(false),
    createdAt: integer('created_at').notNull(),
    updatedAt: integer('updated_at').notNull(),
  },
  (t) => [
    index('sets_owner').on(t.ownerId),
    index('sets_updated').on(t.updatedAt),
    check('sets_year', sql`${t.year} is null or ${t.year} between 1870 and 2100`),
    check('sets_price_cents', sql`${t.priceCents} is null or ${t.priceCents} >= 0`),
    check(
      'sets_price_whole',
      sql`(${t.priceCents} is null) = (${t.priceCurrency} is null) and (${t.priceCents} is null) = (${t.pricePeriod} is null) and (${t.priceCents} is null) = (${t.priceSource} is null)`,
    ),
  ],
);

export const setHazards = sqliteTable(
  'set_hazards',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id, { onDelete: 'cascade' }),
    hazard: text('hazard', { enum: HAZARDS }).notNull(),
    volts: integer('volts'),
    note: text('note').notNull().default(''),
  },
  (t) => [uniqueIndex('set_hazards_once').on(t.setId, t.hazard)],
);

/** Condition by part with its date; every entry is kept, the newest of a part is its present condition. */
export const setConditions = sqliteTable(
  'set_conditions',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id, { onDelete: 'cascade' }),
    part: text('part', { enum: SET_PARTS }).notNull(),
    grade: integer('grade').notNull(),
    note: text('note').notNull().default(''),
    notedOn: text('noted_on').notNull(),
    recordedBy: integer('recorded_by')
      .notNull()
      .references(() => users.id),
    recordedAt: integer('recorded_at').notNull(),
  },
  (t) => [index('set_conditions_set').on(t.setId), check('set_conditions_grade', sql`${t.grade} between 1 and 5`)],
);

/** What a set is worth, who says so and on what basis; every entry is kept. */
export const setWorths = sqliteTable(
  'set_worths',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: WORTH_KINDS }).notNull(),
    amountCents: integer('amount_cents').notNull(),
    lowCents: integer('low_cents'),
    highCents: integer('high_cents'),
    currency: text('currency').notNull(),
    valueType: text('value_type', { enum: VALUE_TYPES }).notNull(),
    effectiveOn: text('effective_on').notNull(),
    saidBy: text('said_by').notNull(),
    basis: text('basis').notNull(),
    recordedBy: integer('recorded_by')
      .notNull()
      .references(() => users.id),
    recordedAt: integer('recorded_at').notNull(),
  },
  (t) => [
    index('set_worths_set').on(t.setId),
    check('set_worths_amount', sql`${t.amountCents} >= 0`),
    check(
      'set_worths_range',
      sql`(${t.lowCents} is null or ${t.lowCents} <= ${t.amountCents}) and (${t.highCents} is null or ${t.highCents} >= ${t.amountCents})`,
    ),
  ],
);

export const setPhotos = sqliteTable(
  'set_photos',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    setId: integer('set_id')
      .notNull()
      .references(() => sets.id, { onDelete: 'cascade' }),
    position: integer('position').notNull(),
    caption: text('caption').notNull().default(''),
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    /** JPEG bytes, at most 2,000 px and 480 px on the long side; without any metadata. */
    large: blob('large', { mode: 'buffer' }).notNull(),
    small: blob('small', { mode: 'buffer' }).notNull(),
    addedBy: integer('added_by')
      .notNull()
      .references(() => users.id),
    addedAt: integer('added_at').notNull(),
  },
  (t) => [index('set_photos_set').on(t.setId, t.position)],
);
