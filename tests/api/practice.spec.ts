import type { Practice } from '../../src/contracts/practice';
import { startTestApp, type TestApp } from '../support/harness';

let app: TestApp;
beforeEach(async () => (app = await startTestApp()));
afterEach(() => app.close());

test('a new practice begins with settings to change, without tax', async () => {
  const { body } = await (await app.agentAs('administrator')).get('/api/practice').expect(200);
  expect(body).toEqual({
    name: 'Test Set Works',
    address: '',
    phone: '',
    email: '',
    currency: 'USD',
    labourRate: '75.00',
    partsMarkupPercent: '30',
    outsideMarkupPercent: '10',
    taxTreatment: 'none',
    taxRatePercent: '0',
    taxNote: '',
    depositPercent: '40',
    paperSize: 'letter',
    version: 1,
  });
});

test('before it is set up there is nothing, not even for work inside', async () => {
  app.close();
  app = await startTestApp({ people: false });
  expect(app.services.practice.settings()).toBeNull();
  expect((await app.anyone().get('/api/session')).body.practiceName).toBe('');
});

test('every setting comes back as it was written, and after a restart', async () => {
  const administrator = await app.agentAs('administrator');
  const written: Practice = {
    name: 'Quayside Set Works',
    address: '4 Quay Street\nHarbour Town',
    phone: '555 0142',
    email: 'office@quayside.example',
    currency: 'USD',
    labourRate: '68.50',
    partsMarkupPercent: '35.25',
    outsideMarkupPercent: '0',
    taxTreatment: 'parts',
    taxRatePercent: '6.8755',
    taxNote: 'State rule on parts',
    depositPercent: '100',
    paperSize: 'a4',
    version: 1,
  };
  await administrator.put('/api/practice').send(written).expect(200);
  app.database.close();
  app = await startTestApp({ folder: app.folder });
  const { body } = await (await app.agentAs('restorer')).get('/api/practice').expect(200);
  expect(body).toEqual({ ...written, version: 2 });
});

test('of two who change it, the later one is told what stands and overwrites nothing', async () => {
  const [one, two] = [await app.agentAs('administrator'), await app.agentAs('administrator')];
  const { body: seen } = await two.get('/api/practice');
  const changed = { ...seen, labourRate: '68.50' };
  const { body: after } = await one.put('/api/practice').send(changed).expect(200);
  expect(after).toEqual({ ...changed, version: seen.version + 1 });
  const late = await two
    .put('/api/practice')
    .send({ ...seen, labourRate: '1.00' })
    .expect(409);
  expect(late.body).toMatchObject({ type: '/problems/edit-conflict', current: after });
  expect((await two.get('/api/practice')).body).toEqual(after);
  await two
    .put('/api/practice')
    .send({ ...after, labourRate: '1.00' })
    .expect(200);
});

test.each([
  ['labourRate', '68,50'],
  ['labourRate', '-1'],
  ['labourRate', null],
  ['taxRatePercent', '6.87501'],
  ['depositPercent', '101'],
  ['taxTreatment', 'everything'],
  ['paperSize', 'foolscap'],
  ['currency', 'XXX'],
  ['name', '  '],
  ['version', 0],
])('%s = %j answers 400 naming it', async (field, value) => {
  const administrator = await app.agentAs('administrator');
  const { body: before } = await administrator.get('/api/practice');
  const { body } = await administrator
    .put('/api/practice')
    .send({ ...before, [field]: value })
    .expect(400);
  expect(body.fields.map((f: { field: string }) => f.field)).toEqual([field]);
  expect((await administrator.get('/api/practice')).body).toEqual(before);
});
