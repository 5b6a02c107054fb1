import { PASSWORD, startTestApp, type TestApp } from '../support/harness';

let app: TestApp;
beforeEach(async () => (app = await startTestApp()));
afterEach(() => app.close());

const RESTORER = { email: 'restorer@test.example', password: PASSWORD };

describe('signing in', () => {
  test('answers who is signed in with the role, and remembers it', async () => {
    const agent = app.anyone();
    const { body } = await agent
      .post('/api/session')
      .send({ ...RESTORER, email: ' Restorer@Test.Example ' })
      .expect(200);
    expect(body.user).toMatchObject({ name: 'Rui Restorer', role: 'restorer', email: 'restorer@test.example' });
    expect((await agent.get('/api/session')).body.user.role).toBe('restorer');
    expect((await app.anyone().get('/api/session')).body.user).toBeNull();
  });

  test('the cookie is HttpOnly and stays on this site; only a hash of it is stored', async () => {
    const { headers } = await app.anyone().post('/api/session').send(RESTORER);
    const cookie = String(headers['set-cookie']);
    expect(cookie).toMatch(/^thenworth=/);
    expect(cookie).toContain('HttpOnly');
    expect(cookie).toContain('SameSite=Lax');
    const id = /s%3A([^.]+)\./.exec(cookie)?.[1] ?? '';
    const rows = app.database.sqlite.prepare('select id_hash, data from sessions').all();
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(id);
    expect(app.database.sqlite.prepare('select password_hash as h from users').all()).toEqual(
      Array(4).fill({ h: expect.stringMatching(/^\$argon2id\$/) }),
    );
  });

  test.each([
    ['a wrong password', { ...RESTORER, password: 'something else' }],
    ['an unknown address', { ...RESTORER, email: 'nobody@test.example' }],
  ])('%s answers the same 401', async (_what, body) => {
    const response = await app.anyone().post('/api/session').send(body).expect(401);
    expect(response.type).toBe('application/problem+json');
    expect(response.body).toMatchObject({ type: '/problems/wrong-credentials', status: 401 });
    expect(response.body.fields).toBeUndefined();
  });

  test.each([
    ['no body', undefined, ['email', 'password']],
    ['not an address', { email: 'restorer', password: 'x' }, ['email']],
    ['not a text', { email: 5, password: ['x'] }, ['email', 'password']],
    ['a password of a megabyte', { ...RESTORER, password: 'x'.repeat(100_000) }, ['password']],
  ])('%s answers 400 naming the field', async (_what, body, fields) => {
    const response = await app.anyone().post('/api/session').send(body).expect(400);
    expect(response.body.fields.map((f: { field: string }) => f.field)).toEqual(fields);
  });

  test('JSON that is none answers 400', async () => {
    const response = await app.anyone().post('/api/session').type('json').send('{"email":').expect(400);
    expect(response.body.fields[0].field).toBe('body');
  });

  test('a session lives through a restart of the server and ends with sign-out', async () => {
    const { headers } = await app.anyone().post('/api/session').send(RESTORER);
    const cookie = String(headers['set-cookie']).split(';')[0] ?? '';
    app.database.close();
    const again = await startTestApp({ folder: app.folder });
    app = again;
    expect((await again.anyone().get('/api/sets').set('Cookie', cookie)).status).toBe(200);
    await again.anyone().delete('/api/session').set('Cookie', cookie).expect(204);
    expect((await again.anyone().get('/api/sets').set('Cookie', cookie)).status).toBe(401);
  });

  test('a session runs out after two weeks without use', async () => {
    const agent = await app.agentAs('restorer');
    app.clock.now += 13 * 86_400_000;
    expect((await agent.get('/api/sets')).status).toBe(200);
    app.clock.now += 15 * 86_400_000;
    expect((await agent.get('/api/sets')).status).toBe(401);
  });

  test('a session id from before sign-in is worth nothing afterwards', async () => {
    const agent = await app.agentAs('collector');
    const before = String((await agent.post('/api/session').send(RESTORER)).headers['set-cookie']);
    const after = String((await agent.post('/api/session').send(RESTORER)).headers['set-cookie']);
    expect(before.split(';')[0]).not.toBe(after.split(';')[0]);
  });

  test('ten failures for an address are enough; success does not count, other addresses go on', async () => {
    const agent = app.anyone();
    for (let n = 0; n < 5; n++) await agent.post('/api/session').send(RESTORER).expect(200);
    for (let n = 0; n < 10; n++)
      await agent
        .post('/api/session')
        .send({ ...RESTORER, password: `wrong ${n}` })
        .expect(401);
    const response = await agent.post('/api/session').send(RESTORER).expect(429);
    expect(response.body).toMatchObject({
      type: '/problems/too-many-attempts',
      detail: expect.stringContaining('15 minutes'),
    });
    expect(response.headers['retry-after']).toBeDefined();
    await agent
      .post('/api/session')
      .send({ ...RESTORER, email: 'appraiser@test.example' })
      .expect(200);
  });

  test.each([
    [{ 'Sec-Fetch-Site': 'cross-site' }, 403],
    [{ 'Sec-Fetch-Site': 'same-site' }, 403],
    [{ Origin: 'https://elsewhere.example' }, 403],
    [{ Origin: 'null' }, 403],
    [{ 'Sec-Fetch-Site': 'same-origin' }, 200],
    [{}, 200],
  ])('a change asked for with %j answers %i', async (headers, status) => {
    const { body } = await app.anyone().post('/api/session').set(headers).send(RESTORER).expect(status);
    if (status === 403) expect(body.type).toBe('/problems/cross-site');
  });
});

