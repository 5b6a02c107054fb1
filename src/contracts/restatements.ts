import * as z from 'zod';
import { parsePlainDecimal, type PlainDecimal } from '../domain/money/money';
import { money, period } from './common';
import { contract } from './contract';
import { indexFigure } from './series';

/** Query text that may stand in an address once only. */
const once = z.string({ error: ({ input }) => (input === undefined ? 'This is needed.' : 'Send this once.') });

const plainDecimal = z.string().transform((text, context): PlainDecimal => {
  const parsed = parsePlainDecimal(text);
  if (parsed.ok) return parsed.value;
  context.addIssue({ code: 'custom', message: parsed.error.advice });
  return z.NEVER;
});

const band = z.object({ low: z.string(), high: z.string() });

export const restatement = z.object({
  series: z.string(),
  release: z.string(),
  from: indexFigure,
  to: indexFigure,
  /** I(to) ÷ I(from), to 40 significant digits. */
  factor: z.string(),
  original: money,
  restated: money,
  bands: z.object({
    /** What the rounding of the published indexes leaves open. */
    rounding: band,
    /** Lowest and highest monthly result of the year paid; null for a price dated by a month. */
    withinYear: band.nullable(),
  }),
  basis: z.string(),
});
export type RestatementReply = z.infer<typeof restatement>;

export const getRestatement = contract({
  method: 'GET',
  path: '/api/restatements',
  access: 'public',
  summary: 'A price of one period in the money of another',
  query: z.object({
    series: once,
    amount: once.pipe(plainDecimal),
    from: once.pipe(period),
    /** Left out: the newest published month. */
    to: once.pipe(period).optional(),
  }),
  reply: restatement,
  problems: ['period-not-published'],
});
