import { spawnSync } from 'node:child_process';
import type TestAgent from 'supertest/lib/agent';
import type { EstimateDetail } from '../../src/contracts/estimates';
import type { Paper } from '../../src/domain/documents/paper';
import { formatMoney } from '../../src/domain/money/money';
import { startTestApp, type TestApp } from '../support/harness';
import { amountsIn } from '../support/papers';
import { hasTool, pdfText } from '../support/pdf-text';

let test: TestApp;
let restorer: TestAgent;
let collector: TestAgent;
/** A set of the collector's with both worths and an estimate, and somebody else's with nothing but a name. */
let setId: number;
let estimate: EstimateDetail;
let bareSetId: number;

const SET = {
  kind: 'radio',
  maker: 'Corvane',
  model: '9-T',
  description: '',
  chassis: '',
  serial: '40218',
  year: 1938,
  ownerId: null as number | null,
  priceWhenNew: { amount: '39.95', currency: 'USD', period: '1938', source: 'Maker’s price list' } as unknown,
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: 'A note for the bench alone.',
  hazards: [{ hazard: 'high-voltage', volts: 385, note: '' }],
};
const WORTH = {
  currency: 'USD',
  valueType: 'fair-market',
  effectiveOn: '2026-09-01',
  saidBy: 'Ana',
  basis: 'Two sales.',
};
const LINES = [
  {
    kind: 'labour',
    stage: 'power',
    description: 'Rewire the power supply',
    hours: { low: '4', likely: '6.5', high: '10' },
    rate: '65.00',
  },
  { kind: 'part', stage: 'power', description: 'Filters', quantity: '3', unitCost: '11.405', markupPercent: '35' },
  { kind: 'outside', stage: 'speaker', description: 'Recone', quote: '120.00', markupPercent: '10' },
];

async function registered(set: object): Promise<number> {
  const { body } = (await restorer.post('/api/sets').send(set).expect(201)) as { body: { id: number } };
  return body.id;
}

beforeAll(async () => {
  test = await startTestApp();
  restorer = await test.agentAs('restorer');
  collector = await test.agentAs('collector');
  const owner = (await restorer
    .post('/api/owners')
    .send({ name: 'Cal Collector', email: 'collector@test.example', phone: '' })
    .expect(201)) as { body: { id: number } };
  setId = await registered({ ...SET, ownerId: owner.body.id });
  bareSetId = await registered({ ...SET, model: 'Nameplate', priceWhenNew: null, year: null, serial: '' });
  for (const worth of [
    { kind: 'as-found', amount: '140.00', low: null, high: null },
    { kind: 'as-restored', amount: '950.00', low: '850.00', high: '1100.00' },
  ])
    await restorer
      .post(`/api/sets/${setId}/worths`)
      .send({ ...WORTH, ...worth })
      .expect(201);
  const begun = (await restorer
    .post(`/api/sets/${setId}/estimates`)
    .send({ title: 'Rewire and recap' })
    .expect(201)) as {
    body: EstimateDetail;
  };
  for (const content of LINES)
    await restorer.post(`/api/estimates/${begun.body.id}/lines`).send({ content, afterLineId: null }).expect(201);
  const settings = {
    title: begun.body.title,
    taxTreatment: 'parts',
    taxRatePercent: '6.875',
    taxNote: 'A rule for tests.',
    depositPercent: '40',
    notes: 'Work begins when the deposit is in.',
  };
  const current = (await restorer.get(`/api/estimates/${begun.body.id}`).expect(200)) as { body: EstimateDetail };
  const changed = await restorer
    .put(`/api/estimates/${begun.body.id}`)
    .send({ ...settings, version: current.body.version })
    .expect(200);
  estimate = changed.body as EstimateDetail;
});
afterAll(() => test.close());

const sheet = (query = '') => `/api/sets/${setId}/appraisal-sheet${query}`;
const ofEstimate = (ending = '') => `/api/estimates/${estimate.id}/restoration-estimate${ending}`;
const paperAt = async (agent: TestAgent, address: string) =>
  ((await agent.get(address).expect(200)) as { body: Paper }).body;
const fileAt = async (agent: TestAgent, address: string) => {
  const reply = await agent.get(address).responseType('blob').expect(200).expect('Content-Type', 'application/pdf');
  return { bytes: reply.body as Buffer, disposition: reply.headers['content-disposition'] as string };
};

