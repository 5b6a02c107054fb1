import { buildAppraisalSheet } from '../../src/domain/documents/appraisal-sheet';
import type {
  EstimateForPaper,
  PracticeForPaper,
  RestatedForPaper,
  SetForPaper,
} from '../../src/domain/documents/inputs';
import { buildRestorationEstimate } from '../../src/domain/documents/restoration-estimate';
import { expectOk } from '../../src/domain/result';
import { parsePlainDecimal } from '../../src/domain/money/money';
import { restate, restatedCurve } from '../../src/domain/restatement/restate';
import { firstPeriod, newestPeriod } from '../../src/domain/series/figures';
import type { IndexSeries } from '../../src/domain/series/series';
import type { Period } from '../../src/domain/calendar/period';

/** A set, an estimate and their papers, for tests. The index is made up and rises by 3 percent a year. */

const period = (text: string) => text as Period;
const risingIndex = (year: number) => 10 * 1.03 ** (year - 1913);

export const RISING_SERIES: IndexSeries = {
  id: 'rising',
  title: 'Rising index',
  publisher: 'Bureau of Tests',
  publisherSeriesId: 'TEST0001',
  country: 'US',
  currency: 'USD',
  base: '1913=10',
  release: '2026-07',
  licence: 'none',
  figures: new Map([
    ...Array.from({ length: 113 }, (_, i): [Period, string] => [
      period(`${1913 + i}`),
      risingIndex(1913 + i).toFixed(1),
    ]),
    [period('1913-01'), '9.9'],
    [period('1938-01'), '20.6'],
    [period('1938-12'), '21.3'],
    [period('2026-07'), '281.437'],
  ]),
  missing: [],
  notes: new Map(),
};

const PRICE = { amount: '39.95', currency: 'USD', period: period('1938'), source: 'Maker’s price list' };

export const RESTATED = ((): RestatedForPaper & { known: true } => {
  const amount = expectOk(parsePlainDecimal(PRICE.amount));
  const to = newestPeriod(RISING_SERIES);
  return {
    known: true,
    restatement: expectOk(restate({ series: RISING_SERIES, amount, from: PRICE.period, to })),
    series: { ...RISING_SERIES, first: firstPeriod(RISING_SERIES), last: to },
    curve: expectOk(restatedCurve(RISING_SERIES, amount, PRICE.period)),
  };
})();

const usd = (amount: string) => ({ amount, currency: 'USD' });

export const SET: SetForPaper = {
  number: 'S-0318',
  kind: 'radio',
  maker: 'Corvane',
  model: '9-T',
  description: 'Nine tubes, AM and two short-wave bands',
  chassis: 'C-940',
  serial: '40218',
  year: 1938,
  ownerName: 'Wren Łukowska',
  priceWhenNew: PRICE,
  provenance: 'Bought new by the owner’s grandfather.\nKept in one house until 2025.',
  alterations: 'Two coupling capacitors replaced, date unknown.',
  hazards: [
    { hazard: 'high-voltage', volts: 385, note: '' },
    { hazard: 'asbestos', volts: null, note: 'Paper behind the rectifier.' },
  ],
  condition: [
    { part: 'wiring', grade: 1, note: 'Rubber insulation crumbles.', notedOn: '2026-04-14' },
    { part: 'cabinet', grade: 3, note: 'Veneer lifting at the left rear.', notedOn: '2026-04-14' },
    { part: 'cabinet', grade: 4, note: '', notedOn: '2025-01-10' },
  ],
  worths: [
    {
      id: 9,
      recordedAt: '2026-05-01T09:00:00Z',
      kind: 'as-restored',
      amount: usd('950.00'),
      low: usd('850.00'),
      high: usd('1100.00'),
      valueType: 'fair-market',
      effectiveOn: '2026-04-14',
      saidBy: 'Idris Bellweather',
      basis: 'Four sales of like sets, 2025 and 2026.',
    },
    {
      id: 8,
      recordedAt: '2026-05-01T09:00:00Z',
      kind: 'as-found',
      amount: usd('140.00'),
      low: null,
      high: null,
      valueType: 'fair-market',
      effectiveOn: '2026-04-10',
      saidBy: 'Rui Restorer',
      basis: 'Two sales of unrestored sets.',
    },
    {
      id: 7,
      recordedAt: '2026-05-01T09:00:00Z',
      kind: 'as-found',
      amount: usd('999.00'),
      low: null,
      high: null,
      valueType: 'replacement',
      effectiveOn: '2020-01-01',
      saidBy: 'Someone earlier',
      basis: 'Superseded.',
    },
  ],
};

