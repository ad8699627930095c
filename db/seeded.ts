import { drizzle } from 'drizzle-orm/node-postgres';
import { Client, type ClientConfig } from 'pg';
import { seedRun } from './schema';

/** Whether anything was ever seeded here, so that the start need not load the seed to find out. */
export async function isSeeded(config: ClientConfig): Promise<boolean> {
  const client = new Client(config);
  await client.connect();
  try {
    return (await drizzle(client).select({ name: seedRun.name }).from(seedRun).limit(1)).length > 0;
  } finally {
    await client.end();
  }
}
