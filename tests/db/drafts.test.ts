import { asc, eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { designsOf } from '@/db/queries/designs';
import { design, draftSave } from '@/db/schema';
import { archiveDesign } from '@/server/acts/archiveDesign';
import { createDesign } from '@/server/acts/createDesign';
import { renameDesign } from '@/server/acts/renameDesign';
import { saveDraft } from '@/server/acts/saveDraft';
import { newId } from '@/server/context';
import { AppError } from '@/server/problems';
import { draftIn } from '@/server/read/designs';
import { pusher } from '../support/airframes';
import { rolledBack, testDb } from '../support/db';
import { contextFor, scene } from '../support/people';

describe('a design', () => {
  it('starts from a layout with a draft of version 1 and what a list shows of it', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const made = await createDesign(designer.context, designer.member, { name: 'Pip', layout: 'pusher' });
      const draft = await draftIn(tx, designer.member, made.id);
      expect(draft).toMatchObject({ designName: 'Pip', version: 1, savedBy: 'Dina Designer' });
      const [listed] = await designsOf(tx, designer.member.workshopId);
      expect(listed).toEqual(made);
      const across = made.thumbnail.outlines.flatMap((outline) => outline.map(([, y]) => y));
      expect(Math.max(...across) - Math.min(...across)).toBeCloseTo(made.spanMm, 0);
    }));

  it('starts from a document, and a document with a fault is refused at the field', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const made = await createDesign(designer.context, designer.member, { name: 'Doc', airframe: pusher(640) });
      expect(made.spanMm).toBeCloseTo(640, 6);
      const broken = JSON.parse(JSON.stringify(pusher()));
      broken.surfaces[0].panels[0].rootChordMm = -12;
      await expect(
        createDesign(designer.context, designer.member, { name: 'Bad', airframe: broken }),
      ).rejects.toMatchObject({
        kind: 'invalid',
        extras: { errors: [expect.objectContaining({ path: 'airframe.surfaces.0.panels.0.rootChordMm' })] },
      });
      await expect(
        createDesign(designer.context, designer.member, { name: 'Bad', layout: 'balloon' }),
      ).rejects.toMatchObject({ kind: 'invalid', extras: { errors: [expect.objectContaining({ path: 'layout' })] } });
      expect(await designsOf(tx, designer.member.workshopId)).toHaveLength(1);
    }));

  it('keeps its airframe when it is renamed, and leaves the list when it is archived', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const made = await createDesign(designer.context, designer.member, { name: 'Old', airframe: pusher() });
      await renameDesign(designer.context, designer.member, made.id, { name: 'New' });
      const renamed = await draftIn(tx, designer.member, made.id);
      expect([renamed.designName, renamed.airframe.name, renamed.version]).toEqual(['New', 'Test pusher', 1]);
      await archiveDesign(designer.context, designer.member, made.id);
      expect(await designsOf(tx, designer.member.workshopId)).toEqual([]);
      const readOnly = { kind: 'conflict', detail: expect.stringContaining('archived') };
      await expect(renameDesign(designer.context, designer.member, made.id, { name: 'X' })).rejects.toMatchObject(
        readOnly,
      );
      await expect(
        saveDraft(designer.context, designer.member, made.id, 1, { airframe: pusher(650) }),
      ).rejects.toMatchObject(readOnly);
    }));

  it('of another workshop is not found by any act', () =>
    rolledBack(async (tx) => {
      const here = await scene(tx);
      const there = await scene(tx);
      const foreign = await createDesign(there.designer.context, there.designer.member, {
        name: 'Theirs',
        airframe: pusher(),
      });
      const { context, member } = here.designer;
      const tries = [
        () => renameDesign(context, member, foreign.id, { name: 'Mine' }),
        () => archiveDesign(context, member, foreign.id),
        () => saveDraft(context, member, foreign.id, 1, { airframe: pusher() }),
        () => saveDraft(context, member, newId(), 1, { airframe: pusher() }),
        () => draftIn(tx, member, foreign.id),
      ];
      for (const attempt of tries) await expect(attempt()).rejects.toMatchObject({ kind: 'not-found' });
      const [row] = await tx.select().from(design).where(eq(design.id, foreign.id));
      expect(row).toMatchObject({ name: 'Theirs', archivedAt: null, draftVersion: 1 });
    }));
});

