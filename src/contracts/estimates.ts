import * as z from 'zod';
import { ROLES } from '../domain/access/policy';
import { isTooLarge } from '../domain/estimate/line';
import { STAGES, TAX_TREATMENTS } from '../domain/estimate/terms';
import {
  amount,
  hours,
  id,
  idParams,
  instant,
  listOf,
  money,
  moneyAmount,
  paging,
  percent,
  requiredText,
  signedAmount,
  text,
  version,
} from './common';
import { contract } from './contract';
import { setDetail } from './sets';

const common = { stage: z.enum(STAGES), description: requiredText(200) };

/** Labour: three-point hours × rate. */
const labourContent = z.object({
  kind: z.literal('labour'),
  ...common,
  hours: z
    .object({ low: hours, likely: hours, high: hours })
    .refine((h) => Number(h.low) <= Number(h.likely), { path: ['likely'], error: 'Likely hours cannot be below low.' })
    .refine((h) => Number(h.likely) <= Number(h.high), { path: ['high'], error: 'High hours cannot be below likely.' }),
  rate: moneyAmount,
});

/** Part: quantity × unit cost × (1 + markup). */
const partContent = z.object({
  kind: z.literal('part'),
  ...common,
  quantity: z.string().regex(/^\d{1,6}(?:\.\d{1,3})?$/, 'Use a quantity such as 12 or 1.5.'),
  unitCost: amount,
  markupPercent: percent,
});

/** Work sent out: the other shop's quote × (1 + markup). */
const outsideContent = z.object({ kind: z.literal('outside'), ...common, quote: moneyAmount, markupPercent: percent });

/** The field that is told when a line comes to more. */
const LARGEST_BY = { labour: 'rate', part: 'unitCost', outside: 'quote' } as const;

export const lineContent = z
  .discriminatedUnion('kind', [labourContent, partContent, outsideContent])
  .check(({ value, issues }) => {
    if (issues.length > 0 || !isTooLarge(value)) return;
    const message = 'The line comes to more than 999,999,999.99.';
    issues.push({ code: 'custom', input: value, path: [LARGEST_BY[value.kind]], message });
  });
export type LineContent = z.infer<typeof lineContent>;

export const estimateLine = z.object({
  id: z.int(),
  version,
  content: lineContent,
  /** At likely, rounded once per line. */
  net: signedAmount,
  netLow: signedAmount,
  netHigh: signedAmount,
});
export type EstimateLine = z.infer<typeof estimateLine>;

const sums = z.object({
  labour: signedAmount,
  parts: signedAmount,
  outside: signedAmount,
  subtotal: signedAmount,
  /** What of the subtotal bears tax, and the tax on it, rounded once. */
  taxable: signedAmount,
  tax: signedAmount,
  total: signedAmount,
});

export const estimateTotals = z.object({
  currency: z.string(),
  /** Hours at likely over all labour lines; low and high likewise. */
  hours: z.object({ low: z.string(), likely: z.string(), high: z.string() }),
  likely: sums,
  low: sums,
  high: sums,
  deposit: signedAmount,
  stages: z.array(z.object({ stage: z.enum(STAGES), hours: z.string(), subtotal: signedAmount })),
});
export type EstimateTotals = z.infer<typeof estimateTotals>;

/** Cost against worth: as found, uplift, cost and the gap; null where a worth is not on record. */
export const verdict = z.object({
  asFound: signedAmount,
  asRestored: signedAmount,
  uplift: signedAmount,
  cost: z.object({ low: signedAmount, likely: signedAmount, high: signedAmount }),
  /** As restored − as found − cost, at low, likely and high cost. */
  gap: z.object({ atLow: signedAmount, atLikely: signedAmount, atHigh: signedAmount }),
  words: z.string(),
  basis: z.string(),
});
export type Verdict = z.infer<typeof verdict>;

const settings = {
  title: requiredText(120),
  taxTreatment: z.enum(TAX_TREATMENTS),
  taxRatePercent: percent,
  taxNote: text(200),
  depositPercent: percent.refine((p) => Number(p) <= 100, 'A deposit is at most 100 percent.'),
  notes: text(2000),
};

