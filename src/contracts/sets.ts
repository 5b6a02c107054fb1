import * as z from 'zod';
import { GRADES, SET_KINDS, SET_PARTS, VALUE_TYPES, WORTH_KINDS } from '../domain/sets/terms';
import { HAZARDS } from '../domain/sets/hazards';
import {
  currency,
  id,
  idParams,
  instant,
  isoDate,
  listOf,
  money,
  moneyAmount,
  paging,
  period,
  requiredText,
  text,
  version,
} from './common';
import { contract } from './contract';

/** What a set's price when new comes to in the newest published money, or why that is unknown. */
export const restatedPrice = z.discriminatedUnion('known', [
  z.object({
    known: z.literal(true),
    series: z.string(),
    release: z.string(),
    from: z.object({ period: z.string(), index: z.string() }),
    to: z.object({ period: z.string(), index: z.string() }),
    factor: z.string(),
    restated: money,
    rounding: z.object({ low: z.string(), high: z.string() }),
    withinYear: z.object({ low: z.string(), high: z.string() }).nullable(),
    basis: z.string(),
  }),
  z.object({ known: z.literal(false), reason: z.string(), neighbours: z.array(z.string()) }),
]);
export type RestatedPrice = z.infer<typeof restatedPrice>;

/** The price as sold new: what, when, and where that is known from. */
export const priceWhenNew = z.object({
  amount: moneyAmount,
  currency,
  /** A year or a month. */
  period,
  source: requiredText(300),
});

export const worth = z.object({
  id: z.int(),
  kind: z.enum(WORTH_KINDS),
  amount: money,
  low: money.nullable(),
  high: money.nullable(),
  valueType: z.enum(VALUE_TYPES),
  effectiveOn: isoDate,
  /** Who says so. */
  saidBy: z.string(),
  /** On what basis. */
  basis: z.string(),
  recordedBy: z.string(),
  recordedAt: instant,
});
export type Worth = z.infer<typeof worth>;

export const photo = z.object({
  id: z.int(),
  caption: z.string(),
  position: z.int(),
  width: z.int(),
  height: z.int(),
  /** Addresses of the resized pictures. */
  large: z.string(),
  small: z.string(),
});
export type Photo = z.infer<typeof photo>;

export const conditionEntry = z.object({
  id: z.int(),
  part: z.enum(SET_PARTS),
  grade: z.int().min(1).max(5),
  note: z.string(),
  notedOn: isoDate,
});
export type ConditionEntry = z.infer<typeof conditionEntry>;

export const hazardEntry = z.object({
  hazard: z.enum(HAZARDS),
  /** Highest voltage on record, in volts. */
  volts: z.int().min(1).max(60_000).nullable(),
  note: text(300),
});
export type HazardEntry = z.infer<typeof hazardEntry>;

const identity = {
  kind: z.enum(SET_KINDS),
  maker: requiredText(80),
  model: requiredText(80),
  /** What it is in a line, such as «Eleven tubes, AM and two short-wave bands». */
  description: text(200),
  chassis: text(80),
  serial: text(80),
  year: z.int().min(1870, 'Use a year from 1870 on.').max(2100, 'Use a year up to 2100.').nullable(),
  ownerId: z.int().nullable(),
  priceWhenNew: priceWhenNew.nullable(),
  /** Shows maker, model, year and price when new (never owner or serial) on the public page. */
  priceIsPublic: z.boolean(),
  provenance: text(4000),
  alterations: text(4000),
  notes: text(4000),
  hazards: z
    .array(hazardEntry)
    .max(HAZARDS.length)
    .refine((all) => new Set(all.map((h) => h.hazard)).size === all.length, 'Name each hazard once.'),
};

export const setSummary = z.object({
  id: z.int(),
  /** The practice's number for it, such as `S-0318`. */
  number: z.string(),
  kind: z.enum(SET_KINDS),
  maker: z.string(),
  model: z.string(),
  year: z.int().nullable(),
  ownerName: z.string().nullable(),
  photo: z.string().nullable(),
  priceWhenNew: priceWhenNew.nullable(),
  restated: money.nullable(),
  worthAsFound: money.nullable(),
  worthRestored: money.nullable(),
  archived: z.boolean(),
  updatedAt: instant,
});
export type SetSummary = z.infer<typeof setSummary>;

export const setDetail = z.object({
  ...identity,
  id: z.int(),
  number: z.string(),
  version,
  ownerName: z.string().nullable(),
  archived: z.boolean(),
  updatedAt: instant,
  /** Null without a price when new. */
  restated: restatedPrice.nullable(),
  /** Every entry, newest first; the first of a part is its present condition. */
  condition: z.array(conditionEntry),
  /** Newest first; the first of a kind is in force. */
  worths: z.array(worth),
  photos: z.array(photo),
});
export type SetDetail = z.infer<typeof setDetail>;

export const SET_SORTS = ['-updated', 'number', 'maker', 'year', '-year', '-worth'] as const;

