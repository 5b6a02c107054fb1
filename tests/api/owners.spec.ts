import type TestAgent from 'supertest/lib/agent';
import { SET } from '../support/a-set';
import { startTestApp, type TestApp } from '../support/harness';

let app: TestApp;
let restorer: TestAgent;
beforeAll(async () => {
  app = await startTestApp();
  restorer = await app.agentAs('restorer');
});
afterAll(() => app.close());

const add = (part: object) => restorer.post('/api/owners').send({ name: 'Wren', email: '', phone: '', ...part });
const owned = async (agent: TestAgent) =>
  (await agent.get('/api/sets').expect(200)).body.items.map((set: { model: string }) => set.model);
const registerFor = (ownerId: number, model: string) =>
  restorer
    .post('/api/sets')
    .send({ ...SET, ownerId, model })
    .expect(201);

test('an owner is added and listed by name with the number of their sets', async () => {
  const ulla = (await add({ name: ' Ulla ', phone: '555-0100' }).expect(201)).body;
  expect(ulla).toMatchObject({ name: 'Ulla', email: '', phone: '555-0100', userId: null, setCount: 0 });
  await add({ name: 'Élodie' }).expect(201);
  await add({ name: 'abel' }).expect(201);
  await registerFor(ulla.id, 'One');
  await registerFor(ulla.id, 'Two');
  const { body } = await restorer.get('/api/owners').expect(200);
  const listed = body.items.map((o: { name: string; setCount: number }) => [o.name, o.setCount]);
  expect(listed).toEqual([
    ['abel', 0],
    ['Élodie', 0],
    ['Ulla', 2],
  ]);
  expect(body.total).toBe(3);
});

test.each([
  ['name', { name: ' ' }],
  ['name', { name: 'x'.repeat(121) }],
  ['email', { email: 'nobody' }],
  ['phone', { phone: 5550100 }],
])('%s that cannot be used is named', async (field, part) => {
  expect((await add(part).expect(400)).body.fields[0].field).toBe(field);
});

test('with the address of a collector who signs in, the sets are theirs to see at once', async () => {
  const collector = await app.agentAs('collector');
  expect(await owned(collector)).toEqual([]);
  const owner = (await add({ name: 'Cal', email: ' Collector@Test.Example ' }).expect(201)).body;
  expect(owner.userId).toEqual(expect.any(Number));
  await registerFor(owner.id, 'Cal’s');
  expect(await owned(collector)).toEqual(['Cal’s']);
});

test('with the address of somebody at work, or of someone only invited, nobody is let in', async () => {
  expect((await add({ email: 'restorer@test.example' }).expect(201)).body.userId).toBeNull();
  const administrator = await app.agentAs('administrator');
  await administrator
    .post('/api/users')
    .send({ name: 'I', email: 'invited@test.example', role: 'collector' })
    .expect(201);
  expect((await add({ email: 'invited@test.example' }).expect(201)).body.userId).toBeNull();
});

test('a collector neither lists nor adds owners', async () => {
  const collector = await app.agentAs('collector');
  await collector.get('/api/owners').expect(403);
  await collector.post('/api/owners').send({ name: 'X', email: '', phone: '' }).expect(403);
  await app.anyone().get('/api/owners').expect(401);
});
