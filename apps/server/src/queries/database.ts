import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import type BetterSqlite3 from 'better-sqlite3';
import knex, { type Knex } from 'knex';
import BetterSqliteClient from 'knex/lib/dialects/better-sqlite3/index.js';
import { migrationSource } from '../../../../db/migration-source.ts';

/** Knex on better-sqlite3, with transactions that take the write lock at once: none can fail half-way for another's. */
class ImmediateClient extends BetterSqliteClient {
  override transaction(...args: Parameters<Knex.Client['transaction']>) {
    const transaction = super.transaction(...args);
    const undo: (connection: BetterSqlite3.Database, error: unknown) => unknown =
      transaction.rollback.bind(transaction);
    const begin = (connection: BetterSqlite3.Database) => Promise.resolve(connection.exec('BEGIN IMMEDIATE'));
    const rollback = (connection: BetterSqlite3.Database, error: unknown) => {
      // A full disk makes SQLite undo everything by itself; a ROLLBACK would then fail, and hide the reason.
      if (!connection.inTransaction) connection.exec('BEGIN');
      return undo(connection, error);
    };
    return Object.assign(transaction, { begin, rollback });
  }
}

/**
 * Opens the record. One connection: SQLite has one writer, and better-sqlite3 answers synchronously.
 * Throws when the durability that we promise cannot be had.
 */
export async function openDatabase(filename: string): Promise<Knex> {
  if (filename !== ':memory:') mkdirSync(dirname(filename), { recursive: true });
  const db = knex({
    client: ImmediateClient,
    connection: { filename },
    useNullAsDefault: true,
    // An error names its statement and not the values in it: those are patients, and errors are logged.
    compileSqlOnError: false,
    pool: { min: 1, max: 1, afterCreate: prepare },
    migrations: { migrationSource },
  });
  await db.raw('select 1');
  return db;
}

export async function migrateDatabase(db: Knex): Promise<void> {
  await db.migrate.latest();
}

function prepare(
  connection: BetterSqlite3.Database,
  done: (error: Error | null, connection: unknown) => void,
) {
  try {
    const journal = connection.pragma('journal_mode = WAL', { simple: true });
    // After WAL and on every open: the driver falls back to NORMAL by itself, and a power cut would then lose answered writes.
    connection.pragma('synchronous = FULL');
    connection.pragma('foreign_keys = ON');
    // Else INSERT OR REPLACE deletes a row past the triggers that keep the record append-only.
    connection.pragma('recursive_triggers = ON');
    connection.pragma('trusted_schema = OFF');
    connection.pragma('busy_timeout = 5000');
    const read = (name: string) => connection.pragma(name, { simple: true });
    if (read('synchronous') !== 2) throw new Error('the database does not keep synchronous=FULL');
    if (read('foreign_keys') !== 1) throw new Error('the database does not keep foreign keys');
    if (journal !== 'wal' && !connection.memory)
      throw new Error(`the database does not keep a write-ahead log (journal mode ${String(journal)})`);
    done(null, connection);
  } catch (error) {
    done(error instanceof Error ? error : new Error(String(error)), connection);
  }
}
