import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type supertest from 'supertest';
import { openDatabase, type OpenDatabase } from '../server/db/client';
import { migrateDatabase } from '../server/db/migrate';
import { loadReferenceData } from '../server/reference-data/reference-data';
import { addLine, type EstimateDetail, type EstimateSummary } from '../src/contracts/estimates';
import { recordCondition, recordWorth, registerSet, type SetDetail, type SetSummary } from '../src/contracts/sets';
import { LINE_KINDS, STAGES } from '../src/domain/estimate/terms';
import { PARTS_OF_KIND, SET_KINDS, type SetPart } from '../src/domain/sets/terms';
import { ROOT, startTestApp, type TestApp } from '../tests/support/harness';
import { DEMO_ACCOUNTS, DEMO_PASSWORD, seedDemoPractice } from './demo';
import { MAKERS, nameOf } from './demo-set';
import { ESTIMATES } from './estimates';
import { SETS } from './sets';
import { bodyOf, entriesOf, worthsOf } from './steps';

const NOW = Date.UTC(2026, 8, 15, 9, 0, 0);
const deps = {
  referenceData: loadReferenceData(join(ROOT, 'data')),
  fontsFolder: join(ROOT, 'node_modules/@expo-google-fonts/lato'),
  now: NOW,
};

describe('what the demo practice is made from', () => {
  const ownerIds = new Map(SETS.flatMap(({ owner }) => (owner === null ? [] : [[owner, 1] as const])));

  test.each(SETS.map((set) => [nameOf(set), set] as const))('%s fits the contracts', (_, set) => {
    registerSet.body.parse(bodyOf(set, { ownerIds }));
    for (const { parts } of set.inspections ?? []) {
      recordCondition.body.parse({ notedOn: '2026-01-01', entries: entriesOf(parts) });
      for (const part of Object.keys(parts) as SetPart[]) expect(PARTS_OF_KIND[set.kind]).toContain(part);
    }
    for (const opinion of set.opinions ?? [])
      for (const worth of worthsOf(opinion, '2026-01-01')) recordWorth.body.parse(worth);
  });

  test.each(ESTIMATES.map((e) => [`${e.set}: ${e.title}`, e] as const))('%s fits the contracts', (_, estimate) => {
    expect(SETS.map(nameOf)).toContain(estimate.set);
    expect(estimate.lines.length).toBeGreaterThanOrEqual(8);
    for (const content of estimate.lines) addLine.body.parse({ content, afterLineId: null });
  });

  test('only invented makers, each model once, prices from 1908 to 1966', () => {
    expect(new Set(SETS.map(({ maker }) => maker))).toEqual(new Set(MAKERS));
    expect(new Set(SETS.map(nameOf)).size).toBe(SETS.length);
    const years = SETS.flatMap(({ price }) => (price === undefined ? [] : [price[1].slice(0, 4)])).sort();
    expect([years[0], years.at(-1)]).toEqual(['1908', '1966']);
  });
});

