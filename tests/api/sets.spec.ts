import * as fc from 'fast-check';
import type { Test } from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import { SET } from '../support/a-set';
import { startTestApp, type TestApp } from '../support/harness';

const WORTH = {
  kind: 'as-found',
  amount: '650.00',
  low: '550.00',
  high: '750.00',
  currency: 'USD',
  valueType: 'fair-market',
  effectiveOn: '2026-04-09',
  saidBy: 'Ana Appraiser',
  basis: 'Three private sales',
};

let app: TestApp;
let restorer: TestAgent;
beforeAll(async () => {
  app = await startTestApp();
  restorer = await app.agentAs('restorer');
});
afterAll(() => app.close());
const register = async (part: object = {}) =>
  (
    await restorer
      .post('/api/sets')
      .send({ ...SET, ...part })
      .expect(201)
  ).body;

describe('registering', () => {
  test('answers the set with its price in the newest published money', async () => {
    const set = await register();
    expect(set).toMatchObject({
      ...SET,
      number: expect.stringMatching(/^S-\d{4}$/),
      version: 1,
      archived: false,
      ownerName: null,
    });
    expect(set.restated).toMatchObject({
      known: true,
      series: 'us-cpi-u',
      from: { period: '1941', index: '14.7' },
      rounding: expect.any(Object),
      withinYear: expect.any(Object),
    });
    const direct = (await app.anyone().get('/api/restatements?series=us-cpi-u&amount=169.95&from=1941')).body;
    expect(set.restated.restated).toEqual(direct.restated);
    expect(set.restated.to).toEqual(direct.to);
  });

  test('a price the index cannot restate says why and names the neighbours', async () => {
    const set = await register({ priceWhenNew: { ...SET.priceWhenNew, period: '1911' } });
    expect(set.restated).toEqual({ known: false, reason: expect.stringContaining('1911'), neighbours: ['1913'] });
    expect((await register({ priceWhenNew: null })).restated).toBeNull();
  });

  test.each([
    ['kind', { kind: 'toaster' }, 'kind'],
    ['maker', { maker: ' ' }, 'maker'],
    ['year', { year: 1492 }, 'year'],
    ['year', { year: '1941' }, 'year'],
    ['price', { priceWhenNew: { ...SET.priceWhenNew, amount: '169,95' } }, 'priceWhenNew.amount'],
    ['price', { priceWhenNew: { ...SET.priceWhenNew, amount: '-1' } }, 'priceWhenNew.amount'],
    ['price', { priceWhenNew: { ...SET.priceWhenNew, period: '1941-13' } }, 'priceWhenNew.period'],
    ['price without source', { priceWhenNew: { ...SET.priceWhenNew, source: '' } }, 'priceWhenNew.source'],
    ['currency', { priceWhenNew: { ...SET.priceWhenNew, currency: 'GBP' } }, 'priceWhenNew.currency'],
    ['hazard twice', { hazards: [SET.hazards[0], SET.hazards[0]] }, 'hazards'],
    ['volts', { hazards: [{ hazard: 'high-voltage', volts: 0, note: '' }] }, 'hazards.0.volts'],
    ['owner', { ownerId: 424_242 }, 'ownerId'],
    ['notes', { notes: 'x'.repeat(5000) }, 'notes'],
    ['control characters', { maker: 'Hal\u0000loway' }, 'maker'],
  ])('%s that cannot be used is named', async (_what, part, field) => {
    const before = (await restorer.get('/api/sets?state=all')).body.total;
    const { body } = await restorer
      .post('/api/sets')
      .send({ ...SET, ...part })
      .expect(400);
    expect(body.fields.map((f: { field: string }) => f.field)).toContain(field);
    expect((await restorer.get('/api/sets?state=all')).body.total).toBe(before);
  });
});

describe('whatever is sent, nothing answers 5xx', () => {
  /** Text as JSON for the body; undefined for what JSON cannot carry, which is never sent. */
  const asJson = (value: unknown): string | undefined => {
    try {
      return JSON.stringify(value, (_key, part: unknown) => (typeof part === 'bigint' ? String(part) : part));
    } catch {
      return undefined;
    }
  };
  const odd = (fields: readonly string[]) =>
    fc.record(Object.fromEntries(fields.map((field) => [field, fc.anything()])), { requiredKeys: [] });
  const never5xx = (method: 'post' | 'put', address: () => string, whole: object, fields: readonly string[]) =>
    fc.assert(
      fc.asyncProperty(fc.oneof(odd(fields), fc.anything()), async (part) => {
        const body = asJson(typeof part === 'object' && part !== null ? { ...whole, ...part } : part);
        if (body === undefined) return;
        const { status } = await restorer[method](address()).type('json').send(body);
        expect([200, 201, 400, 409]).toContain(status);
      }),
      { numRuns: 60 },
    );
  let id: number;
  beforeAll(async () => (id = (await register()).id));

  test('to registering', () => never5xx('post', () => '/api/sets', SET, Object.keys(SET)));
  test('to changing', () =>
    never5xx('put', () => `/api/sets/${id}`, { ...SET, version: 1 }, [...Object.keys(SET), 'version']));
  test('to condition', () =>
    never5xx('post', () => `/api/sets/${id}/condition`, { notedOn: '2026-04-09' }, ['notedOn', 'entries']));
  test('to worth', () => never5xx('post', () => `/api/sets/${id}/worths`, WORTH, Object.keys(WORTH)));
  test('to the order of photographs', () => never5xx('put', () => `/api/sets/${id}/photos`, {}, ['photoIds']));

  test('to half a surrogate pair', async () => {
    const body = JSON.stringify({ ...SET, serial: 'HALF' }).replace('HALF', '\\ud83d');
    await restorer.post('/api/sets').type('json').send(body).expect(201);
  });
});