describe('one’s own account', () => {
  test('sign out everywhere ends every session of the person, and no other’s', async () => {
    const [one, two, other] = [
      await app.agentAs('restorer'),
      await app.agentAs('restorer'),
      await app.agentAs('appraiser'),
    ];
    await one.delete('/api/sessions').expect(204);
    expect((await one.get('/api/sets')).status).toBe(401);
    expect((await two.get('/api/sets')).status).toBe(401);
    expect((await other.get('/api/sets')).status).toBe(200);
  });

  test('changing the password needs the present one, keeps this session and ends the others', async () => {
    const [here, there] = [await app.agentAs('restorer'), await app.agentAs('restorer')];
    const newPassword = 'a much longer phrase';
    const wrong = await here.put('/api/session/password').send({ currentPassword: 'no', newPassword }).expect(400);
    expect(wrong.body.fields[0]).toMatchObject({ field: 'currentPassword' });
    const short = await here
      .put('/api/session/password')
      .send({ currentPassword: PASSWORD, newPassword: 'short' })
      .expect(400);
    expect(short.body.fields[0]).toMatchObject({
      field: 'newPassword',
      message: expect.stringContaining('12 characters'),
    });
    await here.put('/api/session/password').send({ currentPassword: PASSWORD, newPassword }).expect(204);
    expect((await here.get('/api/sets')).status).toBe(200);
    expect((await there.get('/api/sets')).status).toBe(401);
    await app.anyone().post('/api/session').send(RESTORER).expect(401);
    await app
      .anyone()
      .post('/api/session')
      .send({ ...RESTORER, password: newPassword })
      .expect(200);
  });
});