export const listSets = contract({
  method: 'GET',
  path: '/api/sets',
  access: 'set.view',
  summary: 'Find sets',
  query: z.object({
    q: text(100).optional(),
    kind: z.enum(SET_KINDS).optional(),
    maker: text(80).optional(),
    ownerId: id.optional(),
    state: z.enum(['active', 'archived', 'all']).default('active'),
    sort: z.enum(SET_SORTS).default('-updated'),
    ...paging,
  }),
  /** `makers` offers the filter's choices. */
  reply: listOf(setSummary).extend({ makers: z.array(z.string()) }),
});

export const getSet = contract({
  method: 'GET',
  path: '/api/sets/:id',
  access: 'set.view',
  summary: 'One set with its condition, worths and photographs',
  params: idParams,
  reply: setDetail,
});

export const registerSet = contract({
  method: 'POST',
  path: '/api/sets',
  access: 'set.edit',
  summary: 'Register a set',
  body: z.object(identity),
  reply: setDetail,
  status: 201,
});

export const updateSet = contract({
  method: 'PUT',
  path: '/api/sets/:id',
  access: 'set.edit',
  summary: 'Change a set',
  params: idParams,
  body: z.object({ ...identity, version }),
  reply: setDetail,
  problems: ['edit-conflict'],
});

export const archiveSet = contract({
  method: 'PUT',
  path: '/api/sets/:id/archived',
  access: 'set.edit',
  summary: 'Archive a set, or bring it back',
  params: idParams,
  body: z.object({ archived: z.boolean() }),
  reply: setDetail,
});

export const recordCondition = contract({
  method: 'POST',
  path: '/api/sets/:id/condition',
  access: 'set.edit',
  summary: 'Record the condition of parts on a date',
  params: idParams,
  body: z.object({
    notedOn: isoDate,
    entries: z
      .array(
        z.object({
          part: z.enum(SET_PARTS),
          grade: z.int().refine((g) => GRADES.includes(g as (typeof GRADES)[number]), 'Use a grade from 1 to 5.'),
          note: text(300),
        }),
      )
      .min(1, 'Grade at least one part.')
      .max(SET_PARTS.length)
      .refine((all) => new Set(all.map((e) => e.part)).size === all.length, 'Grade each part once.'),
  }),
  reply: setDetail,
  status: 201,
});

export const recordWorth = contract({
  method: 'POST',
  path: '/api/sets/:id/worths',
  access: 'worth.record',
  summary: 'Record what the set is worth, with who says so and on what basis',
  params: idParams,
  body: z
    .object({
      kind: z.enum(WORTH_KINDS),
      amount: moneyAmount,
      low: moneyAmount.nullable(),
      high: moneyAmount.nullable(),
      currency,
      valueType: z.enum(VALUE_TYPES),
      effectiveOn: isoDate,
      saidBy: requiredText(120),
      basis: requiredText(600),
    })
    .refine((w) => w.low === null || Number(w.low) <= Number(w.amount), {
      path: ['low'],
      error: 'The low end cannot be above the amount.',
    })
    .refine((w) => w.high === null || Number(w.high) >= Number(w.amount), {
      path: ['high'],
      error: 'The high end cannot be below the amount.',
    }),
  reply: setDetail,
  status: 201,
});

/** Multipart, field `photo`: a JPEG, PNG, WebP, TIFF or AVIF file of at most 25 MB, told by its bytes. */
export const addPhoto = contract({
  method: 'POST',
  path: '/api/sets/:id/photos',
  access: 'set.edit',
  summary: 'Add a photograph; it is resized and its position data removed',
  params: idParams,
  reply: photo,
  status: 201,
  problems: ['too-large', 'unusable-photo'],
});

const photoParams = z.object({ id, photoId: id });

export const captionPhoto = contract({
  method: 'PATCH',
  path: '/api/sets/:id/photos/:photoId',
  access: 'set.edit',
  summary: 'Caption a photograph',
  params: photoParams,
  body: z.object({ caption: text(200) }),
  reply: photo,
});

export const removePhoto = contract({
  method: 'DELETE',
  path: '/api/sets/:id/photos/:photoId',
  access: 'set.edit',
  summary: 'Remove a photograph',
  params: photoParams,
  reply: null,
});

export const orderPhotos = contract({
  method: 'PUT',
  path: '/api/sets/:id/photos',
  access: 'set.edit',
  summary: 'Put the photographs in order; the first stands for the set',
  params: idParams,
  body: z.object({ photoIds: z.array(z.int()).max(200) }),
  reply: z.object({ items: z.array(photo), total: z.int() }),
});

export const getPhoto = contract({
  method: 'GET',
  path: '/api/photos/:photoId/:size',
  access: 'set.view',
  summary: 'A photograph’s picture',
  params: z.object({ photoId: id, size: z.enum(['large', 'small']) }),
  reply: 'binary',
});

/** Prices when new that the practice shows to anyone: facts about models, without owner or serial. */
export const listPublicPrices = contract({
  method: 'GET',
  path: '/api/list-prices',
  access: 'public',
  summary: 'Prices when new of known models',
  reply: listOf(
    z.object({
      kind: z.enum(SET_KINDS),
      maker: z.string(),
      model: z.string(),
      price: priceWhenNew,
      restated: money.nullable(),
      to: z.string().nullable(),
    }),
  ),
});
