import { randomUUID } from 'node:crypto';
import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { TransactionRollbackError } from 'drizzle-orm';
import { drizzle as drizzlePg } from 'drizzle-orm/node-postgres';
import { migrate as migratePg } from 'drizzle-orm/node-postgres/migrator';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import { Pool } from 'pg';
import { afterAll } from 'vitest';
import * as schema from '@/db/schema';
import type { Db, Tx } from '@/db/types';

// The real engine with the real migrations, opened once a worker: in memory, or a fresh database on the server that
// TEST_DATABASE_URL names, which is dropped again at the end.

const MIGRATIONS = { migrationsFolder: path.resolve(import.meta.dirname, '../../db/migrations') };
const shared: { opened?: Promise<Db>; close?: () => Promise<void> } = {};

async function openServer(url: string): Promise<Db> {
  const name = `foldspar_test_${randomUUID().replaceAll('-', '')}`;
  const admin = new Pool({ connectionString: url, max: 1 });
  await admin.query(`create database ${name}`);
  const target = new URL(url);
  target.pathname = `/${name}`;
  const pool = new Pool({ connectionString: target.href, max: 16 });
  let closing = false;
  // Dropping the database cuts off connections that are still saying goodbye; before that, a lost one is a fault.
  pool.on('error', (error) => {
    if (!closing) throw error;
  });
  shared.close = async () => {
    closing = true;
    await pool.end();
    await admin.query(`drop database ${name} with (force)`);
    await admin.end();
  };
  const db = drizzlePg(pool, { schema });
  await migratePg(db, MIGRATIONS);
  return db;
}

async function openMemory(): Promise<Db> {
  const engine = await PGlite.create();
  shared.close = () => engine.close();
  const db = drizzle(engine, { schema });
  await migrate(db, MIGRATIONS);
  return db;
}

afterAll(async () => {
  await shared.opened;
  await shared.close?.();
});

/** The worker's database. What is written to it stays: use `rolledBack` unless the test is about transactions themselves. */
export function testDb(): Promise<Db> {
  const url = process.env.TEST_DATABASE_URL;
  shared.opened ??= url ? openServer(url) : openMemory();
  return shared.opened;
}

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
