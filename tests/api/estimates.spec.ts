import * as fc from 'fast-check';
import type TestAgent from 'supertest/lib/agent';
import { startTestApp, type TestApp } from '../support/harness';

const SET = {
  kind: 'radio',
  maker: 'Halloway',
  model: '41-X',
  description: '',
  chassis: '',
  serial: '',
  year: 1941,
  ownerId: null,
  priceWhenNew: { amount: '169.95', currency: 'USD', period: '1941', source: 'Dealer sheet' },
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: '',
  hazards: [],
};
const LABOUR = {
  kind: 'labour',
  stage: 'signal',
  description: 'Replace capacitors',
  hours: { low: '3.5', likely: '4.5', high: '6.5' },
  rate: '68.00',
};
const PART = {
  kind: 'part',
  stage: 'signal',
  description: 'Capacitors',
  quantity: '22',
  unitCost: '1.85',
  markupPercent: '30',
};
const OUTSIDE = { kind: 'outside', stage: 'speaker', description: 'Recone', quote: '150.00', markupPercent: '10' };

let app: TestApp;
let restorer: TestAgent;
let setId: number;
beforeAll(async () => {
  app = await startTestApp();
  restorer = await app.agentAs('restorer');
  const administrator = await app.agentAs('administrator');
  const { body: practice } = await administrator.get('/api/practice');
  await administrator
    .put('/api/practice')
    .send({ ...practice, labourRate: '68.00', taxTreatment: 'parts', taxRatePercent: '6.875', taxNote: 'State rule' })
    .expect(200);
  setId = (await restorer.post('/api/sets').send(SET).expect(201)).body.id;
});
afterAll(() => app.close());

const begin = async () =>
  (await restorer.post(`/api/sets/${setId}/estimates`).send({ title: 'Full electrical' }).expect(201)).body;
const add = async (id: number, content: object, afterLineId: number | null = null) =>
  (await restorer.post(`/api/estimates/${id}/lines`).send({ content, afterLineId }).expect(201)).body;

test('begins with the practice’s rates and taxes, and keeps them when the practice changes', async () => {
  const estimate = await begin();
  expect(estimate).toMatchObject({
    number: expect.stringMatching(/^E-\d{4}$/),
    taxTreatment: 'parts',
    taxRatePercent: '6.875',
    taxNote: 'State rule',
    depositPercent: '40',
    defaults: { labourRate: '68.00', partsMarkupPercent: '30' },
    preparedBy: 'Rui Restorer',
    preparedByRole: 'restorer',
    lines: [],
    totals: { likely: { total: '0.00' } },
    verdict: null,
  });
  const administrator = await app.agentAs('administrator');
  const { body: practice } = await administrator.get('/api/practice');
  await administrator
    .put('/api/practice')
    .send({ ...practice, labourRate: '99.00' })
    .expect(200);
  expect((await restorer.get(`/api/estimates/${estimate.id}`)).body.defaults.labourRate).toBe('68.00');
  await administrator
    .put('/api/practice')
    .send({ ...practice, version: practice.version + 1 })
    .expect(200);
});

test('adds up by stage and kind, with tax on the parts and the deposit on the total', async () => {
  const { id } = await begin();
  await add(id, LABOUR);
  await add(id, PART);
  const { estimate } = await add(id, OUTSIDE);
  // 4.5 × 68 = 306.00; 22 × 1.85 × 1.3 = 52.91; 150 × 1.1 = 165.00; tax 52.91 × 6.875 % = 3.6375… → 3.64
  expect(estimate.totals).toMatchObject({
    hours: { low: '3.50', likely: '4.50', high: '6.50' },
    likely: {
      labour: '306.00',
      parts: '52.91',
      outside: '165.00',
      subtotal: '523.91',
      taxable: '52.91',
      tax: '3.64',
      total: '527.55',
    },
    low: { total: '459.55' },
    high: { total: '663.55' },
    deposit: '211.02',
    stages: [
      { stage: 'signal', hours: '4.50', subtotal: '358.91' },
      { stage: 'speaker', hours: '0.00', subtotal: '165.00' },
    ],
  });
  expect(estimate.lines.map((l: { net: string }) => l.net)).toEqual(['306.00', '52.91', '165.00']);
});

