import { cross3, degFromRad, dot3, length3, type Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/foldedParts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Operation } from '../../types';
import type { Seam } from '../joint';
import type { Run } from '../run';
import { type Edging, edgeBevels, foldDeg, noseWidthMm } from './edge';
import { rearRoom } from './refuse';
import { chordAt, flatAt, type Line, lineNamed, type Shell } from './shell';
import { across, cutLine, holds, type Skin } from './skin';
import type { Stand, Web } from './web';

// What is worked on a folded panel's skin. Everything inside is worked and marked on the inner face; the outer paper stays whole.

/** Stations are marked this far apart, mm. */
const STATION_MM = 100;
/** A turbulator strip lies at this share of the chord: the drag that is predicted for one reckons with it there. Common practice, no source. */
const TURBULATOR_SHARE = 0.1;

const inner = { closed: false, face: 'inner' } as const;
const mm = (value: number): string => trimmedDigits(value, 1);

/** One fold and the groove that lets it close. */
function foldWork(run: Run, shell: Shell, skin: Skin, line: Line): Operation[] {
  const angleDeg = foldDeg(shell, line);
  const path = cutLine(skin, line);
  const angle = trimmedDigits(Math.abs(angleDeg), 1);
  const plain = run.material.kind !== 'paperFacedBoard';
  const words =
    line.name === 'nose'
      ? texts.notes.nose
      : angleDeg < 0
        ? texts.notes.open
        : plain
          ? texts.notes.foldPlain
          : texts.notes.fold;
  const fold: Operation = {
    ...inner,
    id: `fold-${line.name}`,
    kind: plain ? 'crease' : 'cutToPaper',
    path,
    angleDeg,
    note: fill(words, { angle }),
  };
  if (angleDeg <= 0) return [fold];
  const groove: Operation = {
    ...inner,
    id: `fold-${line.name}-bevel`,
    kind: 'bevel',
    path,
    angleDeg: angleDeg / 2,
    depthMm: shell.thicknessMm,
  };
  return line.name === 'nose' ? [fold, noted(groove, noseWidthMm(shell))] : [fold, groove];
}

const noted = (operation: Operation, width: number): Operation => ({
  ...operation,
  note: fill(texts.notes.noseBevel, { width: mm(width) }),
});

/** Lines that run to the skin's ends are drawn past them and clipped there, mm. */
const PAST_MM = 20;

/** A line drawn on past its ends, or past one of them. */
function past([a, b]: readonly [Vec2, Vec2], atStart = true, atEnd = true): readonly [Vec2, Vec2] {
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const [x, y] = [((b[0] - a[0]) / size) * PAST_MM, ((b[1] - a[1]) / size) * PAST_MM];
  return [atStart ? [a[0] - x, a[1] - y] : a, atEnd ? [b[0] + x, b[1] + y] : b];
}

/** A line moved square to itself, to its left by a positive distance. */
function beside([a, b]: readonly [Vec2, Vec2], leftMm: number): readonly [Vec2, Vec2] {
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const [nx, ny] = [(-(b[1] - a[1]) / size) * leftMm, ((b[0] - a[0]) / size) * leftMm];
  return [
    [a[0] + nx, a[1] + ny],
    [b[0] + nx, b[1] + ny],
  ];
}

/** The leading edge: a fold of one sheet, or the bevelled edge of each of two. */
function noseWork(run: Run, shell: Shell, skin: Skin): Operation[] {
  const line = lineNamed(shell, 'nose');
  const angleDeg = foldDeg(shell, line);
  const path = cutLine(skin, line);
  const width = noseWidthMm(shell);
  const sides = skin.which === 'whole' ? [1, -1] : [skin.which === 'lower' ? 1 : -1];
  const limits = sides.map(
    (side, i): Operation => ({
      ...inner,
      id: `nose-limit-${i + 1}`,
      kind: 'reference',
      path: past(beside(path, side * width)),
      note: texts.notes.noseLimit,
    }),
  );
  // Foam meets foam beside the fold, half-way out to where the sanding begins.
  const glued = past(beside(path, ((skin.which === 'lower' ? 1 : -1) * width) / 2));
  const glue: Operation = {
    ...inner,
    id: 'nose-glue',
    kind: 'glue',
    path: glued,
    note: texts.notes.noseGlue,
    ...(skin.which === 'whole' ? {} : { sharedBy: 2 }),
  };
  if (skin.which === 'whole') return [...foldWork(run, shell, skin, line), ...limits, glue];
  const bevel: Operation = {
    ...inner,
    id: 'nose-bevel',
    kind: 'bevel',
    path,
    angleDeg: angleDeg / 2,
    depthMm: shell.thicknessMm,
    note: fill(texts.notes.noseEdge, { width: mm(width) }),
  };
  const tape: Operation = { ...inner, id: 'nose-tape', kind: 'tape', face: 'outer', path, sharedBy: 2 };
  return [bevel, ...limits, glue, tape];
}

