import { ENGINE_VERSION } from '@/lib/figures/engine';
import type { Problem } from '@/lib/numerics/result';
import { parseExport } from '@/lib/plan/exportFile';
import type { JobAnswer } from '@/lib/plan/job';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { artefactsOf, freeze, planOf } from './chain';
import { parseJson } from './files';
import { print } from './report';

const no = (problems: readonly Problem[]): JobAnswer => ({ ok: false, problems });

const badJob = (got: unknown): JobAnswer =>
  no([{ code: 'bad-job', path: 'kind', message: fill(plan.cli.badJob, { got: JSON.stringify(got) ?? 'nothing' }) }]);

async function answer(request: unknown): Promise<JobAnswer> {
  if (typeof request !== 'object' || request === null || !('kind' in request)) return badJob(undefined);
  const { kind, paper, ...content } = { paper: undefined, ...request };
  const file = parseExport(content);
  if (!file.ok) return no(file.problems);
  switch (kind) {
    case 'freeze': {
      const frozen = freeze(file.value.airframe);
      return frozen.ok ? { ok: true, kind, engine: ENGINE_VERSION, frozen: frozen.value } : no(frozen.problems);
    }
    case 'plan': {
      const made = await planOf(file.value, artefactsOf(file.value), String(paper));
      if (!made.ok) return no(made.problems);
      const pdfBase64 = Buffer.from(made.value.pdf).toString('base64');
      return { ok: true, kind, pdfBase64, manifest: made.value.manifest };
    }
    default:
      return badJob(kind);
  }
}

/** `job`: one request as JSON on standard input, one answer as JSON on standard output (see lib/plan/job.ts). */
export async function job(): Promise<number> {
  const chunks: Buffer[] = [];
  for await (const chunk of process.stdin) chunks.push(Buffer.from(chunk));
  const request = parseJson(Buffer.concat(chunks).toString('utf8'));
  const result = request.ok ? await answer(request.value) : no(request.problems);
  await print(JSON.stringify(result));
  return 0;
}
