import type { ParamMap } from '@angular/router';
import { amount } from '../../../contracts/common';
import { parsePeriod } from '../../../domain/calendar/period';

/** What is asked, as text: the address carries it, the server is sent it. */
export interface Inquiry {
  readonly amount: string;
  /** A year or a month. */
  readonly from: string;
  /** Null: the newest published month. */
  readonly to: string | null;
  /** Empty: the first series on offer. */
  readonly series: string;
}

/** An inquiry with nothing left to fill in. */
export type AnswerableInquiry = Inquiry & { readonly to: string };

/** A question that has an answer, for whoever opens the page without one. */
export const FIRST_INQUIRY: Inquiry = { amount: '169.95', from: '1941', to: null, series: '' };

export function inquiryFromAddress(query: ParamMap): Inquiry {
  return {
    amount: query.get('amount') ?? FIRST_INQUIRY.amount,
    from: query.get('from') ?? FIRST_INQUIRY.from,
    to: query.get('to') ?? FIRST_INQUIRY.to,
    series: query.get('series') ?? FIRST_INQUIRY.series,
  };
}

/** One text for one inquiry, to tell two apart. */
export const inquiryKey = (inquiry: Inquiry) =>
  JSON.stringify([inquiry.series, inquiry.amount, inquiry.from, inquiry.to]);

/** True when every part can be sent; whether the periods are published is another matter. */
export const isAnswerable = (inquiry: Inquiry): inquiry is AnswerableInquiry =>
  inquiry.series !== '' &&
  inquiry.to !== null &&
  amount.safeParse(inquiry.amount).success &&
  parsePeriod(inquiry.from).ok &&
  parsePeriod(inquiry.to).ok;

/** A period as the form shows it: its year, and its month (or quarter), empty for the whole year. */
export function splitPeriod(period: string): { year: string; month: string } {
  const [year = '', month = ''] = period.split('-', 2);
  return { year, month };
}

export const joinPeriod = (year: string, month: string) => (month === '' ? year : `${year}-${month}`);
