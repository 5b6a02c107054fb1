import sharp from 'sharp';
import type TestAgent from 'supertest/lib/agent';
import { startTestApp, type TestApp } from '../support/harness';

const SET = {
  kind: 'radio',
  maker: 'Halloway',
  description: '',
  chassis: '',
  serial: '',
  year: 1941,
  priceWhenNew: null,
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: '',
  hazards: [],
};

let app: TestApp;
let collector: TestAgent;
interface Kept {
  readonly set: number;
  readonly estimate: number;
  readonly photo: string;
}
let mine: Kept;
let others: Kept;

beforeAll(async () => {
  app = await startTestApp();
  const restorer = await app.agentAs('restorer');
  collector = await app.agentAs('collector');
  const picture = await sharp({ create: { width: 64, height: 64, channels: 3, background: 'green' } })
    .png()
    .toBuffer();

  const keep = async (name: string, email: string, model: string): Promise<Kept> => {
    const owner = (await restorer.post('/api/owners').send({ name, email, phone: '' }).expect(201)).body;
    const set = (
      await restorer
        .post('/api/sets')
        .send({ ...SET, model, ownerId: owner.id })
        .expect(201)
    ).body;
    const photo = (await restorer.post(`/api/sets/${set.id}/photos`).attach('photo', picture, 'a.png').expect(201))
      .body;
    const estimate = (await restorer.post(`/api/sets/${set.id}/estimates`).send({ title: model }).expect(201)).body;
    return { set: set.id, estimate: estimate.id, photo: photo.large };
  };
  mine = await keep('Cal Collector', 'Collector@test.example', 'Mine');
  others = await keep('Somebody Else', 'else@test.example', 'Theirs');
  await restorer
    .post('/api/sets')
    .send({ ...SET, model: 'Of the workshop', ownerId: null })
    .expect(201);
});
afterAll(() => app.close());

const addresses = (kept: Kept) => [
  `/api/sets/${kept.set}`,
  kept.photo,
  `/api/estimates/${kept.estimate}`,
  `/api/sets/${kept.set}/appraisal-sheet`,
  `/api/sets/${kept.set}/appraisal-sheet.pdf`,
  `/api/estimates/${kept.estimate}/restoration-estimate`,
  `/api/estimates/${kept.estimate}/restoration-estimate.pdf`,
];

test('a collector sees everything of their own sets', async () => {
  for (const address of addresses(mine))
    expect([address, (await collector.get(address)).status]).toEqual([address, 200]);
});

test('another’s records answer as if they did not exist', async () => {
  for (const address of addresses(others)) {
    const { status, body } = await collector.get(address);
    expect([address, status]).toEqual([address, 404]);
    expect(JSON.stringify(body)).not.toMatch(/Theirs|Somebody/);
  }
});

test('an appraisal sheet of one’s own set does not take another’s estimate', async () => {
  const { status } = await collector.get(`/api/sets/${mine.set}/appraisal-sheet?estimateId=${others.estimate}`);
  expect(status).toBe(404);
});

test('lists, counts, filters and search hold only one’s own', async () => {
  for (const query of ['', '?state=all', '?q=halloway', '?q=theirs', `?q=s-${others.set}`, '?sort=-worth']) {
    const { items, total } = (await collector.get(`/api/sets${query}`)).body;
    expect(items.every((set: { model: string }) => set.model === 'Mine')).toBe(true);
    expect(total).toBe(items.length);
  }
  const estimates = (await collector.get('/api/estimates?state=all')).body;
  expect(estimates).toMatchObject({ total: 1, items: [{ title: 'Mine' }] });
  expect((await collector.get(`/api/estimates?setId=${others.set}`)).body.total).toBe(0);
  expect((await collector.get(`/api/estimates?q=e-${others.estimate}`)).body.total).toBe(0);
});

test('a collector changes nothing, not even on their own sets', async () => {
  for (const [method, address] of [
    ['post', '/api/sets'],
    ['put', `/api/sets/${mine.set}`],
    ['put', `/api/sets/${mine.set}/archived`],
    ['post', `/api/sets/${mine.set}/photos`],
    ['post', `/api/sets/${mine.set}/worths`],
    ['post', `/api/sets/${mine.set}/estimates`],
    ['put', `/api/estimates/${mine.estimate}`],
    ['post', `/api/estimates/${mine.estimate}/lines`],
  ] as const)
    expect([address, (await collector[method](address).send({})).status]).toEqual([address, 403]);
});

test('an owner whose address becomes a collector’s is theirs to see from then on', async () => {
  const administrator = await app.agentAs('administrator');
  const invited = (
    await administrator.post('/api/users').send({ name: 'Else', email: 'else@test.example', role: 'collector' })
  ).body;
  const newcomer = app.anyone();
  await newcomer.post(`/api/invitations/${invited.token}`).send({ password: 'long enough for this' }).expect(200);
  expect((await newcomer.get('/api/sets')).body.items.map((s: { model: string }) => s.model)).toEqual(['Theirs']);
  expect((await newcomer.get(`/api/sets/${mine.set}`)).status).toBe(404);
});
