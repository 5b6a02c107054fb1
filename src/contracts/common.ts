import * as z from 'zod';
import { PLAIN_DECIMAL } from '../domain/money/money';
import { parsePeriod, type Period } from '../domain/calendar/period';

/** A plain decimal amount, at most 9 digits before the point and 4 after. */
export const amount = z
  .string()
  .regex(
    PLAIN_DECIMAL,
    'Use a plain number such as 39.95: at most 9 digits before the point and 4 after, no sign or comma.',
  );

/** An amount of whole minor units: at most 2 decimals. */
export const moneyAmount = z
  .string()
  .regex(/^\d{1,9}(?:\.\d{1,2})?$/, 'Use a plain amount such as 39.95: at most 9 digits before the point and 2 after.');

/** An amount the server answers: may be negative. */
export const signedAmount = z.string().regex(/^-?\d+(?:\.\d+)?$/);

/** Hours with at most two decimals, below 10,000. */
export const hours = z
  .string()
  .regex(/^\d{1,4}(?:\.\d{1,2})?$/, 'Use hours such as 1.5: at most 4 digits and 2 decimals.');

/** A percentage with at most four decimals, below 1,000. */
export const percent = z.string().regex(/^\d{1,3}(?:\.\d{1,4})?$/, 'Use a percentage such as 7.25, without the sign.');

export const currency = z.enum(['USD'], { error: 'Only USD is kept for now.' });

export const money = z.object({ amount: signedAmount, currency: z.string() });

export const period = z.string().transform((text, context): Period => {
  const parsed = parsePeriod(text);
  if (parsed.ok) return parsed.value;
  context.addIssue({ code: 'custom', message: parsed.error.advice });
  return z.NEVER;
});

export const isoDate = z.iso.date('Use a date such as 2026-04-14.');
export const instant = z.iso.datetime();

/** A record's id in an address. */
export const id = z
  .string()
  .regex(/^[1-9]\d{0,14}$/, 'Use the number of the record.')
  .transform(Number);
export const idParams = z.object({ id });

/** Text a person types: trimmed, bounded, no control characters but line breaks. */
export const text = (max: number) =>
  z
    .string()
    .trim()
    .max(max, `Keep it to ${max} characters.`)
    .regex(/^[\t\n\r\P{Cc}]*$/u, 'Leave out control characters.');
export const requiredText = (max: number) => text(max).min(1, 'This is needed.');

/** The version of a record as the sender last saw it; a newer one answers edit-conflict. */
export const version = z.int().min(1);

const wholeNumber = (least: number, most: number, otherwise: number) =>
  z
    .string()
    .regex(/^\d{1,6}$/, `Use a whole number from ${least} to ${most}.`)
    .transform(Number)
    .refine((n) => n >= least && n <= most, `Use a whole number from ${least} to ${most}.`)
    .default(otherwise);

/** Paging shared by every list; spread it into the list's own query. */
export const paging = { page: wholeNumber(1, 100_000, 1), pageSize: wholeNumber(1, 200, 25) };

export const listOf = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item), total: z.int() });
