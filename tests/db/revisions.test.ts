import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { artefact, revision as revisions } from '@/db/schema';
import type { Tx } from '@/db/types';
import { createComment } from '@/server/acts/createComment';
import { createDesign } from '@/server/acts/createDesign';
import { createThread } from '@/server/acts/createThread';
import { giveVerdict } from '@/server/acts/giveVerdict';
import { releaseRevision } from '@/server/acts/releaseRevision';
import { saveDraft } from '@/server/acts/saveDraft';
import { setThreadState } from '@/server/acts/setThreadState';
import { sha256 } from '@/server/ids';
import { exportIn, revisionAnswer, revisionsIn, threadsIn, verdictsIn } from '@/server/read/revisions';
import { pusher } from '../support/airframes';
import { rolledBack } from '../support/db';
import { chainEngine } from '../support/engine';
import { contextFor, joinWorkshop, person, scene } from '../support/people';

const WHY = { reason: 'Longer booms.', expectedEffect: 'Calmer in pitch.' };

async function released(tx: Tx) {
  const cast = await scene(tx);
  const { context, member } = cast.designer;
  const { id: designId } = await createDesign(context, member, { name: 'Pip', airframe: pusher(620) });
  const first = await releaseRevision(context, member, designId, { ...WHY, draftVersion: 1 });
  return { ...cast, designId, first, place: { designId, number: 1 } };
}

describe('a release', () => {
  it('freezes the airframe, its hash, figures, parts and layout under the next number', () =>
    rolledBack(async (tx) => {
      const { designer, designId, first } = await released(tx);
      expect(first).toMatchObject({ number: 1, state: 'released', ...WHY, releasedBy: { name: 'Dina Designer' } });
      const [row] = await tx.select().from(revisions).where(eq(revisions.id, first.id));
      expect(sha256(row?.body ?? '')).toBe(first.sha256);
      expect(row?.spanMm).toBeCloseTo(620, 6);
      const { frozen, airframe } = await exportIn(tx, designer.member, designId, 1);
      expect(airframe).toEqual(pusher(620));
      expect(frozen.development.parts.length).toBeGreaterThan(3);
      const placed = frozen.layout.sheets.flatMap((sheet) => sheet.placements.map((placement) => placement.partKey));
      expect(placed.toSorted()).toEqual(frozen.development.parts.map((part) => part.key).toSorted());

      await saveDraft(designer.context, designer.member, designId, 1, { airframe: pusher(660) });
      const second = await releaseRevision(designer.context, designer.member, designId, { ...WHY, draftVersion: 2 });
      expect(second.number).toBe(2);
      const [stored] = await tx.select().from(revisions).where(eq(revisions.id, second.id));
      expect(stored?.parentRevisionId).toBe(first.id);
      expect((await revisionsIn(tx, designer.member, designId)).map((one) => one.number)).toEqual([2, 1]);
    }));

  it('is refused when the draft has moved on, before the release or while it was computed', () =>
    rolledBack(async (tx) => {
      const { designer, designId } = await released(tx);
      const { context, member } = designer;
      await saveDraft(context, member, designId, 1, { airframe: pusher(640) });
      const moved = { kind: 'conflict', detail: expect.stringContaining('moved on') };
      await expect(releaseRevision(context, member, designId, { ...WHY, draftVersion: 1 })).rejects.toMatchObject(
        moved,
      );
      const slow = contextFor(tx, designer.who, {
        engine: async (request, signal) => {
          await saveDraft(context, member, designId, 2, { airframe: pusher(650) });
          return chainEngine(request, signal);
        },
      });
      await expect(releaseRevision(slow, member, designId, { ...WHY, draftVersion: 2 })).rejects.toMatchObject(moved);
      expect(await revisionsIn(tx, member, designId)).toHaveLength(1);
    }));

  it('reads the same whatever a later engine would compute', () =>
    rolledBack(async (tx) => {
      const { designer, designId, first } = await released(tx);
      const before = await exportIn(tx, designer.member, designId, 1);
      const later = contextFor(tx, designer.who, {
        engine: async (request) => {
          const answer = await chainEngine(request);
          if (!answer.ok || answer.kind !== 'freeze') throw new RangeError('the chain must freeze');
          const figures = { ...answer.frozen.figures, engine: 'later', values: { spanMm: { value: 1 } } };
          return { ...answer, engine: 'later', frozen: { ...answer.frozen, figures } };
        },
      });
      await saveDraft(later, designer.member, designId, 1, { airframe: pusher(700) });
      await releaseRevision(later, designer.member, designId, { ...WHY, draftVersion: 2 });
      expect(await exportIn(tx, designer.member, designId, 1)).toEqual(before);
      const answer = await revisionAnswer(tx, designer.member, designId, 1);
      expect([answer.sha256, answer.figures]).toEqual([first.sha256, before.frozen.figures]);
      expect((await revisionAnswer(tx, designer.member, designId, 2)).figures.engine).toBe('later');
    }));

  it('stores nothing when the engine refuses the airframe', () =>
    rolledBack(async (tx) => {
      const { designer, designId } = await released(tx);
      const refusing = contextFor(tx, designer.who, {
        engine: async () => ({
          ok: false,
          problems: [{ code: 'x', path: 'gear.0', message: 'not built yet: gear.0' }],
        }),
      });
      await expect(
        releaseRevision(refusing, designer.member, designId, { ...WHY, draftVersion: 1 }),
      ).rejects.toMatchObject({ kind: 'invalid', extras: { errors: [{ path: 'airframe.gear.0' }] } });
      expect(await revisionsIn(tx, designer.member, designId)).toHaveLength(1);
      expect(await tx.select().from(artefact)).toHaveLength(3);
    }));
});

