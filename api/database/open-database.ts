import { mkdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import Sqlite from 'better-sqlite3';
import { LRUCache } from 'lru-cache';
import { type BetterSQLite3Database, drizzle } from 'drizzle-orm/better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';

/** What stores are written against; the engine behind it is named here alone. */
export type Db = BetterSQLite3Database;

export interface Database {
  db: Db;
  /**
   * Runs `work` in one BEGIN IMMEDIATE transaction: other writers wait, all or nothing.
   * Synchronous on purpose: an awaited statement would run outside it. Nested calls join
   * the outer transaction.
   *
   * @throws whatever `work` throws, after rolling back; TypeError when `work` returns a promise
   */
  immediately<T>(work: () => T): T;
  /** Trades durability for speed while loading a demo market; the file is synced at the end. */
  loading<T>(work: () => T): T;
  /** Folds the write-ahead log into the file and closes it. */
  close(): void;
}

/** The database was written by a newer version of the product. */
export class NewerDatabase extends Error {}

/**
 * Opens (or makes) the database and brings it up to date.
 *
 * @param file path, or ':memory:'
 * @param migrationsFolder the folder with drizzle's journal
 * @throws NewerDatabase when the file holds migrations that this version does not know
 */
export function openDatabase(file: string, migrationsFolder: string): Database {
  if (file !== ':memory:') mkdirSync(dirname(file), { recursive: true });
  const sqlite = new Sqlite(file, { timeout: 5000 });
  sqlite.pragma('journal_mode = WAL');
  sqlite.pragma('synchronous = FULL');
  sqlite.pragma('foreign_keys = ON');
  sqlite.pragma('temp_store = MEMORY');
  sqlite.pragma('cache_size = -65536');
  keepStatements(sqlite);
  refuseNewer(sqlite, file, migrationsFolder);
  const db = drizzle(sqlite);
  // Concurrent starts must not both migrate: drizzle's migrator runs in a transaction of its own, deferred.
  migrate(db, { migrationsFolder });
  const immediately = <T>(work: () => T): T => {
    if (sqlite.inTransaction) return work();
    return sqlite
      .transaction(() => {
        const result = work();
        if (result instanceof Promise) throw new TypeError('a transaction must be synchronous');
        return result;
      })
      .immediate();
  };
  return {
    db,
    immediately,
    loading: (work) => {
      sqlite.pragma('synchronous = OFF');
      try {
        return work();
      } finally {
        sqlite.pragma('synchronous = FULL');
        sqlite.pragma('wal_checkpoint(TRUNCATE)');
        sqlite.exec('analyze');
      }
    },
    close: () => {
      sqlite.pragma('optimize');
      sqlite.pragma('wal_checkpoint(TRUNCATE)');
      sqlite.close();
    },
  };
}

/**
 * Compiling a statement costs more than running most of them, and queries that are built anew
 * come out as the same text again and again: keeps what was compiled by its text.
 */
function keepStatements(sqlite: Sqlite.Database): void {
  const compile = sqlite.prepare.bind(sqlite);
  const kept = new LRUCache<string, Sqlite.Statement>({ max: 500 });
  sqlite.prepare = ((text: string) => {
    let statement = kept.get(text);
    if (!statement) kept.set(text, (statement = compile(text)));
    return statement;
  }) as typeof sqlite.prepare;
}

function refuseNewer(sqlite: Sqlite.Database, file: string, migrationsFolder: string): void {
  const known = JSON.parse(readFileSync(join(migrationsFolder, 'meta', '_journal.json'), 'utf8')) as { entries: { when: number }[] };
  const newestKnown = Math.max(0, ...known.entries.map((entry) => entry.when));
  const hasTable = sqlite.prepare("select 1 from sqlite_master where type = 'table' and name = '__drizzle_migrations'").get();
  if (!hasTable) return;
  const { newest } = sqlite.prepare('select max(created_at) as newest from __drizzle_migrations').get() as { newest: number | null };
  if (newest !== null && newest > newestKnown) {
    sqlite.close();
    throw new NewerDatabase(
      `The database ${file} was written by a newer version of Sealyard. Start that version, or restore a backup from before it; a database is never migrated down.`,
    );
  }
}
