import Sqlite from 'better-sqlite3';
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';
import { foldText } from '../../src/domain/text/fold';
import * as schema from './schema';

export type Schema = typeof schema;
export type Database = BetterSQLite3Database<Schema>;

export interface OpenDatabase {
  readonly db: Database;
  /** The driver's own connection, for pragmas, backups and migrations. */
  readonly sqlite: Sqlite.Database;
  close(): void;
}

/**
 * Opens the practice's file. Write-ahead log with FULL synchronisation: a commit outlives a power cut, which matters
 * more here than the speed of many small writes.
 */
export function openDatabase(file: string): OpenDatabase {
  const sqlite = new Sqlite(file);
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
  sqlite.pragma('busy_timeout = 5000');
  // SQLite's own lower() knows only the letters A to Z
  sqlite.function('fold', { deterministic: true }, (text) => (typeof text === 'string' ? foldText(text) : ''));
  return { db: drizzle(sqlite, { schema }), sqlite, close: () => sqlite.close() };
}