describe('a comment thread', () => {
  const anchor = { kind: 'element' as const, key: 'fin' };

  it('is numbered within its revision, answered, closed and opened again', () =>
    rolledBack(async (tx) => {
      const { reviewer, designer, place, designId } = await released(tx);
      const one = await createThread(reviewer.context, reviewer.member, place, { anchor, text: 'Too small?' });
      const two = await createThread(designer.context, designer.member, place, { anchor, text: 'Hinge?' });
      expect([one.number, two.number, one.state]).toEqual([1, 2, 'open']);
      await createComment(designer.context, designer.member, place, one.id, { text: 'Grown by a fifth.' });
      const closed = await setThreadState(reviewer.context, reviewer.member, place, one.id, { state: 'closed' });
      expect(closed).toMatchObject({ state: 'closed', closedBy: 'Rut Reviewer' });
      expect(closed.comments.map((row) => [row.author.name, row.text])).toEqual([
        ['Rut Reviewer', 'Too small?'],
        ['Dina Designer', 'Grown by a fifth.'],
      ]);
      await expect(
        createComment(designer.context, designer.member, place, one.id, { text: 'More' }),
      ).rejects.toMatchObject({ kind: 'conflict' });
      await expect(
        setThreadState(reviewer.context, reviewer.member, place, one.id, { state: 'closed' }),
      ).rejects.toMatchObject({ kind: 'conflict' });
      expect((await revisionsIn(tx, designer.member, designId))[0]?.openThreads).toBe(1);
      const opened = await setThreadState(designer.context, designer.member, place, one.id, { state: 'open' });
      expect(opened).toMatchObject({ state: 'open', closedBy: null });
      expect(await threadsIn(tx, designer.member, designId, 1)).toHaveLength(2);
    }));

  it('of one revision is not found through another', () =>
    rolledBack(async (tx) => {
      const { designer, place, designId } = await released(tx);
      const { context, member } = designer;
      const thread = await createThread(context, member, place, { anchor, text: 'Here' });
      await releaseRevision(context, member, designId, { ...WHY, draftVersion: 1 });
      const other = { designId, number: 2 };
      await expect(createComment(context, member, other, thread.id, { text: 'There' })).rejects.toMatchObject({
        kind: 'not-found',
      });
      await expect(setThreadState(context, member, other, thread.id, { state: 'closed' })).rejects.toMatchObject({
        kind: 'not-found',
      });
    }));
});

describe('a verdict', () => {
  it('on one’s own release is kept, shown, and moves nothing', () =>
    rolledBack(async (tx) => {
      const { workshopId, designId, place } = await released(tx);
      const both = await person(tx, 'Rita Reviewer-Designer');
      const member = await joinWorkshop(tx, both, workshopId, ['designer', 'reviewer']);
      const context = contextFor(tx, both);
      await giveVerdict(context, member, place, { verdict: 'hold', note: 'Spar too short.' });
      await saveDraft(context, member, designId, 1, { airframe: pusher(630) });
      await releaseRevision(context, member, designId, { ...WHY, draftVersion: 2 });
      const own = await giveVerdict(context, member, { designId, number: 2 }, { verdict: 'goodToCut', note: '' });
      expect(own.counts).toBe(false);
      const listed = await revisionsIn(tx, member, designId);
      expect(listed.map((one) => [one.number, one.state])).toEqual([
        [2, 'released'],
        [1, 'held'],
      ]);
      expect(await verdictsIn(tx, member, designId, 2)).toMatchObject([{ verdict: 'goodToCut', counts: false }]);
    }));

  it('of each person the newest is in force: one hold outweighs, and lifting it lets the others speak', () =>
    rolledBack(async (tx) => {
      const { workshopId, reviewer, designer, designId, place } = await released(tx);
      const second = await person(tx, 'Sam Second');
      const member = await joinWorkshop(tx, second, workshopId, ['reviewer']);
      const context = contextFor(tx, second);
      const state = async () => (await revisionsIn(tx, designer.member, designId))[0]?.state;

      await giveVerdict(reviewer.context, reviewer.member, place, { verdict: 'seen', note: '' });
      expect(await state()).toBe('released');
      await giveVerdict(reviewer.context, reviewer.member, place, { verdict: 'goodToCut', note: '' });
      expect(await state()).toBe('goodToCut');
      await giveVerdict(context, member, place, { verdict: 'hold', note: 'Check the spar.' });
      expect(await state()).toBe('held');
      await giveVerdict(context, member, place, { verdict: 'seen', note: 'Checked.' });
      expect(await state()).toBe('goodToCut');
      expect(await verdictsIn(tx, designer.member, designId, 1)).toHaveLength(4);
    }));
});