export const PRACTICE: PracticeForPaper = {
  name: 'Quayside Set Works',
  address: '3 Cooper’s Wharf\nPort Ellery, Minnesota',
  phone: '555-0142',
  email: 'bench@quayside.example',
};

export const ESTIMATE: EstimateForPaper = {
  number: 'E-0142',
  title: 'Rewire, recap and align',
  taxTreatment: 'parts',
  taxRatePercent: '6.8750',
  taxNote: 'Sample state rule.',
  depositPercent: '40.0000',
  notes: 'Work begins when the deposit is in.\nThe set is kept dry and insured here.',
  set: SET,
  lines: [
    {
      content: {
        kind: 'labour',
        stage: 'intake',
        description: 'Inspect, make safe and record',
        hours: { low: '1.00', likely: '1.50', high: '2.00' },
        rate: '65.00',
      },
      net: '97.50',
      netLow: '65.00',
      netHigh: '130.00',
    },
    {
      content: {
        kind: 'labour',
        stage: 'power',
        description: 'Rewire the power supply',
        hours: { low: '4.00', likely: '6.00', high: '10.00' },
        rate: '65.00',
      },
      net: '390.00',
      netLow: '260.00',
      netHigh: '650.00',
    },
    {
      content: {
        kind: 'part',
        stage: 'power',
        description: 'Filter capacitors',
        quantity: '3.000',
        unitCost: '11.4000',
        markupPercent: '35.0000',
      },
      net: '46.17',
      netLow: '46.17',
      netHigh: '46.17',
    },
    {
      content: {
        kind: 'outside',
        stage: 'speaker',
        description: 'Recone the speaker',
        quote: '120.00',
        markupPercent: '10.0000',
      },
      net: '132.00',
      netLow: '132.00',
      netHigh: '132.00',
    },
  ],
  totals: {
    currency: 'USD',
    hours: { low: '5.00', likely: '7.50', high: '12.00' },
    low: {
      labour: '325.00',
      parts: '46.17',
      outside: '132.00',
      subtotal: '503.17',
      taxable: '46.17',
      tax: '3.17',
      total: '506.34',
    },
    likely: {
      labour: '487.50',
      parts: '46.17',
      outside: '132.00',
      subtotal: '665.67',
      taxable: '46.17',
      tax: '3.17',
      total: '668.84',
    },
    high: {
      labour: '780.00',
      parts: '46.17',
      outside: '132.00',
      subtotal: '958.17',
      taxable: '46.17',
      tax: '3.17',
      total: '961.34',
    },
    deposit: '267.54',
    stages: [
      { stage: 'intake', hours: '1.50', subtotal: '97.50' },
      { stage: 'power', hours: '6.00', subtotal: '436.17' },
      { stage: 'speaker', hours: '0.00', subtotal: '132.00' },
    ],
  },
  verdict: {
    asFound: '140.00',
    asRestored: '950.00',
    uplift: '810.00',
    cost: { low: '506.34', likely: '668.84', high: '961.34' },
    gap: { atLow: '303.66', atLikely: '141.16', atHigh: '-151.34' },
    words: 'At the likely cost the work adds more than it costs; at high hours it does not.',
    basis: 'Worths on record and estimate E-0142.',
  },
};

export const PREPARED = { preparedBy: { name: 'Rui Restorer', role: 'restorer' }, preparedOn: '2026-09-15' } as const;

export const appraisalSheet = (changes: Partial<Parameters<typeof buildAppraisalSheet>[0]> = {}) =>
  buildAppraisalSheet({
    set: SET,
    restated: RESTATED,
    estimate: ESTIMATE,
    practice: PRACTICE,
    ...PREPARED,
    ...changes,
  });

export const restorationEstimate = (changes: Partial<EstimateForPaper> = {}) =>
  buildRestorationEstimate({ estimate: { ...ESTIMATE, ...changes }, practice: PRACTICE, ...PREPARED });

/** Every amount written in a text, each once. */
export const amountsIn = (text: string): string[] => [...new Set(text.match(/[−+]?\$[\d,]*\d(?:\.\d\d)?/g))];
