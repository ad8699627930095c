import { type Folded, upperHeight } from '@/lib/airframe/foldedSection';
import type { Material } from '@/lib/airframe/schema/stock';
import type { Problem } from '@/lib/numerics/result';
import { texts } from '@/lib/text/en/foldedParts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { foldDeg, noseWidthMm } from './edge';
import { chordAt, innerHeight, lineNamed, type Shell } from './shell';

// What a folded section asks that its sheet cannot do: problems at the field, with what to change.

/** How far a sheet folds about its outer face before that tears or the foam no longer holds it. Common practice, no source. */
const MOST_FOLD_DEG: Readonly<Record<Material['kind'], number>> = {
  paperFacedBoard: 168,
  epp: 60,
  xps: 40,
  balsa: 0,
  ply: 0,
};

/** Skins that stay farther apart than this where they should touch leave a gap that glue does not fill, mm. */
const TOUCH_MM = 0.3;

/** The thickest folded section that a document may ask for, as a share of the chord. */
const MOST_THICKNESS_SHARE = 0.25;

const words = texts.problems;
const share = (value: number): string => trimmedDigits(value, 3);
const mm = (value: number): string => trimmedDigits(value, 1);
/** A share rounded so that whoever types it stays on the right side of the limit. */
const below = (value: number): string => trimmedDigits(Math.floor(value * 1000) / 1000, 3);
const above = (value: number): string => trimmedDigits(Math.ceil(value * 1000) / 1000, 3);

const ENDS = [
  ['root', 0],
  ['tip', 1],
] as const;

/** Problems that keep a section from being laid out at all. `path` is the section's. */
export function sectionProblems(
  section: Folded,
  material: Material,
  chords: { readonly root: number; readonly tip: number },
  path: string,
): Problem[] {
  const { lowerTo, maxAt, thicknessShare } = section;
  const { thicknessMm, kind } = material;
  if (MOST_FOLD_DEG[kind] === 0) {
    const at = path.replace(/\.section$/, '.materialId');
    return [{ code: 'sheet-does-not-fold', path: at, message: words.noFold, fix: words.noFoldFix }];
  }
  if (lowerTo <= maxAt) {
    const message = fill(words.lowerAhead, { to: share(lowerTo), max: share(maxAt) });
    const touch = 1 - ((1 - maxAt) * 2 * thicknessMm) / (thicknessShare * Math.max(chords.root, chords.tip));
    const fix = fill(words.lowerAheadFix, { max: share(maxAt), suggest: share(Math.max(touch, (1 + maxAt) / 2)) });
    return [{ code: 'lower-skin-ends-early', path: `${path}.lowerTo`, message, fix }];
  }
  return ENDS.flatMap(([end]): Problem[] => {
    const depth = thicknessShare * chords[end];
    const need = 2 * thicknessMm;
    // Written as a doubt, so that a chord of nothing is refused too.
    if (depth > need) return [];
    const message = fill(words.tooThin, { end: texts.ends[end], depth: mm(depth), need: mm(need) });
    const share = need / chords[end];
    const fix =
      share < MOST_THICKNESS_SHARE
        ? fill(words.tooThinFix, { share: above(share + 5e-4) })
        : fill(words.tooThinChordFix, { chord: mm(Math.ceil(need / thicknessShare + 0.5)) });
    return [{ code: 'section-thinner-than-skins', path: `${path}.thicknessShare`, message, fix }];
  }).slice(0, 1);
}

/** Folds sharper than the sheet holds. */
function foldProblems(shell: Shell, material: Material, joinedNose: boolean, path: string): Problem[] {
  const most = MOST_FOLD_DEG[material.kind];
  const [nose, crest] = [foldDeg(shell, lineNamed(shell, 'nose')), foldDeg(shell, lineNamed(shell, 'crest'))];
  const at = `${path}.thicknessShare`;
  const sizes = (angle: number) => ({ angle: trimmedDigits(angle, 0), most });
  const sharp = { code: 'fold-too-sharp', path: at } as const;
  return [
    ...(joinedNose && nose > most
      ? [{ ...sharp, message: fill(words.noseSharp, sizes(nose)), fix: words.noseSharpFix }]
      : []),
    ...(crest > most ? [{ ...sharp, message: fill(words.crestSharp, sizes(crest)), fix: words.crestSharpFix }] : []),
  ];
}