test('sets cost against worth once both worths are on record', async () => {
  const { id } = await begin();
  await add(id, LABOUR);
  const worth = (kind: string, amount: string) => ({
    kind,
    amount,
    low: null,
    high: null,
    currency: 'USD',
    valueType: 'fair-market',
    effectiveOn: '2026-04-09',
    saidBy: 'Ana Appraiser',
    basis: 'Three sales',
  });
  await restorer.post(`/api/sets/${setId}/worths`).send(worth('as-found', '650.00')).expect(201);
  expect((await restorer.get(`/api/estimates/${id}`)).body.verdict).toBeNull();
  await restorer.post(`/api/sets/${setId}/worths`).send(worth('as-restored', '1000.00')).expect(201);
  const { verdict } = (await restorer.get(`/api/estimates/${id}`)).body;
  expect(verdict).toMatchObject({
    asFound: '650.00',
    asRestored: '1000.00',
    uplift: '350.00',
    cost: { low: '238.00', likely: '306.00', high: '442.00' },
    gap: { atLow: '112.00', atLikely: '44.00', atHigh: '-92.00' },
  });
  expect(verdict.words).toContain('$44 more than it costs');
  expect(verdict.words).toContain('$92 more than it adds');
  expect(verdict.basis).toContain('Ana Appraiser, 9 Apr 2026');
  const { items } = (await restorer.get('/api/estimates?sort=number')).body;
  expect(items.find((e: { id: number }) => e.id === id)).toMatchObject({
    gap: '44.00',
    total: { amount: '306.00' },
    setName: 'Halloway 41-X',
  });
});

test('two people edit at once: the later one is told, and nothing is overwritten', async () => {
  const { id } = await begin();
  const { lineId, estimate } = await add(id, LABOUR);
  const { version } = estimate.lines[0];
  const other = await app.agentAs('administrator');
  const address = `/api/estimates/${id}/lines/${lineId}`;
  await other
    .put(address)
    .send({ content: { ...LABOUR, description: 'Theirs' }, version })
    .expect(200);
  const late = await restorer
    .put(address)
    .send({ content: { ...LABOUR, description: 'Mine' }, version })
    .expect(409);
  expect(late.body).toMatchObject({
    type: '/problems/edit-conflict',
    current: { content: { description: 'Theirs' }, version: version + 1 },
  });
  expect((await restorer.get(`/api/estimates/${id}`)).body.lines[0].content.description).toBe('Theirs');
  await restorer.delete(`${address}?version=${version}`).expect(409);
  await restorer
    .put(address)
    .send({ content: { ...LABOUR, description: 'Mine' }, version: version + 1 })
    .expect(200);
  await restorer.delete(`${address}?version=${version + 2}`).expect(200);
  await restorer
    .put(address)
    .send({ content: LABOUR, version: version + 2 })
    .expect(404);
});

test('two lines edited at once do not disturb each other', async () => {
  const { id } = await begin();
  const one = await add(id, LABOUR);
  const two = await add(id, PART);
  const [first, second] = await Promise.all([
    restorer
      .put(`/api/estimates/${id}/lines/${one.lineId}`)
      .send({ content: { ...LABOUR, description: 'One' }, version: 1 }),
    (await app.agentAs('administrator'))
      .put(`/api/estimates/${id}/lines/${two.lineId}`)
      .send({ content: { ...PART, description: 'Two' }, version: 1 }),
  ]);
  expect([first?.status, second?.status]).toEqual([200, 200]);
  const { lines } = (await restorer.get(`/api/estimates/${id}`)).body;
  expect(lines.map((l: { content: { description: string } }) => l.content.description)).toEqual(['One', 'Two']);
});

test('the settings too tell the later one', async () => {
  const { id, title, taxTreatment, taxRatePercent, taxNote, depositPercent, notes, version } = await begin();
  const settings = { title, taxTreatment, taxRatePercent, taxNote, depositPercent, notes, version };
  await restorer
    .put(`/api/estimates/${id}`)
    .send({ ...settings, depositPercent: '50' })
    .expect(200);
  const late = await restorer
    .put(`/api/estimates/${id}`)
    .send({ ...settings, title: 'Late' })
    .expect(409);
  expect(late.body.current).toMatchObject({ depositPercent: '50', title: 'Full electrical' });
});

test('lines keep the order they are given, within their stage', async () => {
  const { id } = await begin();
  const named = (description: string, stage = 'signal') => ({ ...LABOUR, description, stage });
  const a = await add(id, named('a'));
  const b = await add(id, named('b'));
  await add(id, named('c'));
  await add(id, named('first', 'intake'));
  const order = async () =>
    (await restorer.get(`/api/estimates/${id}`)).body.lines
      .map((l: { content: { description: string } }) => l.content.description)
      .join(' ');
  expect(await order()).toBe('first a b c');
  await add(id, named('a+'), a.lineId);
  expect(await order()).toBe('first a a+ b c');
  await restorer.put(`/api/estimates/${id}/lines/${b.lineId}/place`).send({ afterLineId: null }).expect(200);
  expect(await order()).toBe('first b a a+ c');
  await restorer.put(`/api/estimates/${id}/lines/${a.lineId}/place`).send({ afterLineId: 999_999 }).expect(400);
  await restorer
    .put(`/api/estimates/${id}/lines/${b.lineId}`)
    .send({ content: named('b', 'intake'), version: 1 })
    .expect(200);
  expect(await order()).toBe('first b a a+ c');
  await restorer
    .put(`/api/estimates/${id}/lines/${a.lineId}`)
    .send({ content: named('a', 'intake'), version: 1 })
    .expect(200);
  expect(await order()).toBe('first b a a+ c');
  await add(id, named('last', 'intake'));
  expect(await order()).toBe('first b a last a+ c');
});

