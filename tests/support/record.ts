import { expect } from 'vitest';
import {
  type apiToken,
  artefact,
  type benchTest,
  build,
  component,
  design,
  draftSave,
  flight,
  type layout,
  type notification,
  type openPoint,
  revision,
  type shareLink,
  type waiver,
} from '@/db/schema';
import type { Db, Tx } from '@/db/types';
import { newId } from '@/server/context';
import { foundWorkshop, joinWorkshop, NOW, person } from './people';

// Rows put in directly, for tests of what the database itself refuses.

export const HASH = 'a'.repeat(64);
export const LATER = new Date(NOW.getTime() + 86_400_000);

/** The write is refused, by this constraint and no other; the transaction goes on. */
export async function refused(tx: Tx, constraint: string, write: (inner: Tx) => Promise<unknown>): Promise<void> {
  const fault: unknown = await tx.transaction(write).then(
    () => new Error(`nothing refused it, not even ${constraint}`),
    (error: unknown) => error,
  );
  const cause = fault instanceof Error && fault.cause instanceof Error ? fault.cause : fault;
  expect(cause).toMatchObject({ message: expect.stringContaining(`constraint "${constraint}"`) });
}

export interface Shed {
  readonly workshopId: string;
  readonly userId: string;
  readonly designId: string;
  readonly revisionId: string;
}

/** A revision of a design, without artefacts. */
export async function releasedRow(
  db: Db,
  { designId, userId }: Pick<Shed, 'designId' | 'userId'>,
  changes: Partial<typeof revision.$inferInsert> = {},
): Promise<string> {
  const id = newId();
  await db.insert(revision).values({
    ...{ id, designId, number: 1, draftVersion: 1, body: '{}', sha256: HASH, engine: 'test' },
    ...{ reason: 'R', expectedEffect: 'E', releasedBy: userId, releasedAt: NOW },
    ...changes,
  });
  return id;
}

/** A design with its first draft save. */
export async function designRow(db: Db, { workshopId, userId }: Pick<Shed, 'workshopId' | 'userId'>): Promise<string> {
  const id = newId();
  await db.insert(design).values({
    ...{ id, workshopId, name: 'D', createdBy: userId, createdAt: NOW, updatedAt: NOW },
    ...{ draftVersion: 1, spanMm: 600, thumbnail: { outlines: [] } },
  });
  await db.insert(draftSave).values({
    ...{ id: newId(), designId: id, version: 1, body: '{}', sha256: HASH, authorId: userId, createdAt: NOW },
  });
  return id;
}

/** A workshop with one member, and a design of theirs with one revision. */
export async function shed(db: Db): Promise<Shed> {
  const workshopId = await foundWorkshop(db, 'Shed');
  const { userId } = await person(db, 'Ada Acting');
  await joinWorkshop(db, { userId, name: 'Ada Acting', email: '' }, workshopId, ['designer', 'builder']);
  const designId = await designRow(db, { workshopId, userId });
  return { workshopId, userId, designId, revisionId: await releasedRow(db, { designId, userId }) };
}

export async function artefactRow(db: Db, revisionId: string): Promise<void> {
  const body = new Uint8Array([1]);
  await db.insert(artefact).values({ id: newId(), revisionId, kind: 'figures', engine: 'test', body, sha256: HASH });
}

export async function buildRow(db: Db, at: Shed, changes: Partial<typeof build.$inferInsert> = {}): Promise<string> {
  const { workshopId, designId, revisionId, userId } = at;
  const id = newId();
  await db.insert(build).values({
    ...{ id, workshopId, designId, revisionId, number: 1, state: 'building', builderId: userId },
    ...{ differences: '', startedAt: NOW, updatedAt: NOW },
    ...changes,
  });
  return id;
}

export async function flightRow(
  db: Db,
  at: Shed & { buildId: string },
  changes: Partial<typeof flight.$inferInsert> = {},
): Promise<string> {
  const { workshopId, designId, buildId, userId } = at;
  const id = newId();
  await db.insert(flight).values({
    ...{ id, workshopId, designId, buildId, number: 1, pilotId: userId, flownAt: NOW, createdAt: NOW },
    ...{ conditions: 'calm', behaviours: [], expected: '', observed: '' },
    ...changes,
  });
  return id;
}

export async function componentRow(
  db: Db,
  { workshopId, userId }: Shed,
  changes: Partial<typeof component.$inferInsert> = {},
): Promise<string> {
  const id = newId();
  await db.insert(component).values({
    ...{ id, workshopId, kind: 'motor', name: `outrunner ${id}`, figures: { kvRpmV: 1400 }, source: 'stated' },
    ...{ createdBy: userId, createdAt: NOW, updatedAt: NOW },
    ...changes,
  });
  return id;
}

export const layoutOf = ({ workshopId, designId, userId }: Shed, changes: Partial<typeof layout.$inferInsert>) => ({
  ...{ id: newId(), workshopId, designId, stockHash: HASH, engine: 'test', seed: 1, steps: 0, spacingMm: 4 },
  ...{ marginMm: 5, placements: [], locks: [], chosen: false, createdBy: userId, createdAt: NOW },
  ...changes,
});

export const waiverOf = ({ workshopId, designId, userId }: Shed, changes: Partial<typeof waiver.$inferInsert>) => ({
  ...{ id: newId(), workshopId, designId, ruleId: 'disc-to-boom', placeKey: 'boom-1' },
  ...{ reason: 'Measured: 12 mm.', waivedBy: userId, waivedAt: NOW },
  ...changes,
});

export const benchOf = ({ workshopId, userId }: Shed, changes: Partial<typeof benchTest.$inferInsert>) => ({
  ...{ id: newId(), workshopId, note: '', testedBy: userId, testedAt: NOW, createdAt: NOW },
  ...changes,
});

export const pointOf = ({ workshopId, designId, userId }: Shed, changes: Partial<typeof openPoint.$inferInsert>) => ({
  ...{ id: newId(), workshopId, designId, number: 1, finding: 'Wags.', raisedBy: userId, raisedAt: NOW },
  ...changes,
});

export const tokenOf = ({ workshopId, userId }: Shed, changes: Partial<typeof apiToken.$inferInsert>) => ({
  ...{ id: newId(), workshopId, userId, name: 'script', tokenHash: HASH, createdAt: NOW },
  scopes: ['revision.read' as const],
  ...changes,
});

export const noticeOf = ({ workshopId, userId }: Shed, changes: Partial<typeof notification.$inferInsert>) => ({
  ...{ id: newId(), workshopId, userId, kind: 'verdict.given', subjectId: 'x', detail: {}, createdAt: NOW },
  ...changes,
});

export const linkOf = ({ workshopId, designId, userId }: Shed, changes: Partial<typeof shareLink.$inferInsert>) => ({
  ...{ id: newId(), workshopId, designId, tokenHash: HASH, scope: 'read' as const },
  ...{ createdBy: userId, createdAt: NOW, expiresAt: LATER },
  ...changes,
});
