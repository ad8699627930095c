import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Client, type ClientConfig } from 'pg';

/** Any number, as long as every version of the application uses the same. */
const MIGRATION_LOCK = 7_366_201;

/**
 * Brings the database to the newest schema. Several processes may call this at once: PostgreSQL's advisory lock lets one
 * of them work while the others wait, and these then find nothing to do.
 */
export async function migrateDatabase(config: ClientConfig, migrationsFolder: string): Promise<void> {
  const client = new Client(config);
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await migrate(drizzle(client), { migrationsFolder });
  } finally {
    await client.query('select pg_advisory_unlock($1)', [MIGRATION_LOCK]);
    await client.end();
  }
}
