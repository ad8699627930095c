import { ALL_COUNTED, type Corrections } from '@/lib/aero/corrections';
import { analyse } from '@/lib/figures/analyse';
import { plan } from '@/lib/text/en/plan';
import { readPlanFile } from './files';
import { complain, print, reportProblems } from './report';

/** `--without bodies,propellers`: what is left out of the aerodynamics; null when it names something else. */
function correctionsOf(args: readonly string[]): Corrections | null {
  if (args.length === 0) return ALL_COUNTED;
  const [flag, list = ''] = args;
  const names = list.split(',');
  const known = names.every((name) => name === 'bodies' || name === 'propellers');
  if (args.length !== 2 || flag !== '--without' || !known) return null;
  return { bodies: !names.includes('bodies'), propellers: !names.includes('propellers') };
}

/**
 * `figures FILE.json [--without bodies,propellers]`: the figures as JSON on standard output. Frozen figures are given as they were
 * released, with everything counted, unless something is to be left out.
 */
export async function figures(args: readonly string[]): Promise<number> {
  const [path, ...rest] = args;
  const corrections = correctionsOf(rest);
  if (path === undefined || corrections === null) return complain(plan.cli.usageFigures);
  const file = await readPlanFile(path);
  if (!file.ok) return reportProblems(file.problems);
  const frozen = rest.length === 0 ? file.value.frozen?.figures : undefined;
  const result = frozen ?? analyse(file.value.airframe, { depth: 'full', corrections });
  await print(`${JSON.stringify(result, null, 2)}\n`);
  return 0;
}
