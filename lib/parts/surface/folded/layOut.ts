import type { Folded } from '@/lib/airframe/foldedSection';
import type { ResolvedPanel } from '@/lib/airframe/resolved';
import type { Tube } from '@/lib/airframe/schema/stock';
import type { Problem } from '@/lib/numerics/result';
import { texts as common } from '@/lib/text/en/parts';
import { LEAST_BEVEL_DEG, type Seam, seamOf, seamProblems } from '../joint';
import type { Run } from '../run';
import type { Edging } from './edge';
import { endPlane, rakedPlane } from './plane';
import { sectionProblems, shellProblems } from './refuse';
import { type Shell, shellOf } from './shell';
import { type Skin, skinsOf } from './skin';
import { type FoldedSpars, foldedSpars } from './spar';
import { type Stand, type Web, webOf } from './web';

// A folded panel worked out to all that its parts are drawn from.

export interface LaidOut {
  readonly run: Run;
  readonly shell: Shell;
  readonly seams: readonly Seam[];
  readonly edging: Edging;
  readonly skins: readonly Skin[];
  readonly stands: { readonly spar: Stand; readonly rear: Stand };
  readonly webs: { readonly spar: Web | null; readonly rear: Web | null };
  readonly spars: FoldedSpars;
}

/** The panel's outside between its seams or free ends; a rake that does not fit leaves the tip square and says so. */
function shellIn(
  run: Run,
  panel: ResolvedPanel,
  section: Folded,
  seams: readonly Seam[],
): { shell: Shell; problems: Problem[] } {
  const at = (end: Seam['end']): Seam | undefined => seams.find((seam) => seam.end === end);
  const ends = { root: endPlane(run, panel.root, 'root', at('root')), tip: endPlane(run, panel.tip, 'tip', at('tip')) };
  const raked = at('tip') ? null : rakedPlane(run, panel.tip);
  if (!raked) return { shell: shellOf(run, section, ends), problems: [] };
  const shell = shellOf(run, section, { ...ends, tip: raked });
  if (shell.lines.every(({ from, to }) => to > from)) return { shell, problems: [] };
  const path = `surfaces.${run.surface.index}.tip.angleDeg`;
  return {
    shell: shellOf(run, section, ends),
    problems: [{ code: 'tip-does-not-fit', path, message: common.problems.tipDoesNotFit }],
  };
}

/** Which ends are bevelled: panels set apart on purpose keep square edges, and a free end has nothing to meet. */
function edgingOf(seams: readonly Seam[]): Edging {
  const cut = (end: Seam['end']): boolean =>
    seams.some((seam) => seam.end === end && (seam.bevelled || Math.abs(seam.halfDeg) < LEAST_BEVEL_DEG));
  return { root: cut('root'), tip: cut('tip') };
}

/** Works a folded panel out, or says what is in the way. `path` is its section's. */
export function laidOut(
  run: Run,
  section: Folded,
  tubes: ReadonlyMap<string, Tube>,
  path: string,
): { made: LaidOut | null; problems: Problem[] } {
  const [panel] = run.panels;
  if (!panel) return { made: null, problems: [] };
  const chords = { root: panel.root.chordMm, tip: panel.tip.chordMm };
  const unfit = sectionProblems(section, run.material, chords, path);
  if (unfit.length > 0) return { made: null, problems: unfit };
  const seams = [seamOf(run, 'root'), seamOf(run, 'tip')].flatMap((seam) => seam ?? []);
  const { shell, problems: unshaped } = shellIn(run, panel, section, seams);
  const edging = edgingOf(seams);
  const skins = skinsOf(run, shell, edging);
  const judged = shellProblems(shell, run.material, skins.length === 1, path);
  const problems = [...judged.problems, ...unshaped, ...seams.flatMap((seam) => seamProblems(run, seam))];
  if (judged.blocks) return { made: null, problems };
  const stands = {
    spar: { share: section.webAt, face: 'fore' },
    rear: { share: section.lowerTo, face: 'aft' },
  } as const;
  const spar = judged.webStands ? webOf(shell, stands.spar) : null;
  const rear = webOf(shell, stands.rear);
  const spars = foldedSpars(run, shell, tubes, spar !== null);
  return {
    made: { run, shell, seams, edging, skins, stands, webs: { spar, rear }, spars },
    problems: [...problems, ...spars.problems],
  };
}
