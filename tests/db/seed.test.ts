import { eq } from 'drizzle-orm';
import { expect, it, vi } from 'vitest';
import { designsOf } from '@/db/queries/designs';
import { membersOf } from '@/db/queries/members';
import { mailOutbox, seedRun, workshop } from '@/db/schema';
import { example } from '@/db/seed/examples';
import { CAST } from '@/db/seed/people';
import { seed } from '@/db/seed/seed';
import { canonicalText } from '@/lib/airframe/canonical';
import { getAuth } from '@/server/auth';
import { newId } from '@/server/context';
import { draftIn } from '@/server/read/designs';
import { revisionAnswer, revisionsIn, threadsIn, verdictsIn } from '@/server/read/revisions';
import { rolledBack } from '../support/db';
import { chainEngine } from '../support/engine';
import { NOW } from '../support/people';

vi.stubEnv('FOLDSPAR_SECRET', 'a secret for tests that protects nothing at all');

it('puts in the demo workshop once, through the acts, and hands back sign-ins that work', { timeout: 120_000 }, () =>
  rolledBack(async (tx) => {
    const context = { db: tx, engine: chainEngine, now: NOW, newId };
    const signIns = await seed(context);
    expect(signIns?.map((one) => one.email).toSorted()).toEqual(
      Object.values(CAST)
        .map((one) => one.email)
        .toSorted(),
    );
    expect(new Set(signIns?.map((one) => one.password)).size).toBe(4);
    for (const { email, password } of signIns ?? []) {
      const auth = await getAuth(tx);
      const headers = new Headers({ host: '127.0.0.1:3000' });
      const answer = await auth.api.signInEmail({ body: { email, password }, headers });
      expect(answer.user.email).toBe(email);
    }

    const [{ id } = { id: '' }] = await tx.select().from(workshop).where(eq(workshop.name, 'Tarn Lane Workshop'));
    const members = await membersOf(tx, id);
    expect(members.map((row) => [row.name, row.roles.toSorted()])).toEqual([
      ['Ines Okafor', ['designer', 'owner']],
      ['Marguerite Adeyemi', ['reviewer']],
      ['Piet Lindqvist', ['builder']],
      ['Tomas Reyes', ['designer']],
    ]);
    const designs = await designsOf(tx, id);
    expect(designs.map((row) => row.name).toSorted()).toEqual([
      'Hask',
      'Ombry 1000',
      'Quenlet 1050',
      'Quenlet 700',
      'Tarrel 620',
    ]);

    const reader = { workshopId: id, userId: '', roles: ['reviewer' as const] };
    const tarrel = designs.find((row) => row.name === 'Tarrel 620')?.id ?? '';
    const revisions = await revisionsIn(tx, reader, tarrel);
    expect(revisions.map((row) => [row.number, row.state])).toEqual([
      [3, 'goodToCut'],
      [2, 'held'],
      [1, 'goodToCut'],
    ]);
    // Each release says what it was for; the numbers must move that way.
    const figures = await Promise.all([1, 2, 3].map((number) => revisionAnswer(tx, reader, tarrel, number)));
    const value = (index: number, id: string) => figures[index]?.figures.values[id]?.value ?? Number.NaN;
    expect(value(1, 'tailVolumeV')).toBeGreaterThan(value(0, 'tailVolumeV'));
    const behind = [0, 1, 2].map((index) => value(index, 'cgXMm') > value(index, 'cgAftLimitXMm'));
    expect(behind).toEqual([false, true, false]);
    expect(value(2, 'staticMarginPct')).toBeGreaterThan(value(1, 'staticMarginPct'));
    expect((await threadsIn(tx, reader, tarrel, 1)).map((row) => row.state)).toEqual(['closed', 'open']);
    expect(await verdictsIn(tx, reader, tarrel, 2)).toMatchObject([{ verdict: 'hold', counts: true }]);
    const draft = await draftIn(tx, reader, tarrel);
    expect(canonicalText(draft.airframe)).toBe(canonicalText(await example('tarrel-620')));

    expect(await tx.select().from(mailOutbox)).toEqual([]);
    expect(await seed(context)).toBeNull();
    expect(await tx.select().from(workshop)).toHaveLength(1);
  }),
);

it('leaves nothing behind when an example is missing', () =>
  rolledBack(async (tx) => {
    const missing = seed({
      db: tx,
      engine: chainEngine,
      now: NOW,
      newId,
      example: (id) => example(id, '/nowhere'),
    });
    await expect(missing).rejects.toThrow(/hask\.json cannot be read/);
    expect(await tx.select().from(workshop)).toEqual([]);
    expect(await tx.select().from(seedRun)).toEqual([]);
  }));
