import { drizzle } from 'drizzle-orm/node-postgres';
import { Pool, type PoolConfig } from 'pg';
import { databaseConfig } from './address';
import * as schema from './schema';
import type { Db } from './types';

export type { Db, Tx } from './types';

export interface OpenDb {
  readonly db: Db;
  close(): Promise<void>;
}

declare global {
  // Kept on the global object, because a development server loads this module again after each edit.
  var foldsparDb: OpenDb | undefined;
}

/** Opens a pool of its own. The application wants `getDb`; this is for scripts and tests. */
export function openDb(config: PoolConfig): OpenDb {
  const pool = new Pool({ max: 8, connectionTimeoutMillis: 10_000, ...config });
  // A connection that breaks while nobody uses it is replaced at the next query; without a listener it would end the process.
  pool.on('error', (error) =>
    console.error(JSON.stringify({ level: 'warn', where: 'database pool', message: error.message })),
  );
  return { db: drizzle(pool, { schema }), close: () => pool.end() };
}

/**
 * The application's database: one pool a process, opened at the first call.
 * Throws RangeError when no database is configured, and during the build, where a page that asked for data would be frozen.
 */
export async function getDb(): Promise<Db> {
  if (process.env.NEXT_PHASE === 'phase-production-build')
    throw new RangeError(
      'the database was asked for during the build; await headers(), cookies() or connection() first',
    );
  globalThis.foldsparDb ??= openDb(databaseConfig());
  return globalThis.foldsparDb.db;
}

/** Closes the application's pool, if it is open. */
export async function closeDb(): Promise<void> {
  const open = globalThis.foldsparDb;
  globalThis.foldsparDb = undefined;
  await open?.close();
}
