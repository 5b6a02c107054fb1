import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import supertest from 'supertest';
import type { Role } from '../../src/domain/access/policy';
import { createApp } from '../../server/app';
import { composeServices } from '../../server/composition';
import { openDatabase } from '../../server/db/client';
import { migrateDatabase } from '../../server/db/migrate';
import { loadReferenceData } from '../../server/reference-data/reference-data';
import { ROOT } from './root';

export { ROOT };
export const PASSWORD = 'correct horse battery';

/** A clock that tests move by hand. */
export interface Clock {
  now: number;
}

export type TestApp = Awaited<ReturnType<typeof startTestApp>>;

/**
 * The real application over a real SQLite file in a folder of its own, with a practice and one active person a role:
 * `administrator@test.example` and so on. `folder` opens the file of an earlier app again.
 */
export async function startTestApp(options: { folder?: string; people?: boolean } = {}) {
  const folder = options.folder ?? mkdtempSync(join(tmpdir(), 'thenworth-test-'));
  const clock: Clock = { now: Date.UTC(2026, 8, 15, 9, 0, 0) };
  const now = () => clock.now;
  const database = openDatabase(join(folder, 'thenworth.sqlite'));
  migrateDatabase(database, join(ROOT, 'server/db/migrations'), {
    backupFolder: join(folder, 'backups'),
    now: new Date(clock.now),
  });
  const services = composeServices({
    database,
    referenceData: loadReferenceData(join(ROOT, 'data')),
    fontsFolder: join(ROOT, 'node_modules/@expo-google-fonts/lato'),
    now,
  });
  const app = createApp({
    database,
    services,
    sessionSecret: 'a secret for tests only',
    https: false,
    now,
    log: pino({ level: 'silent' }),
    pagesFolder: null,
    checkReplies: true,
  });
  if ((options.people ?? true) && !services.accounts.hasAnyone()) await addPeople(services);

  /** Someone signed in with the role, keeping cookies. */
  async function agentAs(role: Role) {
    const agent = supertest.agent(app);
    await agent
      .post('/api/session')
      .send({ email: `${role}@test.example`, password: PASSWORD })
      .expect(200);
    return agent;
  }

  return {
    app,
    services,
    database,
    clock,
    folder,
    anyone: () => supertest.agent(app),
    agentAs,
    /** Closes the database; the folder goes too unless it is kept for a next start. */
    close: (keep = false) => {
      database.close();
      if (!keep) rmSync(folder, { recursive: true, force: true });
    },
  };
}

async function addPeople(services: ReturnType<typeof composeServices>): Promise<void> {
  await services.accounts.setUp({
    practiceName: 'Test Set Works',
    name: 'Ada Administrator',
    email: 'administrator@test.example',
    password: PASSWORD,
  });
  const administrator = services.accounts.authorizeSystem();
  for (const [name, role] of [
    ['Rui Restorer', 'restorer'],
    ['Ana Appraiser', 'appraiser'],
    ['Cal Collector', 'collector'],
  ] as const)
    await services.accounts.addActiveUser(administrator, {
      name,
      role,
      email: `${role}@test.example`,
      password: PASSWORD,
    });
}
