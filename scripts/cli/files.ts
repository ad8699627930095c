import { readFile, stat } from 'node:fs/promises';
import { ok, type Result, refuse } from '@/lib/numerics/result';
import { parseExport } from '@/lib/plan/exportFile';
import type { ExportFile } from '@/lib/plan/job';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';

const words = plan.cli;

/** An export with frozen artefacts of the largest document stays well below this. */
const MAX_MB = 64;

export const messageOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

/** JSON text as data, or what is wrong with it. */
export function parseJson(text: string): Result<unknown> {
  try {
    const data: unknown = JSON.parse(text.startsWith('\uFEFF') ? text.slice(1) : text);
    return ok(data);
  } catch (error) {
    return refuse({ code: 'bad-json', path: '', message: fill(words.badJson, { detail: messageOf(error) }) });
  }
}

/** The airframe or export in a file. */
export async function readPlanFile(path: string): Promise<Result<ExportFile>> {
  let text: string;
  try {
    if ((await stat(path)).size > MAX_MB * 1024 * 1024) {
      return refuse({ code: 'file-too-large', path: '', message: fill(words.tooLarge, { max: MAX_MB }) });
    }
    text = await readFile(path, 'utf8');
  } catch (error) {
    return refuse({ code: 'no-file', path: '', message: fill(words.noFile, { file: path, detail: messageOf(error) }) });
  }
  const data = parseJson(text);
  return data.ok ? parseExport(data.value) : data;
}