/** What stays of the lower skin's edge under the upper skin, mm: more than its thickness is a gap, nothing or less is no edge at all. */
export const rearRoom = (shell: Shell, along: number): number => innerHeight(shell, shell.section.lowerTo, along);

/** The share at which the inner side of the upper skin stands this high over the underside at one end. */
function shareOfHeight(shell: Shell, heightMm: number, along: 0 | 1): number {
  const { maxAt, lowerTo } = shell.section;
  const [a, b] = [innerHeight(shell, lowerTo, along), innerHeight(shell, (lowerTo + maxAt) / 2, along)];
  return lowerTo + ((heightMm - a) * (maxAt - lowerTo)) / 2 / (b - a);
}

function rearProblems(shell: Shell, path: string): Problem[] {
  const at = `${path}.lowerTo`;
  const { lowerTo } = shell.section;
  const rooms = ENDS.map(([end, along]) => ({ end, along, room: rearRoom(shell, along) }));
  const lost = rooms.find(({ room }) => room <= 0);
  if (lost) {
    const depth = upperHeight(shell.section, lowerTo) * chordAt(shell, lost.along);
    const message = fill(words.lowerTooFar, { end: texts.ends[lost.end], depth: mm(depth), to: share(lowerTo) });
    const fix = fill(words.lowerTooFarFix, { most: below(shareOfHeight(shell, 0, lost.along) - 5e-4) });
    return [{ code: 'lower-skin-too-long', path: at, message, fix }];
  }
  const gaps = rooms.map((entry) => ({ ...entry, gap: entry.room - shell.thicknessMm }));
  // Where the gap is as high as a sheet, a web closes it; what is left over is the lower part of it.
  const widest = gaps.reduce((most, entry) => (entry.gap > most.gap ? entry : most));
  const least = Math.min(...gaps.map(({ gap }) => gap));
  if (widest.gap <= TOUCH_MM || least >= shell.thicknessMm) return [];
  const message = fill(words.lowerGap, { gap: mm(Math.min(widest.gap, shell.thicknessMm)) });
  const touch = shareOfHeight(shell, shell.thicknessMm, widest.along);
  const fix = fill(words.lowerGapFix, { share: above(touch), end: texts.ends[widest.end] });
  return [{ code: 'lower-skin-gap', path: at, message, fix }];
}

function webProblems(shell: Shell, path: string): Problem[] {
  const { webAt, lowerTo, maxAt } = shell.section;
  const { thicknessMm } = shell;
  const chord = Math.min(chordAt(shell, 0), chordAt(shell, 1));
  const from = noseWidthMm(shell) / chord;
  const to = lowerTo - thicknessMm / chord;
  const at = `${path}.webAt`;
  if (webAt < from || webAt > to) {
    const limits = { from: above(from), to: below(to), max: share(maxAt) };
    const message = fill(words.webOutside, { at: share(webAt), ...limits });
    return [{ code: 'web-outside-section', path: at, message, fix: fill(words.webOutsideFix, limits) }];
  }
  const height = Math.max(...ENDS.map(([, along]) => innerHeight(shell, webAt, along) - thicknessMm));
  if (height >= thicknessMm) return [];
  const message = fill(words.webThin, { height: mm(Math.max(0, height)), sheet: mm(thicknessMm) });
  return [{ code: 'web-thinner-than-sheet', path: at, message, fix: fill(words.webThinFix, { max: share(maxAt) }) }];
}

/** What is wrong with a panel that has been laid out; `blocks`: it cannot be cut. `path` is the section's. */
export function shellProblems(
  shell: Shell,
  material: Material,
  joinedNose: boolean,
  path: string,
): { blocks: boolean; webStands: boolean; problems: Problem[] } {
  const folds = foldProblems(shell, material, joinedNose, path);
  const rear = rearProblems(shell, path);
  const web = webProblems(shell, path);
  const blocks = folds.length > 0 || rear.some(({ code }) => code === 'lower-skin-too-long');
  return { blocks, webStands: web.length === 0, problems: [...folds, ...rear, ...web] };
}