test('a line is reached only through its own estimate', async () => {
  const [own, other] = [await begin(), await begin()];
  const { lineId } = await add(own.id, PART);
  const astray = `/api/estimates/${other.id}/lines/${lineId}`;
  await restorer.put(astray).send({ content: LABOUR, version: 1 }).expect(404);
  await restorer.put(`${astray}/place`).send({ afterLineId: null }).expect(404);
  await restorer.delete(`${astray}?version=1`).expect(404);
  expect((await restorer.get(`/api/estimates/${own.id}`)).body.lines).toMatchObject([{ version: 1, content: PART }]);
});

test('every change of a line moves the estimate’s date of change', async () => {
  const { id, updatedAt } = await begin();
  const seen = [updatedAt];
  const after = (body: { updatedAt: string }) => seen.push(body.updatedAt);
  const tick = () => (app.clock.now += 1000);
  tick();
  const { lineId, estimate } = await add(id, PART);
  after(estimate);
  const line = `/api/estimates/${id}/lines/${lineId}`;
  tick();
  after((await restorer.put(line).send({ content: LABOUR, version: 1 }).expect(200)).body);
  tick();
  after((await restorer.put(`${line}/place`).send({ afterLineId: null }).expect(200)).body);
  tick();
  after((await restorer.delete(`${line}?version=2`).expect(200)).body);
  expect(new Set(seen).size).toBe(5);
});

test('archiving takes it off the list and back', async () => {
  const { id } = await begin();
  const listed = async (query: string) =>
    (await restorer.get(`/api/estimates?${query}`)).body.items.some((e: { id: number }) => e.id === id);
  await restorer.put(`/api/estimates/${id}/archived`).send({ archived: true }).expect(200);
  expect([await listed('pageSize=200'), await listed('state=archived&pageSize=200')]).toEqual([false, true]);
  await restorer.put(`/api/estimates/${id}/archived`).send({ archived: false }).expect(200);
  expect(await listed(`q=e-${id}`)).toBe(true);
});

test('the list is sorted, paged and searched by what it shows', async () => {
  const named = async (model: string, title: string, quote: string) => {
    const set = (
      await restorer
        .post('/api/sets')
        .send({ ...SET, maker: 'Lyndmoor', model })
        .expect(201)
    ).body;
    const { id } = (await restorer.post(`/api/sets/${set.id}/estimates`).send({ title }).expect(201)).body;
    await add(id, { ...OUTSIDE, quote, markupPercent: '0' });
    app.clock.now += 1000;
  };
  await named('Bravo', 'Réglage complet', '90.00');
  await named('alpha', 'Cabinet only', '1000.00');
  await named('Charlie', 'Cabinet and 100 % of the wiring', '200.00');
  const titles = async (query: string) => {
    const { items, total } = (await restorer.get(`/api/estimates?${query}`).expect(200)).body;
    return [total, ...items.map(({ setName }: { setName: string }) => setName.replace('Lyndmoor ', ''))];
  };
  expect(await titles('q=lyndmoor&sort=-updated')).toEqual([3, 'Charlie', 'alpha', 'Bravo']);
  expect(await titles('q=lyndmoor&sort=-total')).toEqual([3, 'alpha', 'Charlie', 'Bravo']);
  expect(await titles('q=lyndmoor&sort=set')).toEqual([3, 'alpha', 'Bravo', 'Charlie']);
  expect(await titles('q=lyndmoor&sort=number')).toEqual([3, 'Bravo', 'alpha', 'Charlie']);
  expect(await titles('q=lyndmoor&sort=number&pageSize=2&page=2')).toEqual([3, 'Charlie']);
  expect(await titles('q=REGLAGE')).toEqual([1, 'Bravo']);
  expect(await titles('q=cabinet+lyndmoor+only')).toEqual([1, 'alpha']);
  expect(await titles('q=%25+lyndmoor')).toEqual([1, 'Charlie']); // a percent sign is itself, not a wildcard
  await restorer.get('/api/estimates?sort=gap').expect(400);
});

