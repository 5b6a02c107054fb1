import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type Sqlite from 'better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { backUp } from './backup';
import type { OpenDatabase } from './client';

interface Journal {
  readonly entries: readonly { readonly tag: string; readonly when: number }[];
}

/**
 * Brings the file up to the newest schema. Foreign keys are off meanwhile: SQLite rebuilds a table by dropping it, and
 * with keys on that would silently delete the children of an ON DELETE CASCADE key. A file with data is backed up first.
 * Throws, leaving the file as it was, when the journal is out of order (drizzle would skip the late one in silence),
 * when the file comes from a newer version, or when a key points nowhere afterwards.
 */
export function migrateDatabase(
  open: OpenDatabase,
  migrationsFolder: string,
  options: { readonly backupFolder: string; readonly now: Date },
): void {
  const newest = newestInOrder(readJournal(migrationsFolder));
  const applied = newestApplied(open.sqlite);
  if (applied !== null && applied > newest)
    throw new Error('This database was written by a newer version of the program. Start that version instead.');
  if (applied === newest) return;
  if (applied !== null) backUp(open.sqlite, options.backupFolder, options.now);

  open.sqlite.pragma('foreign_keys = OFF');
  try {
    migrate(open.db, { migrationsFolder });
    const broken = open.sqlite.pragma('foreign_key_check') as readonly { readonly table: string }[];
    if (broken.length > 0)
      throw new Error(
        `After migrating, ${broken.length} rows point nowhere (first in ${broken[0]?.table}). Restore the backup.`,
      );
  } finally {
    open.sqlite.pragma('foreign_keys = ON');
  }
}

function readJournal(folder: string): Journal {
  return JSON.parse(readFileSync(join(folder, 'meta', '_journal.json'), 'utf8')) as Journal;
}

function newestInOrder({ entries }: Journal): number {
  let newest = 0;
  for (const { tag, when } of entries) {
    if (when <= newest)
      throw new Error(`Migration ${tag} is dated before the one it follows; it would be skipped. Generate it anew.`);
    newest = when;
  }
  return newest;
}

function newestApplied(sqlite: Sqlite.Database): number | null {
  const known = sqlite.prepare("select 1 from sqlite_master where name = '__drizzle_migrations'").get();
  if (known === undefined) return null;
  const row = sqlite.prepare('select max(created_at) as newest from __drizzle_migrations').get() as {
    newest: number | null;
  };
  return row.newest;
}