/** Where the lower skin's inner face meets the upper skin, it is sanded to a wedge, so that both outer faces stand as drawn. */
function rearWork(shell: Shell, skin: Skin): Operation[] {
  const { lowerTo } = shell.section;
  const line = lineNamed(shell, 'lower');
  const operations: Operation[] = [];
  if (skin.which !== 'lower') {
    const path = past([flatAt(shell, 'upper', lowerTo, line.from), flatAt(shell, 'upper', lowerTo, line.to)]);
    operations.push({ ...inner, id: 'rear-glue', kind: 'glue', path, note: texts.notes.rearEdge });
  }
  if (skin.which === 'upper') return operations;
  const rooms = [rearRoom(shell, 0), rearRoom(shell, 1)] as const;
  const left = rooms.map((room) => Math.min(shell.thicknessMm, room));
  const taken = left.map((stays) => shell.thicknessMm - stays);
  const depthMm = taken.reduce((sum, depth) => sum + depth, 0) / taken.length;
  if (Math.max(...taken) < 0.1) return operations;
  const roof = shell.faces[shell.lines[1]?.name === 'reflex' ? 1 : 0];
  const slope = roof ? Math.atan2(length3(cross3(roof.normal, shell.up)), dot3(roof.normal, shell.up)) : 0;
  operations.push({
    ...inner,
    id: 'rear-bevel',
    kind: 'bevel',
    path: cutLine(skin, line),
    angleDeg: 90 - degFromRad(slope),
    depthMm,
    note: fill(texts.notes.rearFeather, { root: mm(left[0] ?? 0), tip: mm(left[1] ?? 0) }),
  });
  return operations;
}

/** Glue lines of a web on the skins it stands between, along the middle of its thickness. */
export function webLines(
  shell: Shell,
  skin: Skin,
  web: Web | null,
  { share, face }: Stand,
  name: 'web' | 'rearWeb',
): Operation[] {
  if (!web) return [];
  const whole = lineNamed(shell, 'lower');
  const aftMm = (face === 'fore' ? 1 : -1) * (shell.thicknessMm / 2);
  const skins = skin.which === 'whole' ? (['lower', 'upper'] as const) : [skin.which];
  return skins.map((which): Operation => {
    const at = (along: number): Vec2 => flatAt(shell, which, share + aftMm / chordAt(shell, along), along);
    return {
      ...inner,
      id: `${name === 'web' ? 'web' : 'rear-web'}-${which}`,
      kind: 'glue',
      path: past([at(web.from), at(web.to)], web.from === whole.from, web.to === whole.to),
      widthMm: shell.thicknessMm,
      note: texts.notes[name],
    };
  });
}

/** Lines across the skin at round distances from the surface's root. */
function stationMarks(run: Run, skin: Skin): Operation[] {
  const [panel] = run.panels;
  if (!panel) return [];
  const { root, tip } = panel;
  const first = Math.floor(root.lengthMm / STATION_MM + 1e-9) + 1;
  const count = Math.max(0, Math.ceil(tip.lengthMm / STATION_MM - 1e-9) - first);
  return Array.from({ length: count }, (_, i) => (first + i) * STATION_MM).flatMap((at): Operation[] => {
    const along = (at - root.lengthMm) / (tip.lengthMm - root.lengthMm);
    if (!skin.lines.every(({ from, to }) => along > from && along < to)) return [];
    const note = fill(texts.notes.station, { mm: at });
    return [{ ...inner, id: `station-${at}`, kind: 'reference', path: across(skin, along), note }];
  });
}

function turbulator(shell: Shell, skin: Skin): Operation[] {
  const { turbulatorMm } = shell.section;
  if (turbulatorMm === undefined || skin.which === 'lower') return [];
  const { from, to } = lineNamed(shell, 'crest');
  const path = past([flatAt(shell, 'upper', TURBULATOR_SHARE, from), flatAt(shell, 'upper', TURBULATOR_SHARE, to)]);
  const note = fill(texts.notes.turbulator, { height: trimmedDigits(turbulatorMm, 2) });
  return [{ id: 'turbulator', kind: 'reference', path, closed: false, face: 'outer', note }];
}

/** All work on one skin but its controls, spars and webs; it may reach past the skin's cut edges, where it is clipped. */
export function skinWork(run: Run, shell: Shell, skin: Skin, seams: readonly Seam[], edging: Edging): Operation[] {
  const folds = shell.lines
    .filter(({ name }) => name === 'crest' || name === 'reflex')
    .filter((line) => holds(skin, line));
  const glue = seams.map(
    ({ end }): Operation => ({
      ...inner,
      id: `${end}-glue`,
      kind: 'glue',
      path: skin[end],
      sharedBy: 2,
      note: texts.notes.seam,
    }),
  );
  return [
    ...folds.flatMap((line) => foldWork(run, shell, skin, line)),
    ...noseWork(run, shell, skin),
    ...rearWork(shell, skin),
    ...edgeBevels(shell, skin.lines, 'root', edging.root),
    ...edgeBevels(shell, skin.lines, 'tip', edging.tip),
    ...glue,
    ...stationMarks(run, skin),
    ...turbulator(shell, skin),
  ];
}
