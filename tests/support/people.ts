import { membership, user, workshop } from '@/db/schema';
import type { Db } from '@/db/types';
import type { Role } from '@/lib/contract/roles';
import { type ActContext, newId, type Who } from '@/server/context';
import type { Member } from '@/server/permissions';
import { chainEngine } from './engine';

export const NOW = new Date('2026-03-14T09:26:53.000Z');

/** A person with a confirmed address and no password. */
export async function person(db: Db, name: string): Promise<Who> {
  const userId = newId();
  const email = `${name.toLowerCase().replaceAll(/[^a-z]+/g, '.')}.${userId.slice(0, 8)}@example.test`;
  await db.insert(user).values({ id: userId, name, email, emailVerified: true, createdAt: NOW, updatedAt: NOW });
  return { userId, name, email };
}

export async function joinWorkshop(
  db: Db,
  who: Who,
  workshopId: string,
  roles: Role[],
): Promise<Member & { id: string }> {
  const id = newId();
  await db.insert(membership).values({ id, workshopId, userId: who.userId, roles, createdAt: NOW });
  return { id, workshopId, userId: who.userId, roles };
}

export async function foundWorkshop(db: Db, name: string): Promise<string> {
  const id = newId();
  await db.insert(workshop).values({ id, name, createdAt: NOW });
  return id;
}

export const contextFor = (db: Db, who: Who, changes: Partial<ActContext> = {}): ActContext => ({
  db,
  who,
  now: NOW,
  newId,
  engine: chainEngine,
  baseUrl: 'http://127.0.0.1:3000',
  ...changes,
});

export interface Scene {
  readonly workshopId: string;
  readonly owner: { who: Who; member: Member & { id: string }; context: ActContext };
  readonly designer: { who: Who; member: Member & { id: string }; context: ActContext };
  readonly builder: { who: Who; member: Member & { id: string }; context: ActContext };
  readonly reviewer: { who: Who; member: Member & { id: string }; context: ActContext };
}

/** One workshop with one member for each role. */
export async function scene(db: Db): Promise<Scene> {
  const workshopId = await foundWorkshop(db, 'Test shed');
  const cast = async (name: string, role: Role) => {
    const who = await person(db, name);
    return { who, member: await joinWorkshop(db, who, workshopId, [role]), context: contextFor(db, who) };
  };
  return {
    workshopId,
    owner: await cast('Olga Owner', 'owner'),
    designer: await cast('Dina Designer', 'designer'),
    builder: await cast('Bo Builder', 'builder'),
    reviewer: await cast('Rut Reviewer', 'reviewer'),
  };
}
