import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { dirname, join } from 'node:path';
import { pino } from 'pino';
import { DEMO_ACCOUNTS, DEMO_PASSWORD, seedDemoPractice } from '../seeds/demo';
import { createApp } from './app';
import { composeServices, type Services } from './composition';
import { readConfig } from './config';
import { openDatabase } from './db/client';
import { migrateDatabase } from './db/migrate';
import { stopGently } from './http/stop';
import { loadReferenceData } from './reference-data/reference-data';

const HOST = '127.0.0.1';
const say = (line: string) => process.stdout.write(`${line}\n`);

/** The project's folder, whether this runs from its source or from `dist`. */
function projectRoot(): string {
  let folder = import.meta.dirname;
  while (!existsSync(join(folder, 'package.json'))) folder = dirname(folder);
  return folder;
}

/** Signs the session cookies; made once, readable by the owner of the data folder alone. */
function sessionSecret(dataFolder: string): string {
  const file = join(dataFolder, 'session-secret');
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}

async function start(): Promise<void> {
  const config = readConfig(process.env, process.argv.slice(2));
  const root = projectRoot();
  mkdirSync(config.dataFolder, { recursive: true });
  const log = pino({ level: process.env['LOG_LEVEL'] ?? 'warn' });

  const referenceData = loadReferenceData(join(root, 'data'));
  const database = openDatabase(join(config.dataFolder, 'thenworth.sqlite'));
  migrateDatabase(database, join(root, 'server/db/migrations'), {
    backupFolder: join(config.dataFolder, 'backups'),
    now: new Date(),
  });

  const fontsFolder = join(root, 'node_modules/@expo-google-fonts/lato');
  const services = composeServices({ database, referenceData, fontsFolder, now: Date.now });
  if (config.demo && !services.accounts.hasAnyone()) {
    say('Setting up the demo practice …');
    await seedDemoPractice({ database, referenceData, fontsFolder, now: Date.now() });
  }

  const app = createApp({
    database,
    services,
    sessionSecret: sessionSecret(config.dataFolder),
    https: config.https,
    now: Date.now,
    log,
    pagesFolder: join(root, 'dist/web'),
    checkReplies: process.env['NODE_ENV'] === 'development',
  });
  const server = createServer(app);
  stopGently(server, () => database.close());
  server.listen(config.port, HOST, () => {
    const address = server.address();
    const port = typeof address === 'object' && address !== null ? address.port : config.port;
    say(`\nThenworth is at http://${HOST}:${port}/  (data in ${config.dataFolder})\n${welcome(services)}`);
  });
}

/** Whom to sign in as: the demo accounts, or the first administrator still to be named. */
function welcome({ accounts, practice }: Services): string {
  if (practice.settings()?.demo === true)
    return [`Demo accounts, password ${DEMO_PASSWORD}:`, ...DEMO_ACCOUNTS.map((a) => `  ${a.email}  ${a.role}`)].join(
      '\n',
    );
  return accounts.hasAnyone() ? '' : 'A clean practice: open the address to name its first administrator.';
}

start().catch((error: unknown) => {
  process.stderr.write(`Thenworth did not start. ${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