describe('the appraisal sheet', () => {
  it('says who prepared it and in what capacity, and that it is a working sheet', async () => {
    const paper = await paperAt(restorer, sheet());
    expect(paper.reference).toMatch(/^S-\d{4}$/);
    expect(paper.preparedBy).toEqual({ name: 'Rui Restorer', capacity: 'restorer, Test Set Works' });
    expect(paper.preparedOn).toBe('2026-09-15');
    expect(paper.standing).toMatch(/not an appraisal report/i);
  });

  it('restates the price with the published figures, both bands and the basis line', async () => {
    const paper = await paperAt(restorer, sheet());
    const published = (
      (await restorer.get('/api/restatements?series=us-cpi-u&amount=39.95&from=1938').expect(200)) as {
        body: { restated: { amount: string }; bands: Record<string, { low: string; high: string }>; basis: string };
      }
    ).body;
    const text = JSON.stringify(paper);
    const { rounding, withinYear } = published.bands;
    for (const amount of [published.restated.amount, rounding?.low, rounding?.high, withinYear?.low, withinYear?.high])
      expect(text).toContain(formatMoney(amount ?? '', 'USD'));
    expect(text).toContain(published.basis);
    expect(text).toContain('It is not what the set is worth.');
    expect(paper.yearScale?.curve.length).toBeGreaterThan(100);
  });

  it('carries the estimate’s total and verdict, the newest or the one named', async () => {
    const paper = await paperAt(restorer, sheet());
    expect(JSON.stringify(paper)).toContain(formatMoney(estimate.totals.likely.total, 'USD'));
    expect(paper.costAgainstWorth?.sentence).toBe(estimate.verdict?.words);
    expect(await paperAt(restorer, sheet(`?estimateId=${estimate.id}`))).toEqual(paper);
  });

  it('refuses an estimate of another set', async () => {
    await restorer.get(`/api/sets/${bareSetId}/appraisal-sheet?estimateId=${estimate.id}`).expect(404);
  });

  it('keeps the bench’s notes to the bench', async () => {
    expect(JSON.stringify(await paperAt(restorer, sheet()))).not.toContain(SET.notes);
  });

  it('of a set with nothing on record has words for amounts', async () => {
    const paper = await paperAt(restorer, `/api/sets/${bareSetId}/appraisal-sheet`);
    expect(paper.figures.map((figure) => figure.weight)).toEqual(['words', 'words', 'words', 'words']);
    await fileAt(restorer, `/api/sets/${bareSetId}/appraisal-sheet.pdf`);
  });
});

describe('the restoration estimate', () => {
  it('has the estimate’s own figures to the cent', async () => {
    const paper = await paperAt(restorer, ofEstimate());
    const text = JSON.stringify(paper);
    const { likely, low, high, deposit } = estimate.totals;
    for (const sums of [likely, low, high])
      for (const amount of [sums.labour, sums.subtotal, sums.tax, sums.total])
        expect(text).toContain(`"${formatMoney(amount, 'USD')}"`);
    expect(text).toContain(formatMoney(deposit, 'USD'));
    for (const line of estimate.lines) expect(text).toContain(`"${formatMoney(line.net, 'USD')}"`);
    expect(text).toContain('Tax at 6.875%');
    expect(text).toContain('A rule for tests.');
    expect(paper.preparedBy).toEqual({ name: 'Rui Restorer', capacity: 'restorer, Test Set Works' });
  });
});

describe('who may have a document', () => {
  it('nobody without a session', async () => {
    for (const address of [sheet(), sheet().concat('.pdf'), ofEstimate(), ofEstimate('.pdf')])
      await test.anyone().get(address).expect(401);
  });

  it('a collector gets those of their own sets, prepared by the practice, and no other', async () => {
    const paper = await paperAt(collector, sheet());
    expect(paper.preparedBy).toEqual({ name: 'Test Set Works', capacity: 'from the practice’s records' });
    await paperAt(collector, ofEstimate());
    await fileAt(collector, ofEstimate('.pdf'));
    await collector.get(`/api/sets/${bareSetId}/appraisal-sheet`).expect(404);
    await collector.get(`/api/sets/${bareSetId}/appraisal-sheet.pdf`).expect(404);
  });

  it('none that is not there, and no odd paper', async () => {
    await restorer.get('/api/sets/999/appraisal-sheet.pdf').expect(404);
    await restorer.get('/api/estimates/999/restoration-estimate').expect(404);
    await restorer.get(`${sheet()}.pdf?paper=folio`).expect(400);
  });
});

it('a file is to be saved under the number and kind of the document', async () => {
  const { disposition } = await fileAt(restorer, ofEstimate('.pdf'));
  expect(disposition).toBe(`attachment; filename="${estimate.number} restoration estimate.pdf"`);
});

const poppler = hasTool('pdftotext');
(poppler ? describe : describe.skip)(poppler ? 'as PDF' : 'as PDF: skipped, poppler-utils is not installed', () => {
  const tell = (tool: string, pdf: Buffer) => spawnSync(tool, ['-'], { input: pdf, encoding: 'utf8' }).stdout;

  it.each(['letter', 'a4'])('on %s every amount of the page is in the text, in Lato', async (paper) => {
    for (const address of [sheet(), ofEstimate()]) {
      const page = await paperAt(restorer, address);
      const { bytes } = await fileAt(restorer, `${address}.pdf?paper=${paper}`);
      const amounts = amountsIn(JSON.stringify(page));
      expect(amounts.length).toBeGreaterThan(10);
      expect(amountsIn(pdfText(bytes))).toEqual(expect.arrayContaining(amounts));
      const fonts = tell('pdffonts', bytes).trim().split('\n').slice(2);
      expect(fonts.every((font) => /\+Lato-\w+ .*yes yes yes/.test(font))).toBe(true);
      expect(tell('pdfinfo', bytes)).toMatch(paper === 'a4' ? /595\.28 x 841\.89/ : /612 x 792/);
    }
  });

  it('comes on the practice’s own paper where none is named', async () => {
    const { bytes } = await fileAt(restorer, sheet('.pdf'));
    expect(tell('pdfinfo', bytes)).toMatch(/612 x 792/);
  });
});
