import sharp from 'sharp';
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
const register = async () => (await restorer.post('/api/sets').send(SET).expect(201)).body;

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

test('with see-through parts stand on white; AVIF and TIFF are read', async () => {
  const clear = sharp({ create: { width: 64, height: 64, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } } });
  const { body } = await upload(await clear.clone().png().toBuffer()).expect(201);
  const [red] = await sharp((await restorer.get(body.large)).body)
    .raw()
    .toBuffer();
  expect(red).toBe(255);
  await upload(await clear.clone().avif().toBuffer(), 'a.avif').expect(201);
  await upload(await clear.clone().tiff().toBuffer(), 'a.tif').expect(201);
});

test('of more than 100 megapixels are refused with their size, however small the file', async () => {
  const bomb = await sharp({ create: { width: 12_000, height: 10_000, channels: 3, background: 'red' } })
    .png()
    .toBuffer();
  const { body } = await upload(bomb, 'poster.png').expect(422);
  expect(body.detail).toContain('«poster.png» has 120 megapixels; 100 is the most.');
});

test('as HEIC are refused with the way out', async () => {
  const heic = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from('ftypheic\0\0\0\0mif1heic'), Buffer.alloc(64)]);
  const { body } = await upload(heic, 'telephone.heic').expect(422);
  expect(body.detail).toContain('«telephone.heic» is a HEIC photograph, which cannot be read here; export it as JPEG.');
});

test.each([
  ['no boundary', 'multipart/form-data', 'x'],
  ['no part', 'multipart/form-data; boundary=b', 'x'],
  [
    'a torn file',
    'multipart/form-data; boundary=b',
    '--b\r\nContent-Disposition: form-data; name="photo"; filename="a"\r\n\r\nabc',
  ],
  [
    'a nameless part',
    'multipart/form-data; boundary=b',
    '--b\r\nContent-Disposition: form-data\r\n\r\nabc\r\n--b--\r\n',
  ],
  ['a broken header', 'multipart/form-data; boundary=b', '--b\r\nbroken\r\n\r\nabc\r\n--b--\r\n'],
  ['another type', 'text/plain', 'abc'],
])('a form with %s answers 400', async (_what, type, form) => {
  const { body } = await restorer.post(`/api/sets/${id}/photos`).set('Content-Type', type).send(form).expect(400);
  expect(body.fields[0].field).toBe('photo');
});

test('are kept by the browser only with asking again, and not sent twice', async () => {
  const { body } = await upload(await picture()).expect(201);
  const first = await restorer.get(body.small).expect(200);
  expect(first.headers['cache-control']).toBe('private, no-cache');
  await restorer
    .get(body.small)
    .set('If-None-Match', first.headers['etag'] ?? '')
    .expect(304);
  await app
    .anyone()
    .get(body.small)
    .set('If-None-Match', first.headers['etag'] ?? '')
    .expect(401);
  await restorer.get('/api/photos/424242/small').expect(404);
  await restorer.get(`/api/photos/${body.id}/huge`).expect(400);
});

test('sent at once each get a place of their own', async () => {
  const bytes = await picture();
  const places = (await Promise.all([upload(bytes), upload(bytes), upload(bytes)])).map(({ body }) => body.position);
  expect(places.sort()).toEqual([1, 2, 3]);
});

test('count as changes of the set, unless nothing changed', async () => {
  const changedAt = async () => (await restorer.get(`/api/sets/${id}`)).body.updatedAt;
  const photo = (await upload(await picture())).body;
  const steps = [
    () => restorer.patch(`/api/sets/${id}/photos/${photo.id}`).send({ caption: 'Front' }),
    () => restorer.put(`/api/sets/${id}/photos`).send({ photoIds: [photo.id] }),
    () => restorer.delete(`/api/sets/${id}/photos/${photo.id}`),
  ];
  for (const step of steps) {
    app.clock.now += 60_000;
    await step();
    expect(await changedAt()).toBe(new Date(app.clock.now).toISOString());
  }
  const before = await changedAt();
  app.clock.now += 60_000;
  await restorer.delete(`/api/sets/${id}/photos/${photo.id}`).expect(404);
  expect(await changedAt()).toBe(before);
});
