import { analyse } from '@/lib/figures/analyse';
import { plan } from '@/lib/text/en/plan';
import { readPlanFile } from './files';
import { complain, print, reportProblems } from './report';

/** `figures FILE.json`: the figures as JSON on standard output. Frozen figures are given as they were released. */
export async function figures(args: readonly string[]): Promise<number> {
  const [path, ...rest] = args;
  if (path === undefined || rest.length > 0) return complain(plan.cli.usageFigures);
  const file = await readPlanFile(path);
  if (!file.ok) return reportProblems(file.problems);
  const result = file.value.frozen?.figures ?? analyse(file.value.airframe, { depth: 'full' });
  await print(`${JSON.stringify(result, null, 2)}\n`);
  return 0;
}
