import type { Airframe } from '@/lib/airframe/schema/airframe';
import { texts } from '@/lib/text/en/seed';
import { createComment } from '@/server/acts/createComment';
import { createDesign } from '@/server/acts/createDesign';
import { createThread } from '@/server/acts/createThread';
import { giveVerdict } from '@/server/acts/giveVerdict';
import { releaseRevision } from '@/server/acts/releaseRevision';
import type { RevisionPlace } from '@/server/acts/revisions';
import { saveDraft } from '@/server/acts/saveDraft';
import { setThreadState } from '@/server/acts/setThreadState';
import type { ActContext } from '@/server/context';
import type { Member } from '@/server/permissions';
import type { CastId } from './people';
import { tarrelSteps } from './tarrel';

export interface Stage {
  /** Context and membership of one of the cast, so many days before the seed ran. */
  readonly at: (id: CastId, daysAgo: number) => [context: ActContext, member: Member];
}

/** A trainer, released once, read and not yet judged. */
export async function ombryStory(stage: Stage, airframe: Airframe): Promise<void> {
  const words = texts.ombry;
  const { id: designId } = await createDesign(...stage.at('tomas', 30), { name: words.name, airframe });
  await releaseRevision(...stage.at('tomas', 29), designId, {
    reason: words.reason,
    expectedEffect: words.effect,
    draftVersion: 1,
  });
  const place = { designId, number: 1 };
  await giveVerdict(...stage.at('marguerite', 28), place, { verdict: 'seen', note: words.seen });
}

/** A pusher over three revisions: flown, held, and good to cut. */
export async function tarrelStory(stage: Stage, airframe: Airframe): Promise<void> {
  const steps = tarrelSteps(airframe);
  const { id: designId } = await createDesign(...stage.at('ines', 25), {
    name: texts.tarrel.name,
    airframe: steps.first,
  });
  await longerTail(stage, { designId, number: 1 }, steps.longerTail);
  await largerFins(stage, { designId, number: 2 }, steps.largerFins);
  await packForward(stage, { designId, number: 3 }, steps.packForward);
}

async function longerTail(stage: Stage, place: RevisionPlace, airframe: Airframe): Promise<void> {
  const words = texts.tarrel.one;
  await saveDraft(...stage.at('ines', 24), place.designId, 1, { airframe });
  await releaseRevision(...stage.at('ines', 23), place.designId, {
    reason: words.reason,
    expectedEffect: words.effect,
    draftVersion: 2,
  });
  const asked = await createThread(...stage.at('marguerite', 22), place, {
    anchor: { kind: 'element', key: 'tail' },
    text: words.question,
  });
  await createComment(...stage.at('ines', 21), place, asked.id, { text: words.answer });
  await setThreadState(...stage.at('marguerite', 20), place, asked.id, { state: 'closed' });
  await giveVerdict(...stage.at('marguerite', 20), place, { verdict: 'goodToCut', note: words.verdict });
  await createThread(...stage.at('piet', 15), place, { anchor: { kind: 'element', key: 'fin' }, text: words.finding });
}

async function largerFins(stage: Stage, place: RevisionPlace, airframe: Airframe): Promise<void> {
  const words = texts.tarrel.two;
  await saveDraft(...stage.at('tomas', 13), place.designId, 2, { airframe });
  await releaseRevision(...stage.at('tomas', 12), place.designId, {
    reason: words.reason,
    expectedEffect: words.effect,
    draftVersion: 3,
  });
  await giveVerdict(...stage.at('marguerite', 11), place, { verdict: 'hold', note: words.hold });
  await createThread(...stage.at('piet', 10), place, { anchor: { kind: 'element', key: 'pack' }, text: words.where });
}

async function packForward(stage: Stage, place: RevisionPlace, airframe: Airframe): Promise<void> {
  const words = texts.tarrel.three;
  await saveDraft(...stage.at('ines', 8), place.designId, 3, { airframe });
  await releaseRevision(...stage.at('ines', 7), place.designId, {
    reason: words.reason,
    expectedEffect: words.effect,
    draftVersion: 4,
  });
  await createThread(...stage.at('marguerite', 6), place, { anchor: { kind: 'element', key: 'pod' }, text: words.ask });
  await giveVerdict(...stage.at('marguerite', 6), place, { verdict: 'goodToCut', note: words.verdict });
}