describe('changing', () => {
  test('a late change is told what stands, and nothing is overwritten', async () => {
    const { id, version } = await register();
    const other = await app.agentAs('appraiser');
    await other
      .put(`/api/sets/${id}`)
      .send({ ...SET, serial: 'THEIRS', version })
      .expect(200);
    const late = await restorer
      .put(`/api/sets/${id}`)
      .send({ ...SET, serial: 'MINE', version })
      .expect(409);
    expect(late.body).toMatchObject({
      type: '/problems/edit-conflict',
      current: { serial: 'THEIRS', version: version + 1 },
    });
    expect((await restorer.get(`/api/sets/${id}`)).body.serial).toBe('THEIRS');
  });

  test('hazards are replaced as a whole', async () => {
    const { id, version } = await register();
    const hazards = [{ hazard: 'hot-chassis', volts: null, note: '' }];
    expect(
      (
        await restorer
          .put(`/api/sets/${id}`)
          .send({ ...SET, hazards, version })
          .expect(200)
      ).body.hazards,
    ).toEqual(hazards);
  });

  test('an archived set leaves the list and comes back', async () => {
    const { id } = await register({ model: 'To archive' });
    const found = async (state: string) => (await restorer.get(`/api/sets?q=archive&state=${state}`)).body.total;
    await restorer.put(`/api/sets/${id}/archived`).send({ archived: true }).expect(200);
    expect([await found('active'), await found('archived'), await found('all')]).toEqual([0, 1, 1]);
    await restorer.put(`/api/sets/${id}/archived`).send({ archived: false }).expect(200);
    expect(await found('active')).toBe(1);
  });

  test('condition is kept with its date, the newest first; a day to come is refused', async () => {
    const { id } = await register();
    const entry = (grade: number) => [{ part: 'finish', grade, note: '' }];
    await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-04-09', entries: entry(2) })
      .expect(201);
    await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-09-01', entries: entry(4) })
      .expect(201);
    const { body } = await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2025-01-01', entries: entry(1) })
      .expect(201);
    expect(body.condition.map((c: { grade: number }) => c.grade)).toEqual([4, 2, 1]);
    const future = await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-12-24', entries: entry(3) })
      .expect(400);
    expect(future.body.fields[0]).toMatchObject({ field: 'notedOn', value: '2026-12-24' });
    await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-09-01', entries: entry(6) })
      .expect(400);
    await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-09-01', entries: [...entry(2), ...entry(3)] })
      .expect(400);
    await restorer
      .post(`/api/sets/${id}/condition`)
      .send({ notedOn: '2026-02-30', entries: entry(3) })
      .expect(400);
  });

  test('every change within it puts a set first', async () => {
    const { id, version } = await register();
    const steps: readonly (() => Test)[] = [
      () => restorer.put(`/api/sets/${id}`).send({ ...SET, version }),
      () => restorer.post(`/api/sets/${id}/worths`).send(WORTH),
      () =>
        restorer
          .post(`/api/sets/${id}/condition`)
          .send({ notedOn: '2026-04-09', entries: [{ part: 'finish', grade: 2, note: '' }] }),
      () => restorer.put(`/api/sets/${id}/archived`).send({ archived: false }),
    ];
    for (const step of steps) {
      app.clock.now += 60_000;
      expect((await step()).body.updatedAt).toBe(new Date(app.clock.now).toISOString());
    }
    expect((await restorer.get('/api/sets?pageSize=1')).body.items[0].id).toBe(id);
  });

  test('a worth needs who says so and on what basis, and a range around the amount', async () => {
    const { id } = await register();
    const { body } = await restorer.post(`/api/sets/${id}/worths`).send(WORTH).expect(201);
    expect(body.worths[0]).toMatchObject({
      amount: { amount: '650.00', currency: 'USD' },
      saidBy: 'Ana Appraiser',
      recordedBy: 'Rui Restorer',
    });
    for (const [part, field] of [
      [{ saidBy: '' }, 'saidBy'],
      [{ basis: ' ' }, 'basis'],
      [{ low: '700' }, 'low'],
      [{ high: '600' }, 'high'],
    ] as const) {
      const bad = await restorer
        .post(`/api/sets/${id}/worths`)
        .send({ ...WORTH, ...part })
        .expect(400);
      expect(bad.body.fields[0].field).toBe(field);
    }
  });
});

