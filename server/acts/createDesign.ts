import type { z } from 'zod';
import { designSummary } from '@/db/queries/designs';
import { design, draftSave } from '@/db/schema';
import { canonicalText } from '@/lib/airframe/canonical';
import { startFrom, startingLayouts } from '@/lib/airframe/layouts';
import { parseAirframe } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DesignSummary } from '@/lib/contract/answers';
import type { CreateDesign } from '@/lib/contract/bodies';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import { type ActContext, transact } from '../context';
import { digest } from '../drafts';
import { sha256 } from '../ids';
import type { Member } from '../permissions';
import { AppError, invalidDocument } from '../problems';
import { audit } from './audit';

/** Starts a design from a starting layout or from an airframe document; its draft is version 1. */
export async function createDesign(
  context: ActContext,
  member: Member,
  input: z.infer<typeof CreateDesign>,
): Promise<DesignSummary> {
  const airframe = 'layout' in input ? fromLayout(input.layout, input.name) : fromDocument(input.airframe);
  const body = canonicalText(airframe);
  const shown = digest(airframe);
  return transact(context, async (tx) => {
    const { now, who } = context;
    const id = context.newId();
    const row = {
      id,
      workshopId: member.workshopId,
      name: input.name,
      createdBy: who.userId,
      createdAt: now,
      updatedAt: now,
      archivedAt: null,
      draftVersion: 1,
      ...shown,
    };
    await tx.insert(design).values(row);
    await tx.insert(draftSave).values({
      id: context.newId(),
      designId: id,
      version: 1,
      base: null,
      body,
      sha256: sha256(body),
      authorId: who.userId,
      createdAt: now,
    });
    await audit(tx, context, { act: 'design.create', workshopId: member.workshopId, subjectId: id });
    return designSummary(row, null);
  });
}

function fromLayout(layout: string, name: string): Airframe {
  if (startingLayouts.some((known) => known.id === layout)) return startFrom(layout, name);
  const known = startingLayouts.map((start) => start.id).join(', ');
  const message = fill(texts.details.unknownLayout, { layout, known });
  throw new AppError('invalid', message, { errors: [{ path: 'layout', code: 'unknown-layout', message }] });
}

function fromDocument(document: unknown): Airframe {
  const parsed = parseAirframe(document);
  if (!parsed.ok) throw invalidDocument('airframe', parsed.problems);
  return parsed.value;
}
