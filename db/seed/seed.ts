import { eq } from 'drizzle-orm';
import { texts } from '@/lib/text/en/seed';
import { createDesign } from '@/server/acts/createDesign';
import { createWorkshop } from '@/server/acts/createWorkshop';
import { join } from '@/server/acts/join';
import { type ActContext, type Engine, transact, type Who } from '@/server/context';
import type { Member } from '@/server/permissions';
import { seedRun } from '../schema';
import type { Db } from '../types';
import { type ExampleId, example } from './examples';
import { CAST, type CastId, createPerson, type SignIn } from './people';
import { ombryStory, type Stage, tarrelStory } from './stories';

/** Name under which the demo workshop is marked as put in. */
export const DEMO = 'demo-workshop';

export interface SeedContext {
  readonly db: Db;
  readonly engine: Engine;
  readonly now: Date;
  readonly newId: () => string;
  readonly example?: (id: ExampleId) => ReturnType<typeof example>;
}

const DAY_MS = 24 * 60 * 60 * 1000;

/**
 * Puts in the demo workshop through the acts, all or nothing, once: a second call answers null and changes nothing.
 * Answers with the sign-ins, whose passwords are kept nowhere else.
 */
export function seed(context: SeedContext): Promise<readonly SignIn[] | null> {
  const { db, now } = context;
  return db.transaction(async (tx) => {
    const [done] = await tx.select().from(seedRun).where(eq(seedRun.name, DEMO));
    if (done !== undefined) return null;
    await tx.insert(seedRun).values({ name: DEMO, ranAt: now });
    const made = {
      ines: await createPerson(tx, CAST.ines),
      piet: await createPerson(tx, CAST.piet),
      marguerite: await createPerson(tx, CAST.marguerite),
      tomas: await createPerson(tx, CAST.tomas),
    };
    const stage = await setStage(
      { ...context, db: tx },
      {
        ines: made.ines.who,
        piet: made.piet.who,
        marguerite: made.marguerite.who,
        tomas: made.tomas.who,
      },
    );
    const read = context.example ?? example;
    await createDesign(...stage.at('tomas', 40), { name: texts.hask.name, airframe: await read('hask') });
    await createDesign(...stage.at('ines', 36), { name: texts.quenletSmall.name, airframe: await read('quenlet-700') });
    await createDesign(...stage.at('ines', 34), {
      name: texts.quenletLarge.name,
      airframe: await read('quenlet-1050'),
    });
    await ombryStory(stage, await read('ombry-1000'));
    await tarrelStory(stage, await read('tarrel-620'));
    return Object.values(made).map(({ signIn }) => signIn);
  });
}

/** The workshop with its members, and a way to act as one of them some days ago. */
async function setStage(context: SeedContext, cast: Record<CastId, Who>): Promise<Stage> {
  const contextOf = (who: Who, daysAgo: number): ActContext => ({
    ...context,
    who,
    now: new Date(context.now.getTime() - daysAgo * DAY_MS),
    // No act of the demo sends a mail.
    baseUrl: 'http://127.0.0.1',
  });
  const workshop = await createWorkshop(contextOf(cast.ines, 60), { name: texts.workshop });
  for (const id of ['piet', 'marguerite', 'tomas'] as const) {
    const joining = contextOf(cast[id], 59);
    await transact(joining, (tx) => join(tx, joining, workshop.id, CAST[id].roles));
  }
  const memberOf = (id: CastId): Member => ({
    workshopId: workshop.id,
    userId: cast[id].userId,
    roles: CAST[id].roles,
  });
  return { at: (id, daysAgo) => [contextOf(cast[id], daysAgo), memberOf(id)] };
}
