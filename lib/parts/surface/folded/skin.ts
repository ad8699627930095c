import { bounds } from '@/lib/geometry/polygons';
import type { Vec2 } from '@/lib/numerics/vec';
import { fitsSheet } from '../../fit';
import type { PartFrame } from '../../types';
import type { Run } from '../run';
import type { Strip } from '../strip';
import { cornerOf, type Edging, endPath } from './edge';
import { type Line, onFlat, type Shell } from './shell';

// A folded panel's skin on the flat sheet, seen on its outer face: x outboard along the trailing edge, y forward and on round the nose.

export interface Skin {
  readonly which: 'whole' | 'upper' | 'lower';
  /** From the trailing edge forward and round the nose. */
  readonly lines: readonly Line[];
  /** Where each line ends as it is cut, at the root and at the tip. */
  readonly cuts: readonly (readonly [Vec2, Vec2])[];
  /** The root and the tip end, in the order of the lines. */
  readonly root: readonly Vec2[];
  readonly tip: readonly Vec2[];
  /** Lays the sheet where its piece farthest from the trailing edge stands. */
  readonly frame: PartFrame;
  /** A corner of that piece alone. */
  readonly corner: Vec2;
}

function skinOf(shell: Shell, which: Skin['which'], lines: readonly Line[], edging: Edging): Skin {
  const cuts = lines.map((line): [Vec2, Vec2] => [
    cornerOf(shell, line, 'root', edging.root),
    cornerOf(shell, line, 'tip', edging.tip),
  ]);
  const root = endPath(shell, lines, 'root', edging.root);
  const tip = endPath(shell, lines, 'tip', edging.tip);
  const corner = tip.at(-1);
  const face = shell.faces.find(({ fore }) => fore === lines.at(-1));
  if (!corner || !face) throw new RangeError('a skin needs two lines');
  return { which, lines, cuts, root, tip, frame: face.frame, corner };
}

/** Counter-clockwise from the corner at the tip that lies farthest from the trailing edge. */
const skinRing = ({ root, tip }: Skin): Vec2[] => [...tip.slice(-1), ...[...root].reverse(), ...tip.slice(0, -1)];

/** The same outline as a flat piece with a trailing edge, for the controls that are cut from it. */
export function skinStrip({ root, tip }: Skin): Strip {
  const [teRoot, ...rootRest] = root;
  const [teTip, ...tipRest] = tip;
  if (!teRoot || !teTip) throw new RangeError('a skin needs two lines');
  return { le: [...rootRest, ...tipRest.reverse()], te: [teRoot, teTip] };
}

/**
 * The skins of a panel: one sheet folded round the leading edge where the board has paper to fold about and is large enough, else an
 * upper and a lower one that meet there.
 */
export function skinsOf(run: Run, shell: Shell, edging: Edging): Skin[] {
  const whole = skinOf(shell, 'whole', shell.lines, edging);
  const { minX, maxX, minY, maxY } = bounds(skinRing(whole));
  const folds = run.material.kind === 'paperFacedBoard' && fitsSheet(run.material, maxX - minX, maxY - minY);
  if (folds) return [whole];
  return [
    skinOf(shell, 'upper', shell.lines.slice(0, -1), edging),
    skinOf(shell, 'lower', shell.lines.slice(-2), edging),
  ];
}

/** Whether the skin holds a line of the panel. */
export const holds = (skin: Skin, line: Line): boolean => skin.lines.includes(line);

/** A line of the skin from end to end, as it is cut. */
export function cutLine(skin: Skin, line: Line): readonly [Vec2, Vec2] {
  const cut = skin.cuts[skin.lines.indexOf(line)];
  if (!cut) throw new RangeError(`the skin has no line ${line.name}`);
  return cut;
}

/** A line across the skin at a share of the panel's length, 0 root to 1 tip. */
export const across = (skin: Skin, along: number): Vec2[] => skin.lines.map((line) => onFlat(line, along));