describe('draft saves', () => {
  it('are only ever added, and a stale one is refused with the draft that stands now', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const { context, member } = designer;
      const { id } = await createDesign(context, member, { name: 'D', airframe: pusher(620) });
      const saved = await saveDraft(context, member, id, 1, { airframe: pusher(630) });
      expect(saved).toMatchObject({ designId: id, version: 2, savedBy: 'Dina Designer' });
      const stale = await saveDraft(context, member, id, 1, { airframe: pusher(640) }).catch((error: unknown) => error);
      expect(stale).toBeInstanceOf(AppError);
      expect(stale).toMatchObject({
        kind: 'stale',
        extras: { more: { current: { version: 2, airframe: pusher(630) } } },
      });
      await expect(saveDraft(context, member, id, 9, { airframe: pusher() })).rejects.toMatchObject({ kind: 'stale' });
      const rows = await tx.select().from(draftSave).where(eq(draftSave.designId, id)).orderBy(asc(draftSave.version));
      expect(rows.map((row) => [row.version, row.base])).toEqual([
        [1, null],
        [2, 1],
      ]);
      expect(JSON.parse(rows[0]?.body ?? '')).toEqual(pusher(620));
    }));

  it('made at once on one version have exactly one winner each round, and lose nothing', async () => {
    const db = await testDb();
    const { designer } = await scene(db);
    const context = contextFor(db, designer.who);
    const { id } = await createDesign(context, designer.member, { name: 'Race', airframe: pusher() });
    const CLIENTS = 16;
    const ROUNDS = 5;
    for (let base = 1; base <= ROUNDS; base += 1) {
      const tries = await Promise.allSettled(
        Array.from({ length: CLIENTS }, (_, client) =>
          saveDraft(context, designer.member, id, base, { airframe: pusher(600 + base * 20 + client) }),
        ),
      );
      const lost = tries.filter((one) => one.status === 'rejected').map((one) => one.reason);
      expect(lost).toHaveLength(CLIENTS - 1);
      for (const reason of lost) expect(reason).toMatchObject({ kind: 'stale' });
      // The winner's own drawing is what stands.
      const winner = tries.findIndex((one) => one.status === 'fulfilled');
      const standing = await draftIn(db, designer.member, id);
      expect([standing.version, standing.airframe]).toEqual([base + 1, pusher(600 + base * 20 + winner)]);
    }
    const rows = await db.select({ version: draftSave.version }).from(draftSave).where(eq(draftSave.designId, id));
    expect(rows.map((row) => row.version).toSorted((a, b) => a - b)).toEqual([1, 2, 3, 4, 5, 6]);
  });

  it('that fail half-way leave nothing behind', () =>
    rolledBack(async (tx) => {
      const { designer } = await scene(tx);
      const { id } = await createDesign(designer.context, designer.member, { name: 'Half', airframe: pusher() });
      // The version moves first and the row follows; an id that is taken makes the second step fail.
      const [first] = await tx.select().from(draftSave).where(eq(draftSave.designId, id));
      const clash = contextFor(tx, designer.who, { newId: () => first?.id ?? '' });
      await expect(saveDraft(clash, designer.member, id, 1, { airframe: pusher(700) })).rejects.toThrow();
      const [row] = await tx.select().from(design).where(eq(design.id, id));
      expect(row?.draftVersion).toBe(1);
      expect((await draftIn(tx, designer.member, id)).version).toBe(1);
    }));
});
