import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import type Sqlite from 'better-sqlite3';

/** Writes a complete, compact copy of the open database into `folder` and answers its path. */
export function backUp(sqlite: Sqlite.Database, folder: string, now: Date): string {
  mkdirSync(folder, { recursive: true });
  const file = join(folder, `thenworth-${now.toISOString().replace(/[:.]/g, '-')}.sqlite`);
  sqlite.prepare('VACUUM INTO ?').run(file);
  return file;
}
