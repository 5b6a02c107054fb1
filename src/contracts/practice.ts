import * as z from 'zod';
import { currency, moneyAmount, percent, requiredText, text, version } from './common';
import { contract } from './contract';
import { PAPER_SIZES, TAX_TREATMENTS } from '../domain/estimate/terms';

const settings = {
  name: requiredText(120),
  /** Printed at the head of documents, a line each. */
  address: text(400),
  phone: text(60),
  email: text(254),
  currency,
  /** Per hour. */
  labourRate: moneyAmount,
  /** Added to a part's cost: 35 turns 10.00 into 13.50. Not a margin. */
  partsMarkupPercent: percent,
  outsideMarkupPercent: percent,
  taxTreatment: z.enum(TAX_TREATMENTS),
  taxRatePercent: percent,
  /** Which authority's rule the treatment follows, printed beside the tax. */
  taxNote: text(200),
  depositPercent: percent.refine((p) => Number(p) <= 100, 'A deposit is at most 100 percent.'),
  paperSize: z.enum(PAPER_SIZES),
};

export const practice = z.object({ ...settings, version });
export type Practice = z.infer<typeof practice>;

export const getPractice = contract({
  method: 'GET',
  path: '/api/practice',
  access: 'practice.view',
  summary: 'The practice’s name, rates and taxes',
  reply: practice,
});

export const updatePractice = contract({
  method: 'PUT',
  path: '/api/practice',
  access: 'practice.edit',
  summary: 'Change the practice’s settings; drafts keep the settings they were begun with',
  body: z.object({ ...settings, version }),
  reply: practice,
  problems: ['edit-conflict'],
});