describe('bad input names the field', () => {
  let id: number;
  beforeAll(async () => (id = (await begin()).id));

  test.each([
    [{ ...LABOUR, rate: '1e3' }, 'content.rate'],
    [{ ...LABOUR, rate: null }, 'content.rate'],
    [{ ...LABOUR, rate: '' }, 'content.rate'],
    [{ ...LABOUR, rate: [] }, 'content.rate'],
    [{ ...LABOUR, rate: 68 }, 'content.rate'],
    [{ ...LABOUR, rate: '68.005' }, 'content.rate'],
    [{ ...LABOUR, hours: { low: '5', likely: '4', high: '6' } }, 'content.hours.likely'],
    [{ ...LABOUR, hours: { low: '1', likely: '4', high: '3' } }, 'content.hours.high'],
    [{ ...LABOUR, hours: { low: '-1', likely: '4', high: '6' } }, 'content.hours.low'],
    [{ ...LABOUR, stage: 'elsewhere' }, 'content.stage'],
    [{ ...LABOUR, description: '   ' }, 'content.description'],
    [{ ...PART, quantity: '1.2345' }, 'content.quantity'],
    [{ ...PART, unitCost: '1234567890' }, 'content.unitCost'],
    [{ ...PART, markupPercent: '-5' }, 'content.markupPercent'],
    [{ ...OUTSIDE, quote: 'NaN' }, 'content.quote'],
    [{ kind: 'other' }, 'content.kind'],
  ])('%j: %s', async (content, field) => {
    const { body } = await restorer.post(`/api/estimates/${id}/lines`).send({ content, afterLineId: null }).expect(400);
    expect(body.fields.map((f: { field: string }) => f.field)).toContain(field);
    expect(body.fields[0].message.length).toBeGreaterThan(5);
    expect((await restorer.get(`/api/estimates/${id}`)).body.lines).toEqual([]);
  });

  test('whatever is sent, nothing answers 5xx', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.object({ key: fc.constantFrom('kind', 'hours', 'rate', 'quote', 'stage', 'low', 'x'), maxDepth: 3 }),
        async (content) => {
          const { status } = await restorer.post(`/api/estimates/${id}/lines`).send({ content, afterLineId: null });
          expect(status).toBe(400);
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe('the largest amounts', () => {
  const largest = { ...OUTSIDE, quote: '999999999.99', markupPercent: '0' };

  test.each([
    [{ ...LABOUR, hours: { low: '1', likely: '1', high: '9999.99' }, rate: '999999999.99' }, 'content.rate'],
    [{ ...PART, quantity: '999999.999', unitCost: '999999999.9999', markupPercent: '999' }, 'content.unitCost'],
    [{ ...largest, markupPercent: '0.0001' }, 'content.quote'],
  ])('%j comes to too much: %s', async (content, field) => {
    const { id } = await begin();
    const { body } = await restorer.post(`/api/estimates/${id}/lines`).send({ content, afterLineId: null }).expect(400);
    expect(body.fields.map((f: { field: string }) => f.field)).toEqual([field]);
    expect((await restorer.get(`/api/estimates/${id}`)).status).toBe(200);
  });

  test('add up exactly, at the highest tax', async () => {
    const { id } = await begin();
    await add(id, largest);
    const { estimate } = await add(id, { ...largest, stage: 'return' });
    expect(estimate.totals.likely.subtotal).toBe('1999999999.98');
    const { title, taxNote, depositPercent, notes, version } = estimate;
    const { body } = await restorer
      .put(`/api/estimates/${id}`)
      .send({ title, taxNote, depositPercent, notes, version, taxTreatment: 'both', taxRatePercent: '999.9999' })
      .expect(200);
    // 1999999999.98 × 9.999999 = 19999997999.79800002
    expect(body.totals.likely).toMatchObject({ tax: '19999997999.80', total: '21999997999.78' });
  });

  test('an estimate has a thousand lines at most', async () => {
    const { id } = await begin();
    const { lineId } = await add(id, PART);
    const { sqlite } = app.database;
    const others = sqlite.pragma('table_info(estimate_lines)') as { name: string }[];
    const columns = others.map(({ name }) => name).filter((name) => name !== 'id');
    sqlite
      .prepare(
        `with recursive n(i) as (select 1 union all select i + 1 from n where i < 998)
         insert into estimate_lines (${columns.join()}) select ${columns.join()} from estimate_lines, n where id = ?`,
      )
      .run(lineId);
    const { lineId: last, estimate } = await add(id, PART);
    expect(estimate.lines).toHaveLength(1000);
    const send = () => restorer.post(`/api/estimates/${id}/lines`).send({ content: PART, afterLineId: null });
    expect((await send().expect(400)).body.fields[0]).toMatchObject({ field: 'content' });
    await restorer.delete(`/api/estimates/${id}/lines/${last}?version=1`).expect(200);
    await send().expect(201);
  });
});
