import type { Db } from '@/db/types';
import type { JobRequest } from '@/lib/plan/job';
import type { Manifest } from '@/lib/plan/manifest';
import { PAPERS, type PaperId } from '@/lib/plan/paper';
import { texts } from '@/lib/text/en/server';
import { fill } from '@/lib/text/fill';
import type { ActContext } from './context';
import type { Member } from './permissions';
import { AppError, invalidDocument } from './problems';
import { revisionIn } from './read/claims';
import { draftIn } from './read/designs';
import { exportIn } from './read/revisions';

/** Pages as a printer gets them, and what they were made from. */
export interface MadePlan {
  readonly pdf: Uint8Array;
  readonly manifest: Manifest;
  readonly pages: number;
  readonly name: string;
  readonly source: {
    readonly designId: string;
    readonly revisionId: string | null;
    readonly draftVersion: number | null;
  };
}

const isPaper = (paper: string): paper is PaperId => Object.hasOwn(PAPERS, paper);

/** The paper that a request asks for; A4 when it names none. */
export function paperOf(url: URL): PaperId {
  const paper = url.searchParams.get('paper') ?? 'a4';
  if (isPaper(paper)) return paper;
  const message = fill(texts.details.unknownPaper, { paper, known: Object.keys(PAPERS).join(', ') });
  throw new AppError('invalid', message, { errors: [{ path: 'paper', code: 'unknown-paper', message }] });
}

const pagesIn = (manifest: Manifest): number =>
  manifest.otherPages.length + manifest.sheets.reduce((sum, sheet) => sum + sheet.pages.length, 0);

async function make(
  { engine, signal }: ActContext,
  request: Extract<JobRequest, { kind: 'plan' }>,
): Promise<Pick<MadePlan, 'pdf' | 'manifest' | 'pages'>> {
  const answer = await engine(request, signal);
  if (!answer.ok) throw invalidDocument('airframe', answer.problems);
  if (answer.kind !== 'plan') throw new RangeError(`the engine answered a plan with a ${answer.kind}`);
  const { manifest, pdfBase64 } = answer;
  return { pdf: Buffer.from(pdfBase64, 'base64'), manifest, pages: pagesIn(manifest) };
}

/** The plan of the newest draft, worked out now; every page says "draft". */
export async function draftPlan(
  context: ActContext,
  member: Member,
  designId: string,
  paper: PaperId,
): Promise<MadePlan> {
  const { airframe, designName, version } = await draftIn(context.db, member, designId);
  const made = await make(context, { kind: 'plan', airframe, paper });
  const source = { designId, revisionId: null, draftVersion: version };
  return { ...made, source, name: `${designName} draft ${version} ${paper}` };
}

/** The plan of a revision, drawn from what was frozen at its release. */
export async function revisionPlan(
  context: ActContext,
  member: Member,
  designId: string,
  number: number | null,
  paper: PaperId,
): Promise<MadePlan> {
  const { db }: { db: Db } = context;
  const { revision: row } = await revisionIn(db, member, designId, number);
  const { airframe, frozen, revision } = await exportIn(db, member, designId, number);
  const made = await make(context, { kind: 'plan', airframe, paper, frozen, revision });
  const source = { designId, revisionId: row.id, draftVersion: null };
  return { ...made, source, name: `${revision.design} revision ${revision.number} ${paper}` };
}
