import { promisify } from 'node:util';
import { gunzip, gzip } from 'node:zlib';
import { artefactOf, artefactsOf } from '@/db/queries/revisions';
import { ARTEFACT_KINDS, type ArtefactKind } from '@/db/schema';
import type { Db } from '@/db/types';
import type { Figures } from '@/lib/figures/types';
import type { Frozen } from '@/lib/plan/job';
import { sha256 } from './ids';

const pack = promisify(gzip);
const unpack = promisify(gunzip);

export interface PackedArtefact {
  readonly kind: ArtefactKind;
  readonly body: Uint8Array;
  /** Of the JSON text, so that it does not depend on how it was compressed. */
  readonly sha256: string;
}

/** The artefact "parts": the parts, and what the check before cutting found about them. */
type FrozenParts = Frozen['development'] & Pick<Frozen, 'checks'>;

/** What is frozen, one compressed body a kind. */
export async function packFrozen({ figures, development, layout, checks }: Frozen): Promise<PackedArtefact[]> {
  const parts: FrozenParts = { ...development, checks };
  const contents: Record<ArtefactKind, unknown> = { figures, parts, layout };
  return Promise.all(
    ARTEFACT_KINDS.map(async (kind) => {
      const text = JSON.stringify(contents[kind]);
      return { kind, body: await pack(Buffer.from(text, 'utf8')), sha256: sha256(text) };
    }),
  );
}

/** JSON that `packFrozen` wrote. */
async function unpackJson<T>(body: Uint8Array): Promise<T> {
  return JSON.parse((await unpack(body)).toString('utf8'));
}

export async function frozenFigures(db: Db, revisionId: string): Promise<Figures> {
  const body = await artefactOf(db, revisionId, 'figures');
  if (body === undefined) throw new RangeError(`revision ${revisionId} has no frozen figures`);
  return unpackJson<Figures>(body);
}

/** All that was frozen at the release; nothing of it is computed again. */
export async function frozenOf(db: Db, revisionId: string): Promise<Frozen> {
  const bodies = new Map((await artefactsOf(db, revisionId)).map(({ kind, body }) => [kind, body]));
  const [figures, parts, layout] = [bodies.get('figures'), bodies.get('parts'), bodies.get('layout')];
  if (figures === undefined || parts === undefined || layout === undefined)
    throw new RangeError(`revision ${revisionId} has ${[...bodies.keys()].join(', ')} frozen, and not all of it`);
  const { checks, ...development } = await unpackJson<FrozenParts>(parts);
  return {
    figures: await unpackJson<Frozen['figures']>(figures),
    development,
    layout: await unpackJson<Frozen['layout']>(layout),
    ...(checks === undefined ? {} : { checks }),
  };
}
