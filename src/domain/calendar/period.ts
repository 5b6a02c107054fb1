import { fail, ok, type Result } from '../result';

/** A period an index is published for: a year `1941`, a quarter `1948-Q3` or a month `1941-05`. */
export type Period = string & { readonly __brand: 'Period' };
export type PeriodKind = 'year' | 'quarter' | 'month';

export type PeriodError = { readonly code: 'not-a-period'; readonly text: string; readonly advice: string };

const YEAR = /^\d{4}$/;
const QUARTER = /^\d{4}-Q[1-4]$/;
const MONTH = /^\d{4}-(?:0[1-9]|1[0-2])$/;

export function parsePeriod(text: string): Result<Period, PeriodError> {
  if (YEAR.test(text) || QUARTER.test(text) || MONTH.test(text)) return ok(text as Period);
  return fail({
    code: 'not-a-period',
    text,
    advice: 'Use a year such as 1941, a month such as 1941-05 or a quarter such as 1948-Q3.',
  });
}

export function periodKind(period: Period): PeriodKind {
  return YEAR.test(period) ? 'year' : QUARTER.test(period) ? 'quarter' : 'month';
}

export function yearOf(period: Period): number {
  return Number(period.slice(0, 4));
}

/** Where the period's middle lies on a year axis: 1941 → 1941.5, 1941-01 → 1941 + 1/24. */
export function midYear(period: Period): number {
  const kind = periodKind(period);
  if (kind === 'year') return yearOf(period) + 0.5;
  if (kind === 'quarter') return yearOf(period) + (Number(period.slice(6)) - 0.5) / 4;
  return yearOf(period) + (Number(period.slice(5)) - 0.5) / 12;
}

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

/** For reading: `1941`, `Mar 2026`, `Q3 1948`. */
export function formatPeriod(period: Period): string {
  const kind = periodKind(period);
  if (kind === 'year') return period;
  if (kind === 'quarter') return `${period.slice(5)} ${period.slice(0, 4)}`;
  return `${MONTHS[Number(period.slice(5)) - 1]} ${period.slice(0, 4)}`;
}

/** For reading an ISO date `2026-04-14` → `14 Apr 2026`. */
export function formatDate(isoDate: string): string {
  const [year, month, day] = isoDate.slice(0, 10).split('-');
  return `${Number(day)} ${MONTHS[Number(month) - 1]} ${year}`;
}
