import * as fc from 'fast-check';
import sharp from 'sharp';
import type TestAgent from 'supertest/lib/agent';
import { startTestApp, type TestApp } from '../support/harness';

const SET = {
  kind: 'radio',
  maker: 'Halloway',
  model: '41-X console',
  description: 'Eleven tubes',
  chassis: '',
  serial: '41X-20877',
  year: 1941,
  ownerId: null,
  priceWhenNew: { amount: '169.95', currency: 'USD', period: '1941', source: 'Dealer sheet, 1941' },
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: '',
  hazards: [{ hazard: 'high-voltage', volts: 385, note: 'Field coil' }],
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

  test('whatever is sent, nothing answers 5xx', async () => {
    const part = fc.record(
      {
        maker: fc.anything(),
        year: fc.anything(),
        hazards: fc.anything(),
        priceWhenNew: fc.anything(),
        ownerId: fc.anything(),
      },
      { requiredKeys: [] },
    );
    await fc.assert(
      fc.asyncProperty(part, async (odd) => {
        let body: string;
        try {
          body = JSON.stringify({ ...SET, ...odd }, (_key, value: unknown) =>
            typeof value === 'bigint' ? String(value) : value,
          );
        } catch {
          return; // what JSON cannot carry is never sent
        }
        const { status } = await restorer.post('/api/sets').type('json').send(body);
        expect([201, 400]).toContain(status);
      }),
      { numRuns: 80 },
    );
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
      .send({ notedOn: '2026-02-30', entries: entry(3) })
      .expect(400);
  });

  test('a worth needs who says so and on what basis, and a range around the amount', async () => {
    const { id } = await register();
    const worth = {
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
    const { body } = await restorer.post(`/api/sets/${id}/worths`).send(worth).expect(201);
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
        .send({ ...worth, ...part })
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

  test('by number, as it is written or without its zeros', async () => {
    const { id, number } = await register({ model: 'By number' });
    expect(await names(`q=${number}`)).toEqual(['By number']);
    expect(await names(`q=s-${id}`)).toEqual(['By number']);
  });

  test('by filter, in an order, by pages', async () => {
    expect(await names('maker=Corvane&sort=year')).toEqual(['Nine', '5-T 100%_ table', 'Ten']);
    expect(await names('maker=Corvane&sort=-year')).toEqual(['5-T 100%_ table', 'Nine', 'Ten']);
    expect(await names('maker=Corvane&kind=television')).toEqual(['Nine']);
    expect(await names('maker=Corvane&sort=year&page=2&pageSize=2')).toEqual(['Ten']);
    const { body } = await restorer.get('/api/sets?maker=Corvane&pageSize=1');
    expect(body).toMatchObject({ total: 3, makers: ['Corvane', 'Halloway'] });
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
});

describe('photographs', () => {
  /** Left half red, right half blue, 1,200 × 800, with a position and a turn in its EXIF. */
  const picture = async (orientation = 1) =>
    sharp({ create: { width: 1200, height: 800, channels: 3, background: 'blue' } })
      .composite([{ input: { create: { width: 600, height: 800, channels: 3, background: 'red' } }, left: 0, top: 0 }])
      .jpeg()
      .withExif({
        IFD0: { Make: 'SecretCamera' },
        IFD3: { GPSLatitude: '51/1 30/1 0/1', GPSLatitudeRef: 'N' },
      })
      .withMetadata({ orientation })
      .toBuffer();
  let id: number;
  beforeEach(async () => (id = (await register()).id));
  const upload = (bytes: Buffer, name = 'front.jpg') =>
    restorer.post(`/api/sets/${id}/photos`).attach('photo', bytes, name);

  test('are resized, turned upright and freed of position and camera', async () => {
    const original = await picture(6);
    expect(original.includes('SecretCamera')).toBe(true);
    const { body } = await upload(original).expect(201);
    expect(body).toMatchObject({ width: 800, height: 1200, position: 1, caption: '' });
    for (const [address, longest] of [
      [body.large, 1200],
      [body.small, 480],
    ] as const) {
      const { body: bytes, type } = await restorer.get(address).expect(200);
      expect(type).toBe('image/jpeg');
      const metadata = await sharp(bytes).metadata();
      expect(metadata).toMatchObject({ format: 'jpeg', height: longest });
      expect(metadata.exif).toBeUndefined();
      expect(bytes.includes('SecretCamera')).toBe(false);
      expect(bytes.includes('GPS')).toBe(false);
    }
    // a quarter turn clockwise puts the left half on top
    const [red] = await sharp((await restorer.get(body.large)).body)
      .extract({ left: 300, top: 100, width: 1, height: 1 })
      .raw()
      .toBuffer();
    expect(red).toBeGreaterThan(200);
  });

  test('are told by their bytes, not by their name', async () => {
    const png = await sharp({ create: { width: 64, height: 64, channels: 3, background: 'green' } })
      .png()
      .toBuffer();
    await upload(png, 'a-picture.txt').expect(201);
    const gif = await sharp({ create: { width: 64, height: 64, channels: 3, background: 'green' } })
      .gif()
      .toBuffer();
    for (const [bytes, name] of [
      [Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="90" height="90"/>'), 'drawing.jpg'],
      [Buffer.from('%PDF-1.7 not a picture'), 'paper.jpg'],
      [Buffer.from([]), 'empty.jpg'],
      [gif, 'moving.jpg'],
      [(await picture()).subarray(0, 3000), 'cut-short.jpg'],
      [
        await sharp({ create: { width: 8, height: 8, channels: 3, background: 'green' } })
          .png()
          .toBuffer(),
        'tiny.png',
      ],
    ] as const) {
      const { body } = await upload(bytes, name).expect(422);
      expect(body).toMatchObject({ type: '/problems/unusable-photo', detail: expect.stringContaining(name) });
      expect(body.detail).toContain('JPEG, PNG, WebP');
    }
    expect((await restorer.get(`/api/sets/${id}`)).body.photos).toHaveLength(1);
  });

  test('over 25 MB answer 413; without a file, or in another field, 400', async () => {
    const { body } = await upload(Buffer.alloc(26 * 1024 * 1024)).expect(413);
    expect(body.type).toBe('/problems/too-large');
    expect((await restorer.post(`/api/sets/${id}/photos`)).body.fields[0].field).toBe('photo');
    expect((await restorer.post(`/api/sets/${id}/photos`).attach('other', await picture(), 'a.jpg')).status).toBe(400);
  });

  test('are captioned, ordered and removed', async () => {
    const [a, b] = [(await upload(await picture())).body, (await upload(await picture())).body];
    await restorer.patch(`/api/sets/${id}/photos/${b.id}`).send({ caption: 'Back' }).expect(200);
    const { body } = await restorer
      .put(`/api/sets/${id}/photos`)
      .send({ photoIds: [b.id, a.id] })
      .expect(200);
    expect(body.items.map((p: { caption: string }) => p.caption)).toEqual(['Back', '']);
    await restorer
      .put(`/api/sets/${id}/photos`)
      .send({ photoIds: [b.id] })
      .expect(400);
    await restorer
      .put(`/api/sets/${id}/photos`)
      .send({ photoIds: [b.id, b.id] })
      .expect(400);
    await restorer.delete(`/api/sets/${id}/photos/${b.id}`).expect(204);
    await restorer.get(b.large).expect(404);
    await restorer.delete(`/api/sets/${id}/photos/${b.id}`).expect(404);
  });

  test('of another set cannot be reached through this one', async () => {
    const { body: mine } = await upload(await picture());
    const other = await register();
    await restorer.patch(`/api/sets/${other.id}/photos/${mine.id}`).send({ caption: 'x' }).expect(404);
    await restorer.delete(`/api/sets/${other.id}/photos/${mine.id}`).expect(404);
  });
});
