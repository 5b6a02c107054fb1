import { PROBLEMS } from '../../src/contracts/problem';
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

  test('ten wrong present passwords are enough; neither a stranger nor a colleague uses them up', async () => {
    const [restorer, appraiser, stranger] = [
      await app.agentAs('restorer'),
      await app.agentAs('appraiser'),
      app.anyone(),
    ];
    const guess = { currentPassword: 'a wrong guess', newPassword: 'a much longer phrase' };
    for (let n = 0; n < 11; n++) await stranger.put('/api/session/password').send(guess);
    for (let n = 0; n < 10; n++) await restorer.put('/api/session/password').send(guess).expect(400);
    const right = { ...guess, currentPassword: PASSWORD };
    const { body } = await restorer.put('/api/session/password').send(right).expect(429);
    expect(body.type).toBe('/problems/too-many-attempts');
    await appraiser.put('/api/session/password').send(right).expect(204);
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

  test('an invitation accepted twice at once lets one in', async () => {
    const { token } = (await (await app.agentAs('administrator')).post('/api/users').send(NEW)).body;
    const passwords = ['the first password', 'the second password'];
    const answers = await Promise.all(
      passwords.map((password) => app.anyone().post(`/api/invitations/${token}`).send({ password })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404]);
    const accepted = passwords[answers.findIndex(({ status }) => status === 200)];
    await app.anyone().post('/api/session').send({ email: NEW.email, password: accepted }).expect(200);
  });

  test('somebody disabled before accepting cannot accept', async () => {
    const administrator = await app.agentAs('administrator');
    const { token, user } = (await administrator.post('/api/users').send(NEW)).body;
    await administrator.patch(`/api/users/${user.id}`).send({ disabled: true }).expect(200);
    await app.anyone().post(`/api/invitations/${token}`).send({ password: 'long enough for this' }).expect(404);
  });

  test('an invitation runs out after a week; a renewed one replaces it', async () => {
    const administrator = await app.agentAs('administrator');
    const first = (await administrator.post('/api/users').send(NEW)).body;
    const renewed = (await administrator.post(`/api/users/${first.user.id}/invitation`).expect(200)).body;
    await app.anyone().get(`/api/invitations/${first.token}`).expect(404);
    await app.anyone().get(`/api/invitations/${renewed.token}`).expect(200);
    app.clock.now += 8 * 86_400_000;
    await app.anyone().get(`/api/invitations/${renewed.token}`).expect(404);
    await app.anyone().post(`/api/invitations/${renewed.token}`).send({ password: 'long enough now' }).expect(404);
  });

  test('somebody who has accepted is not invited again', async () => {
    const administrator = await app.agentAs('administrator');
    const { items } = (await administrator.get('/api/users')).body;
    const { id } = items.find((u: { role: string }) => u.role === 'restorer');
    const { body } = await administrator.post(`/api/users/${id}/invitation`).expect(409);
    expect(body.type).toBe('/problems/not-allowed-now');
    await administrator.post('/api/users/999999/invitation').expect(404);
  });

  test('an address can be invited once', async () => {
    const administrator = await app.agentAs('administrator');
    const { body } = await administrator
      .post('/api/users')
      .send({ ...NEW, email: 'RESTORER@test.example' })
      .expect(409);
    expect(body).toMatchObject({ type: '/problems/already-exists', fields: [{ field: 'email' }] });
  });

  test('somebody disabled is out at once and cannot sign in; enabled again they sign in anew', async () => {
    const [administrator, restorer] = [await app.agentAs('administrator'), await app.agentAs('restorer')];
    const elsewhere = await app.agentAs('restorer');
    const { items } = (await administrator.get('/api/users')).body;
    const { id } = items.find((u: { role: string }) => u.role === 'restorer');
    expect((await administrator.patch(`/api/users/${id}`).send({ disabled: true })).body.state).toBe('disabled');
    expect((await restorer.get('/api/sets')).status).toBe(401);
    const refused = (await app.anyone().post('/api/session').send(RESTORER).expect(401)).body;
    expect(refused).toMatchObject({ type: '/problems/wrong-credentials', title: PROBLEMS['wrong-credentials'].title });
    expect(refused.detail).toBeUndefined();
    await administrator.patch(`/api/users/${id}`).send({ disabled: false }).expect(200);
    expect((await elsewhere.get('/api/sets')).status).toBe(401);
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

  test('an administrator may step down once another one can sign in, not while one is only invited', async () => {
    const administrator = await app.agentAs('administrator');
    const { id } = (await administrator.get('/api/session')).body.user;
    const second = { name: 'Second', email: 'second@test.example', role: 'administrator' };
    const { token } = (await administrator.post('/api/users').send(second)).body;
    await administrator.patch(`/api/users/${id}`).send({ role: 'restorer' }).expect(409);
    await app.anyone().post(`/api/invitations/${token}`).send({ password: 'long enough for this' }).expect(200);
    await administrator.patch(`/api/users/${id}`).send({ role: 'restorer' }).expect(200);
    await administrator.get('/api/users').expect(403);
  });

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