describe('finding', () => {
  beforeAll(async () => {
    const owner = (await restorer.post('/api/owners').send({ name: 'Wren Okafor', email: '', phone: '' }).expect(201))
      .body;
    await register({ maker: 'Corvane', model: '5-T 100%_ table', serial: 'C-77', year: 1938, ownerId: owner.id });
    const elodie = (await restorer.post('/api/owners').send({ name: 'Élodie Łukowska', email: '', phone: '' })).body;
    await register({ maker: 'Brackwell', model: 'Of Élodie', ownerId: elodie.id });
    await register({ maker: 'Corvane', model: 'Nine', serial: 'C-78', year: 1936, kind: 'television' });
    await register({ maker: 'Corvane', model: 'Ten', serial: 'C-79', year: null, kind: 'amplifier' });
  });
  const names = async (query: string) =>
    (await restorer.get(`/api/sets?${query}`).expect(200)).body.items.map((s: { model: string }) => s.model);

  test('by every word, wherever it stands; signs of the search language are plain text', async () => {
    expect(await names('q=corvane+okafor')).toEqual(['5-T 100%_ table']);
    expect(await names('q=100%25_')).toEqual(['5-T 100%_ table']);
    expect(await names('q=c-7_')).toEqual([]);
    expect(await names('q=c-78')).toEqual(['Nine']);
  });

  test.each(['Łukowska', 'łukowska', 'lukowska', 'ELODIE'])('%s finds Élodie Łukowska’s set', async (q) => {
    expect(await names(`q=${encodeURIComponent(q)}`)).toEqual(['Of Élodie']);
  });

  test('by number, as it is written or without its zeros', async () => {
    const { id, number } = await register({ model: 'By number' });
    expect(await names(`q=${number}`)).toEqual(['By number']);
    expect(await names(`q=s-${id}`)).toEqual(['By number']);
    expect(await names(`q=halloway+${number}`)).toEqual(['By number']);
  });

  test('by filter, in an order, by pages', async () => {
    expect(await names('maker=Corvane&sort=year')).toEqual(['Nine', '5-T 100%_ table', 'Ten']);
    expect(await names('maker=Corvane&sort=-year')).toEqual(['5-T 100%_ table', 'Nine', 'Ten']);
    expect(await names('maker=Corvane&kind=television')).toEqual(['Nine']);
    expect(await names('maker=Corvane&sort=year&page=2&pageSize=2')).toEqual(['Ten']);
    const { body } = await restorer.get('/api/sets?maker=Corvane&pageSize=1');
    expect(body).toMatchObject({ total: 3, makers: expect.arrayContaining(['Brackwell', 'Corvane', 'Halloway']) });
  });

  test.each(['page=0', 'page=x', 'pageSize=100000', 'sort=price', 'kind=toaster', 'ownerId=-1', 'q=a&q=b'])(
    '%s answers 400',
    async (query) => {
      expect((await restorer.get(`/api/sets?${query}`)).status).toBe(400);
    },
  );
});

describe('prices for anyone', () => {
  test('show model, price and source; never owner, serial or number', async () => {
    await register({ maker: 'Penhallow', model: 'Coastguard', serial: 'SECRET-1', priceIsPublic: true });
    const { body } = await app.anyone().get('/api/list-prices').expect(200);
    expect(body.items).toEqual([
      expect.objectContaining({ maker: 'Penhallow', model: 'Coastguard', restated: expect.any(Object) }),
    ]);
    expect(JSON.stringify(body)).not.toMatch(/SECRET|owner|S-0/);
  });

  test('show a model and period once, as its last changed set says; never an archived set', async () => {
    const model = { maker: 'Lyndmoor', model: 'Harbour', priceIsPublic: true };
    await register({ ...model, priceWhenNew: { ...SET.priceWhenNew, source: 'An advertisement' } });
    app.clock.now += 60_000;
    const last = await register({ ...model, priceWhenNew: { ...SET.priceWhenNew, source: 'The maker’s catalogue' } });
    await register({ ...model, priceWhenNew: { ...SET.priceWhenNew, period: '1940' } });
    const shown = async () =>
      (await app.anyone().get('/api/list-prices')).body.items
        .filter((one: { maker: string }) => one.maker === 'Lyndmoor')
        .map(({ price }: { price: { period: string; source: string } }) => `${price.period} ${price.source}`);
    expect(await shown()).toEqual(['1940 Dealer sheet, 1941', '1941 The maker’s catalogue']);
    await restorer.put(`/api/sets/${last.id}/archived`).send({ archived: true }).expect(200);
    expect(await shown()).toEqual(['1940 Dealer sheet, 1941', '1941 An advertisement']);
  });
});
