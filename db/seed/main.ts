import { newId } from '@/server/context';
import { runEngine } from '@/server/engine';
import { getDb } from '../client';
import { seed } from './seed';

/** Puts in the demo workshop unless it is there, and answers with the sign-ins, or null when it was there. */
export async function main(): Promise<Awaited<ReturnType<typeof seed>>> {
  return seed({ db: await getDb(), engine: runEngine, now: new Date(), newId });
}
