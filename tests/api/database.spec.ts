import { cpSync, mkdirSync, mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Sqlite from 'better-sqlite3';
import { openDatabase, type OpenDatabase } from '../../server/db/client';
import { migrateDatabase } from '../../server/db/migrate';
import { ROOT } from '../support/root';

const NOW = new Date('2026-09-15T09:00:00Z');
let folder: string;
let open: OpenDatabase | undefined;

beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'thenworth-db-'))));
afterEach(() => {
  open?.close();
  open = undefined;
  rmSync(folder, { recursive: true, force: true });
});

/** A migrations folder of its own, with the statements given, dated as given. */
function migrations(...steps: readonly { readonly when: number; readonly sql: string }[]): string {
  const path = join(folder, `migrations-${steps.length}`);
  mkdirSync(join(path, 'meta'), { recursive: true });
  const entries = steps.map(({ when }, idx) => ({ idx, version: '6', when, tag: `000${idx}_step`, breakpoints: true }));
  writeFileSync(join(path, 'meta/_journal.json'), JSON.stringify({ version: '7', dialect: 'sqlite', entries }));
  steps.forEach(({ sql }, idx) => writeFileSync(join(path, `000${idx}_step.sql`), sql));
  return path;
}
const migrate = (path: string) => {
  open ??= openDatabase(join(folder, 'practice.sqlite'));
  migrateDatabase(open, path, { backupFolder: join(folder, 'backups'), now: NOW });
  return open.sqlite;
};

const PARENT_AND_CHILD = {
  when: 1000,
  sql: `CREATE TABLE parent (id integer PRIMARY KEY, name text);--> statement-breakpoint
CREATE TABLE child (id integer PRIMARY KEY, parent_id integer REFERENCES parent(id) ON DELETE CASCADE);`,
};
/** What drizzle-kit writes for a changed column: the parent is dropped and made anew. */
const REBUILD_PARENT = {
  when: 2000,
  sql: `PRAGMA foreign_keys=OFF;--> statement-breakpoint
CREATE TABLE __new_parent (id integer PRIMARY KEY, name text NOT NULL);--> statement-breakpoint
INSERT INTO __new_parent SELECT id, name FROM parent;--> statement-breakpoint
DROP TABLE parent;--> statement-breakpoint
ALTER TABLE __new_parent RENAME TO parent;--> statement-breakpoint
PRAGMA foreign_keys=ON;`,
};

test('a table rebuild keeps the children, turns foreign keys on again, and backs the file up first', () => {
  const sqlite = migrate(migrations(PARENT_AND_CHILD));
  sqlite.exec("insert into parent values (1, 'set'); insert into child values (1, 1)");
  migrate(migrations(PARENT_AND_CHILD, REBUILD_PARENT));
  expect(sqlite.prepare('select count(*) as n from child').get()).toEqual({ n: 1 });
  expect(sqlite.pragma('foreign_keys', { simple: true })).toBe(1);
  const [backup] = readdirSync(join(folder, 'backups'));
  const copy = new Sqlite(join(folder, 'backups', backup ?? ''), { readonly: true });
  expect(copy.prepare('select name from parent').get()).toEqual({ name: 'set' });
  copy.close();
});

test('a migration that leaves a key pointing nowhere is refused', () => {
  const sqlite = migrate(migrations(PARENT_AND_CHILD));
  sqlite.exec("insert into parent values (1, 'set'); insert into child values (1, 1)");
  expect(() => migrate(migrations(PARENT_AND_CHILD, { when: 2000, sql: 'DELETE FROM parent;' }))).toThrow(
    'point nowhere',
  );
});

test('a journal out of order is refused, since the late migration would be skipped', () => {
  expect(() => migrate(migrations(PARENT_AND_CHILD, { when: 900, sql: 'CREATE TABLE late (id integer);' }))).toThrow(
    '0001_step is dated before',
  );
});

test('a file written by a newer version is left alone', () => {
  migrate(migrations(PARENT_AND_CHILD, { when: 2000, sql: 'CREATE TABLE later (id integer);' }));
  expect(() => migrate(migrations(PARENT_AND_CHILD))).toThrow('newer version');
});

test('the shipped migrations are in order, and running them again changes nothing', () => {
  const shipped = join(folder, 'shipped');
  cpSync(join(ROOT, 'server/db/migrations'), shipped, { recursive: true });
  const sqlite = migrate(shipped);
  const schema = () => sqlite.prepare('select sql from sqlite_master order by name').all();
  const before = schema();
  migrate(shipped);
  expect(schema()).toEqual(before);
});