describe('the demo practice', () => {
  let app: TestApp;
  let restorer: ReturnType<typeof supertest.agent>;

  beforeAll(async () => {
    app = await startTestApp({ people: false });
    app.clock.now = NOW;
    await seedDemoPractice({ ...deps, database: app.database });
    restorer = await signedIn('restorer@quayside.example');
  });
  afterAll(() => app.close());

  async function signedIn(email: string) {
    const agent = app.anyone();
    await agent.post('/api/session').send({ email, password: DEMO_PASSWORD }).expect(200);
    return agent;
  }
  const itemsOf = async <T>(agent: ReturnType<typeof supertest.agent>, address: string) =>
    ((await agent.get(address).expect(200)).body as { items: T[] }).items;

  test('every account listed signs in with its role', async () => {
    for (const { email, role } of DEMO_ACCOUNTS) {
      const agent = await signedIn(email);
      const { body } = await agent.get('/api/session').expect(200);
      expect(body).toMatchObject({ demo: true, practiceName: 'Quayside Set Works', user: { role } });
    }
  });

  test('about forty sets over the five kinds; three clients with collections', async () => {
    const sets = await itemsOf<SetSummary>(restorer, '/api/sets?state=all&pageSize=100');
    expect(sets.length).toBe(SETS.length);
    expect(sets.length).toBeGreaterThanOrEqual(40);
    expect(new Set(sets.map(({ kind }) => kind))).toEqual(new Set(SET_KINDS));
    const owners = await itemsOf<{ name: string; setCount: number }>(restorer, '/api/owners');
    const collections = owners.filter(({ name, setCount }) => setCount >= 6 && !name.startsWith('Quayside'));
    expect(collections.length).toBe(3);
    expect(sets.filter(({ photo }) => photo !== null).length).toBeGreaterThanOrEqual(25);
    expect(sets.filter(({ archived }) => archived).length).toBe(1);
  });

  test('a price older than the index is kept and not restated', async () => {
    const [early] = await itemsOf<SetSummary>(restorer, '/api/sets?q=No.%201%20horn');
    const { body } = await restorer.get(`/api/sets/${early?.id}`).expect(200);
    const { priceWhenNew, restated } = body as SetDetail;
    expect(priceWhenNew?.period).toBe('1908');
    expect(restated).toMatchObject({ known: false });
  });

  test('estimates gain, lose, come near even and one has no worth to be set against', async () => {
    const all = await itemsOf<EstimateSummary>(restorer, '/api/estimates?state=all&pageSize=100');
    expect(all.length).toBe(ESTIMATES.length);
    expect(new Set(all.map(({ setId }) => setId)).size).toBeGreaterThanOrEqual(14);
    const gaps = all.flatMap(({ gap }) => (gap === null ? [] : [Number(gap)]));
    expect(gaps.some((gap) => gap > 100)).toBe(true);
    expect(gaps.some((gap) => gap < -400)).toBe(true);
    expect(gaps.some((gap) => Math.abs(gap) < 75)).toBe(true);
    expect(all.some(({ gap }) => gap === null)).toBe(true);
    expect(all.filter(({ archived }) => archived).length).toBe(1);
  });

  test('lines stand in the order typed, over every stage and kind', async () => {
    const all = await itemsOf<EstimateSummary>(restorer, '/api/estimates?state=all&sort=number&pageSize=100');
    const lines: EstimateDetail['lines'] = [];
    for (const { id, title } of all) {
      const { body } = await restorer.get(`/api/estimates/${id}`).expect(200);
      const detail = body as EstimateDetail;
      lines.push(...detail.lines);
      const typed = ESTIMATES.find((e) => e.title === title && e.set === `${detail.set.maker} ${detail.set.model}`);
      const inStages = STAGES.flatMap((stage) => (typed?.lines ?? []).filter((line) => line.stage === stage));
      expect(detail.lines.map(({ content }) => content.description)).toEqual(inStages.map((l) => l.description));
    }
    expect(new Set(lines.map(({ content }) => content.stage))).toEqual(new Set(STAGES));
    expect(new Set(lines.map(({ content }) => content.kind))).toEqual(new Set(LINE_KINDS));
  });

  test('the collector sees their own sets and estimates, and no other', async () => {
    const collector = await signedIn('collector@quayside.example');
    const own = await itemsOf<SetSummary>(collector, '/api/sets?state=all&pageSize=100');
    expect(own.length).toBe(SETS.filter(({ owner }) => owner === 'okafor').length);
    expect(new Set(own.map(({ ownerName }) => ownerName))).toEqual(new Set(['Wren Okafor']));
    const estimates = await itemsOf<EstimateSummary>(collector, '/api/estimates?state=all&pageSize=100');
    expect(new Set(estimates.map(({ ownerName }) => ownerName))).toEqual(new Set(['Wren Okafor']));
    const [other] = await itemsOf<SetSummary>(restorer, '/api/sets?q=Porthole');
    await collector.get(`/api/sets/${other?.id}`).expect(404);
  });

  test('nothing is dated after the day it is made', () => {
    const newest = app.database.sqlite
      .prepare(
        'select max(at) as at from (select max(updated_at) as at from sets union select max(updated_at) from estimates)',
      )
      .get() as { at: number };
    expect(newest.at).toBeLessThan(NOW);
  });

  test('stopped half-way it leaves nothing, and made again it is the same', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'thenworth-seeds-'));
    const database = openDatabase(join(folder, 'thenworth.sqlite'));
    migrateDatabase(database, join(ROOT, 'server/db/migrations'), { backupFolder: folder, now: new Date(NOW) });
    database.sqlite.exec(
      "create trigger stop before insert on estimates begin select raise(abort, 'the power went'); end",
    );
    // by its message: Jest takes the driver's error for none where another spec of this process loaded the driver first
    await expect(seedDemoPractice({ ...deps, database })).rejects.toMatchObject({ message: 'the power went' });
    for (const table of ['users', 'practice', 'owners', 'sets', 'set_photos'])
      expect(database.sqlite.prepare(`select count(*) as n from ${table}`).get()).toEqual({ n: 0 });

    database.sqlite.exec('drop trigger stop');
    await seedDemoPractice({ ...deps, database });
    expect(contentOf(database)).toBe(contentOf(app.database));
    database.close();
    rmSync(folder, { recursive: true });
  });
});

/** One hash over every row but sign-ins and password hashes, which differ each time. */
function contentOf({ sqlite }: OpenDatabase): string {
  const hash = createHash('sha256');
  const queries = [
    'select id, name, email, role, disabled, created_at from users order by id',
    'select * from practice',
    ...[
      'owners',
      'sets',
      'set_hazards',
      'set_conditions',
      'set_worths',
      'set_photos',
      'estimates',
      'estimate_lines',
    ].map((table) => `select * from ${table} order by id`),
  ];
  for (const query of queries)
    for (const row of sqlite.prepare(query).raw().iterate() as Iterable<unknown[]>)
      for (const value of row) hash.update(Buffer.isBuffer(value) ? value : String(value)).update('\n');
  return hash.digest('hex');
}