describe('people', () => {
  const NEW = { name: 'Nora New', email: 'nora@test.example', role: 'appraiser' };

  test('an invitation is shown once, stored as a hash, accepted once, and lets the person in', async () => {
    const administrator = await app.agentAs('administrator');
    const { body } = await administrator.post('/api/users').send(NEW).expect(201);
    expect(body.user).toMatchObject({ state: 'invited', role: 'appraiser' });
    expect(JSON.stringify(app.database.sqlite.prepare('select * from users').all())).not.toContain(body.token);
    const guest = app.anyone();
    expect((await guest.get(`/api/invitations/${body.token}`)).body).toMatchObject({
      name: 'Nora New',
      practiceName: 'Test Set Works',
    });
    await guest.post(`/api/invitations/${body.token}`).send({ password: 'long enough for this' }).expect(200);
    expect((await guest.get('/api/session')).body.user.role).toBe('appraiser');
    await app.anyone().get(`/api/invitations/${body.token}`).expect(404);
    await app.anyone().post(`/api/invitations/${body.token}`).send({ password: 'long enough for this' }).expect(404);
  });

  test('an invitation runs out after a week; a renewed one replaces it', async () => {
    const administrator = await app.agentAs('administrator');
    const first = (await administrator.post('/api/users').send(NEW)).body;
    const renewed = (await administrator.post(`/api/users/${first.user.id}/invitation`).expect(200)).body;
    await app.anyone().get(`/api/invitations/${first.token}`).expect(404);
    await app.anyone().get(`/api/invitations/${renewed.token}`).expect(200);
    app.clock.now += 8 * 86_400_000;
    await app.anyone().get(`/api/invitations/${renewed.token}`).expect(404);
  });

  test('an address can be invited once', async () => {
    const administrator = await app.agentAs('administrator');
    const { body } = await administrator
      .post('/api/users')
      .send({ ...NEW, email: 'RESTORER@test.example' })
      .expect(409);
    expect(body).toMatchObject({ type: '/problems/already-exists', fields: [{ field: 'email' }] });
  });

  test('somebody disabled is out at once and cannot sign in; enabled again they can', async () => {
    const [administrator, restorer] = [await app.agentAs('administrator'), await app.agentAs('restorer')];
    const { items } = (await administrator.get('/api/users')).body;
    const { id } = items.find((u: { role: string }) => u.role === 'restorer');
    expect((await administrator.patch(`/api/users/${id}`).send({ disabled: true })).body.state).toBe('disabled');
    expect((await restorer.get('/api/sets')).status).toBe(401);
    await app.anyone().post('/api/session').send(RESTORER).expect(401);
    await administrator.patch(`/api/users/${id}`).send({ disabled: false }).expect(200);
    await app.anyone().post('/api/session').send(RESTORER).expect(200);
  });

  test.each([{ disabled: true }, { role: 'collector' }])(
    'the last administrator cannot be changed by %j',
    async (change) => {
      const administrator = await app.agentAs('administrator');
      const { id } = (await administrator.get('/api/session')).body.user;
      const { body } = await administrator.patch(`/api/users/${id}`).send(change).expect(409);
      expect(body.type).toBe('/problems/not-allowed-now');
      expect((await administrator.get('/api/users')).status).toBe(200);
    },
  );

  test('lists answer items and total', async () => {
    const { body } = await (await app.agentAs('administrator')).get('/api/users');
    expect(body.total).toBe(4);
    expect(body.items[0]).toMatchObject({ name: 'Ada Administrator', state: 'active', lastSeenAt: expect.any(String) });
    expect(JSON.stringify(body)).not.toContain('argon2');
  });
});

describe('a clean practice', () => {
  const FIRST = {
    practiceName: 'New Works',
    name: 'First',
    email: 'first@test.example',
    password: 'long enough for this',
  };

  test('asks for its first administrator, once', async () => {
    app.close();
    app = await startTestApp({ people: false });
    const agent = app.anyone();
    expect((await agent.get('/api/session')).body).toMatchObject({ needsSetup: true, user: null, demo: false });
    const bad = await agent
      .post('/api/setup')
      .send({ ...FIRST, password: 'short' })
      .expect(400);
    expect(bad.body.fields[0].field).toBe('password');
    const { body } = await agent.post('/api/setup').send(FIRST).expect(201);
    expect(body).toMatchObject({ needsSetup: false, practiceName: 'New Works', user: { role: 'administrator' } });
    await app
      .anyone()
      .post('/api/setup')
      .send({ ...FIRST, email: 'second@test.example' })
      .expect(409);
    expect((await agent.get('/api/users')).body.total).toBe(1);
  });

  test('two at once: one becomes the administrator', async () => {
    app.close();
    app = await startTestApp({ people: false });
    const answers = await Promise.all(
      ['a', 'b'].map((n) =>
        app
          .anyone()
          .post('/api/setup')
          .send({ ...FIRST, email: `${n}@test.example` }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });
});

describe('the practice', () => {
  test('its settings change by whoever saw the newest; a late change is told what stands', async () => {
    const administrator = await app.agentAs('administrator');
    const { body: before } = await administrator.get('/api/practice').expect(200);
    const changed = { ...before, labourRate: '68.50', taxTreatment: 'parts', taxRatePercent: '6.875' };
    const { body: after } = await administrator.put('/api/practice').send(changed).expect(200);
    expect(after).toMatchObject({ labourRate: '68.50', taxRatePercent: '6.875', version: before.version + 1 });
    const late = await administrator
      .put('/api/practice')
      .send({ ...changed, labourRate: '1.00' })
      .expect(409);
    expect(late.body).toMatchObject({ type: '/problems/edit-conflict', current: { labourRate: '68.50' } });
    expect((await administrator.get('/api/practice')).body.labourRate).toBe('68.50');
  });

  test.each([
    ['labourRate', '68,50'],
    ['labourRate', '-1'],
    ['taxRatePercent', '6.87501'],
    ['depositPercent', '101'],
    ['taxTreatment', 'everything'],
    ['paperSize', 'foolscap'],
    ['name', '  '],
    ['labourRate', null],
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
});
