import { mkdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { writeDxf } from '@/lib/plan/dxf/writeDxf';
import type { ExportFile, Frozen } from '@/lib/plan/job';
import { drawSheets, inWords } from '@/lib/plan/makePlan';
import { writeSvg } from '@/lib/plan/svg/writeSvg';
import { plan } from '@/lib/text/en/plan';
import { fill } from '@/lib/text/fill';
import { aidsOf, artefactsOf, planOf } from './chain';
import { messageOf, readPlanFile } from './files';
import { readSheetsOptions } from './options';
import { complain, reportProblems } from './report';
import { svgPage } from './svgPage';

/**
 * `sheets FILE.json --paper a4 --out DIR [--aids]`: plan.pdf, manifest.json, and every sheet as SVG and DXF; the workshop aids likewise in a
 * folder of their own.
 */
export async function sheets(args: readonly string[]): Promise<number> {
  const options = readSheetsOptions(args);
  if (!options.ok) return reportProblems(options.problems);
  const { file: path, paper, out, aids } = options.value;
  const file = await readPlanFile(path);
  if (!file.ok) return reportProblems(file.problems);
  const artefacts = artefactsOf(file.value);
  const written = await write(file.value, artefacts, paper, out);
  if (written !== 0 || !aids) return written;
  return write(file.value, aidsOf(file.value.airframe, artefacts), paper, join(out, 'aids'));
}

/** Writes one set of sheets; answers the exit code. */
async function write(file: ExportFile, artefacts: Frozen, paper: string, out: string): Promise<number> {
  const printed = await planOf(file, artefacts, paper);
  if (!printed.ok) return reportProblems(printed.problems);
  const drawn = drawSheets(file.airframe, artefacts.development, artefacts.layout);
  if (!drawn.ok) return reportProblems(drawn.problems);
  for (const problem of artefacts.development.problems) {
    process.stderr.write(`${fill(plan.cli.warning, { message: inWords(problem) })}\n`);
  }
  try {
    await mkdir(out, { recursive: true });
    await writeFile(join(out, 'plan.pdf'), printed.value.pdf);
    await writeFile(join(out, 'manifest.json'), `${JSON.stringify(printed.value.manifest)}\n`);
    for (const drawing of drawn.value.drawings) {
      await writeFile(join(out, `${drawing.id}.svg`), writeSvg(drawing, svgPage()));
      await writeFile(join(out, `${drawing.id}.dxf`), writeDxf(drawing));
    }
  } catch (error) {
    return complain(fill(plan.cli.noDirectory, { directory: out, detail: messageOf(error) }));
  }
  return 0;
}