export const estimateDetail = z.object({
  ...settings,
  id: z.int(),
  /** Such as `E-0142`. */
  number: z.string(),
  version,
  set: setDetail.pick({
    id: true,
    number: true,
    kind: true,
    maker: true,
    model: true,
    year: true,
    ownerName: true,
    hazards: true,
    worths: true,
  }),
  /** Offered to new lines. */
  defaults: z.object({ labourRate: z.string(), partsMarkupPercent: z.string(), outsideMarkupPercent: z.string() }),
  preparedBy: z.string(),
  preparedByRole: z.enum(ROLES),
  archived: z.boolean(),
  createdAt: instant,
  updatedAt: instant,
  lines: z.array(estimateLine),
  totals: estimateTotals,
  verdict: verdict.nullable(),
});
export type EstimateDetail = z.infer<typeof estimateDetail>;

export const estimateSummary = z.object({
  id: z.int(),
  number: z.string(),
  title: z.string(),
  setId: z.int(),
  setNumber: z.string(),
  setName: z.string(),
  ownerName: z.string().nullable(),
  total: money,
  /** Gap at likely cost; null where a worth is not on record. */
  gap: signedAmount.nullable(),
  archived: z.boolean(),
  updatedAt: instant,
});
export type EstimateSummary = z.infer<typeof estimateSummary>;

export const ESTIMATE_SORTS = ['-updated', 'number', '-total', 'set'] as const;

export const listEstimates = contract({
  method: 'GET',
  path: '/api/estimates',
  access: 'estimate.view',
  summary: 'Find estimates',
  query: z.object({
    q: text(100).optional(),
    setId: id.optional(),
    state: z.enum(['active', 'archived', 'all']).default('active'),
    sort: z.enum(ESTIMATE_SORTS).default('-updated'),
    ...paging,
  }),
  reply: listOf(estimateSummary),
});

export const getEstimate = contract({
  method: 'GET',
  path: '/api/estimates/:id',
  access: 'estimate.view',
  summary: 'One estimate with its lines, sums and verdict',
  params: idParams,
  reply: estimateDetail,
});

export const beginEstimate = contract({
  method: 'POST',
  path: '/api/sets/:id/estimates',
  access: 'estimate.edit',
  summary: 'Begin an estimate for a set, with the practice’s present rates and taxes',
  params: idParams,
  body: z.object({ title: requiredText(120) }),
  reply: estimateDetail,
  status: 201,
});

export const updateEstimate = contract({
  method: 'PUT',
  path: '/api/estimates/:id',
  access: 'estimate.edit',
  summary: 'Change an estimate’s title, taxes, deposit or notes',
  params: idParams,
  body: z.object({ ...settings, version }),
  reply: estimateDetail,
  problems: ['edit-conflict'],
});

export const archiveEstimate = contract({
  method: 'PUT',
  path: '/api/estimates/:id/archived',
  access: 'estimate.edit',
  summary: 'Archive an estimate, or bring it back',
  params: idParams,
  body: z.object({ archived: z.boolean() }),
  reply: estimateDetail,
});

/** Adds at the end of the line's stage, or after the line named. */
export const addLine = contract({
  method: 'POST',
  path: '/api/estimates/:id/lines',
  access: 'estimate.edit',
  summary: 'Add a line',
  params: idParams,
  body: z.object({ content: lineContent, afterLineId: z.int().nullable() }),
  reply: z.object({ lineId: z.int(), estimate: estimateDetail }),
  status: 201,
});

const lineParams = z.object({ id, lineId: id });

/** A line changed by somebody else since `version` answers edit-conflict with the line as it stands; nothing is lost. */
export const updateLine = contract({
  method: 'PUT',
  path: '/api/estimates/:id/lines/:lineId',
  access: 'estimate.edit',
  summary: 'Change a line',
  params: lineParams,
  body: z.object({ content: lineContent, version }),
  reply: estimateDetail,
  problems: ['edit-conflict'],
});

export const removeLine = contract({
  method: 'DELETE',
  path: '/api/estimates/:id/lines/:lineId',
  access: 'estimate.edit',
  summary: 'Remove a line',
  params: lineParams,
  query: z.object({
    version: z
      .string()
      .regex(/^[1-9]\d{0,9}$/)
      .transform(Number),
  }),
  reply: estimateDetail,
  problems: ['edit-conflict'],
});

export const moveLine = contract({
  method: 'PUT',
  path: '/api/estimates/:id/lines/:lineId/place',
  access: 'estimate.edit',
  summary: 'Move a line to stand after another of its stage, or first',
  params: lineParams,
  body: z.object({ afterLineId: z.int().nullable() }),
  reply: estimateDetail,
});
