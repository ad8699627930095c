import { z } from 'zod';
import { parseAirframe } from '@/lib/airframe/parse';
import { AIRFRAME_FORMAT } from '@/lib/airframe/schema/airframe';
import { ok, type Problem, type Result, refuse } from '@/lib/numerics/result';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import type { PlanRevision } from './drawing';
import { FrozenShape } from './frozenSchema';
import type { ExportFile } from './job';

const words = plan.file;

const RevisionShape: z.ZodType<PlanRevision> = z.strictObject({
  number: z.number().int().min(1).max(1_000_000),
  state: z.enum(['released', 'goodToCut', 'held']),
  // A date, or a time in UTC: only the date is printed.
  releasedAt: z.union([z.iso.date(), z.iso.datetime()]),
  design: z.string().trim().min(1).max(80),
});

const KEYS = ['revision', 'airframe', 'frozen'] as const;

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

function checked<T>(shape: z.ZodType<T>, value: unknown, at: string): Result<T> {
  const parsed = shape.safeParse(value);
  if (parsed.success) return ok(parsed.data);
  return refuse(
    ...parsed.error.issues.slice(0, 20).map((issue): Problem => {
      const path = [at, ...issue.path.map(String)].join('.');
      return { code: 'bad-export', path, message: fill(words.badField, { path, detail: issue.message }) };
    }),
  );
}

const within = (prefix: string, problems: readonly Problem[]): Problem[] =>
  problems.map((problem) => ({ ...problem, path: problem.path ? `${prefix}.${problem.path}` : prefix }));

/**
 * A file as the command line takes it: an airframe document, or an export that holds one, with its revision and what was
 * frozen at the release. Every problem names its path in the file.
 */
export function parseExport(input: unknown): Result<ExportFile> {
  if (!isRecord(input) || 'format' in input || !('airframe' in input)) {
    const airframe = parseAirframe(input);
    if (airframe.ok) return ok({ airframe: airframe.value });
    const neither = isRecord(input) && !('format' in input);
    if (!neither) return airframe;
    return refuse({ code: 'not-a-plan-file', path: '', message: fill(words.neither, { format: AIRFRAME_FORMAT }) });
  }
  const known: readonly string[] = KEYS;
  const strange = Object.keys(input).find((key) => !known.includes(key));
  if (strange !== undefined) {
    const message = fill(words.unknownKey, { key: strange, known: KEYS.join(', ') });
    return refuse({ code: 'unknown-key', path: strange, message });
  }
  const airframe = parseAirframe(input.airframe);
  if (!airframe.ok) return refuse(...within('airframe', airframe.problems));
  const revision = input.revision === undefined ? ok(undefined) : checked(RevisionShape, input.revision, 'revision');
  if (!revision.ok) return revision;
  const frozen = input.frozen === undefined ? ok(undefined) : checked(FrozenShape, input.frozen, 'frozen');
  if (!frozen.ok) return frozen;
  return ok({ airframe: airframe.value, revision: revision.value, frozen: frozen.value });
}
