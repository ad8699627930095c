import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { TransactionRollbackError } from 'drizzle-orm';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import * as schema from '@/db/schema';
import type { Db, Tx } from '@/db/types';

// The real engine, in memory, with the real migrations. Opening it takes seconds, so a worker opens it once.

const MIGRATIONS = path.resolve(import.meta.dirname, '../../db/migrations');
const shared: { opened?: Promise<Db> } = {};

async function open(): Promise<Db> {
  const db = drizzle(await PGlite.create(), { schema });
  await migrate(db, { migrationsFolder: MIGRATIONS });
  return db;
}

/** The worker's database. What is written to it stays: use `rolledBack` unless the test is about transactions themselves. */
export const testDb = (): Promise<Db> => (shared.opened ??= open());

/** Runs a test inside a transaction that is rolled back, so that tests do not see each other. */
export async function rolledBack(body: (tx: Tx) => Promise<void>): Promise<void> {
  const db = await testDb();
  const run = db.transaction(async (tx) => {
    await body(tx);
    tx.rollback();
  });
  await run.catch((error: unknown) => {
    if (!(error instanceof TransactionRollbackError)) throw error;
  });
}
