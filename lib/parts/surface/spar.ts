import type { Tube } from '@/lib/airframe/schema/stock';
import type { Surface } from '@/lib/airframe/schema/surface';
import { pointAt } from '@/lib/airframe/section';
import { counterClockwise } from '@/lib/geometry/polygons';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import { length3, mirror3, sub3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { elements } from '@/lib/text/en/elements';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Opening } from '../opening';
import { toPart } from '../shape/frame';
import { mirror2, onSheet, type Ring } from '../shape/ring';
import type { Operation, StockPiece } from '../types';
import type { Run } from './run';

// Tubes and strips let into a flat sheet: a channel in the foam and a bought length.

export interface Sparred {
  readonly operations: readonly Operation[];
  /** Slots cut right through, as openings of the sheet. */
  readonly slots: readonly Opening[];
  readonly stockPieces: readonly StockPiece[];
  readonly problems: readonly Problem[];
}

type Spar = Surface['spars'][number];
const NONE: Sparred = { operations: [], slots: [], stockPieces: [], problems: [] };
/** A spar that leans less than this from tip to centre is one straight tube through both sides, mm. */
const STRAIGHT_MM = 0.05;
/** Shorter than this is no spar, mm. */
const LEAST_SPAR_MM = 1;
const mm = (value: number): string => trimmedDigits(value, 1);

/** A spar's two ends on its surface: the chord shares are those of the spar's own inner and outer end. */
function sparEnds(run: Run, { from, to, chordShare }: Spar): readonly [Vec3, Vec3] {
  return [pointAt(run.surface, from, chordShare[0]), pointAt(run.surface, to, chordShare[1])];
}

const problem = (code: string, path: string, message: string, fix?: string): Sparred => ({
  ...NONE,
  problems: [{ code, path, message, ...(fix ? { fix } : {}) }],
});

/** What the sheet must give up for a tube: a channel in one face, or a slot right through. */
function letIn(run: Run, spar: Spar, tube: Tube, lines: readonly (readonly Vec2[])[], path: string): Sparred {
  const [widthMm, depthMm] = tube.outerMm;
  switch (spar.let) {
    case 'inside':
      return { ...NONE, problems: [notBuiltYet(`${path}.let`, texts.notBuilt.sparLet)] };
    case 'through':
      return { ...NONE, slots: [{ path, rings: lines.map((line) => slotRing(line, widthMm)) }] };
    case 'face': {
      if (depthMm > run.material.thicknessMm) {
        const message = fill(texts.problems.sparTooHigh, { tube: mm(depthMm), sheet: mm(run.material.thicknessMm) });
        return problem('spar-too-high', `${path}.tubeId`, message, texts.problems.sparTooHighFix);
      }
      const note = fill(texts.notes.channel, { width: mm(widthMm), depth: mm(depthMm) });
      const operations = lines.map((line, index): Operation => {
        const id = `${spar.id}-channel${index === 0 ? '' : '-port'}`;
        return { id, kind: 'foamOut', path: line, closed: false, face: spar.face, widthMm, depthMm, note };
      });
      return { ...NONE, operations };
    }
  }
}

/** A slot as wide as the tube along its line, counter-clockwise. */
function slotRing(line: readonly Vec2[], widthMm: number): Vec2[] {
  const [a, b] = [line[0], line.at(-1)];
  if (!a || !b) throw new RangeError('a spar needs two ends');
  const size = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const [nx, ny] = [((a[1] - b[1]) / size) * (widthMm / 2), ((b[0] - a[0]) / size) * (widthMm / 2)];
  const corners: Vec2[] = [
    [a[0] - nx, a[1] - ny],
    [b[0] - nx, b[1] - ny],
    [b[0] + nx, b[1] + ny],
    [a[0] + nx, a[1] + ny],
  ];
  return [...counterClockwise(corners)];
}

/** Place in the sheet and bought length of one spar that begins on this piece; `ring` is the sheet left beside its controls. */
function sparOn(run: Run, ring: Ring, spar: Spar, tube: Tube | undefined, path: string): Sparred {
  if (!tube) return { ...NONE, problems: [notBuiltYet(`${path}.materialId`, texts.notBuilt.sparLet)] };
  const ends = sparEnds(run, spar);
  const [a, b] = [toPart(run.frame, ends[0]), toPart(run.frame, ends[1])];
  const inside = [0, 0.25, 0.5, 0.75, 1].every((t) =>
    onSheet([a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t], ring),
  );
  if (!inside || length3(sub3(ends[1], ends[0])) < LEAST_SPAR_MM)
    return problem('spar-off-sheet', `${path}.chordShare`, texts.problems.sparOffSheet);
  const across = run.centre && spar.from === 0 && Math.abs(b[1] - a[1]) < STRAIGHT_MM;
  const own: readonly Vec2[] = across ? [mirror2(b), b] : [a, b];
  const made = letIn(run, spar, tube, run.centre && !across ? [own, own.map(mirror2)] : [own], path);
  if (made.problems.length > 0) return made;
  const from = across ? mirror3(ends[1]) : ends[0];
  const lengthMm = length3(sub3(ends[1], from));
  const { id, mirrored } = run.surface.surface;
  const piece: StockPiece = {
    key: `${id}/${spar.id}/tube`,
    name: sparName(run.surface.surface, spar),
    tubeId: tube.id,
    lengthMm,
    count: mirrored && !across ? 2 : 1,
    from,
    to: ends[1],
  };
  return { ...made, stockPieces: [piece], problems: tooLong(tube, lengthMm, `${path}.to`) };
}

/** A bought length that is longer than it is sold. */
export function tooLong(tube: Tube, lengthMm: number, path: string): Problem[] {
  if (lengthMm <= tube.stockLengthMm) return [];
  const message = fill(texts.problems.tubeTooShort, { length: mm(lengthMm), stock: mm(tube.stockLengthMm) });
  return [{ code: 'tube-too-short', path, message, fix: texts.problems.tubeTooShortFix }];
}

/** How a spar is called: by its surface, and by its number where there are several. */
function sparName(surface: Surface, spar: Spar): string {
  const values = { surface: surfaceName(surface), number: surface.spars.indexOf(spar) + 1 };
  return fill(surface.spars.length > 1 ? texts.names.sparOf : texts.names.spar, values);
}

/** How a surface is called on a part: its own name, or its role. */
export const surfaceName = (surface: Surface): string => surface.name ?? elements.roles[surface.role];

/** Every spar that begins on this piece. A straight spar cannot follow a joint to another piece: that is a problem. */
export function sparsOn(run: Run, ring: Ring, tubes: ReadonlyMap<string, Tube>): Sparred {
  const start = run.panels[0]?.root.station ?? 0;
  const end = run.panels.at(-1)?.tip.station ?? 1;
  const found = run.surface.surface.spars.map((spar, index): Sparred => {
    const path = `surfaces.${run.surface.index}.spars.${index}`;
    if (spar.from < start || spar.from >= end) return NONE;
    if (spar.to > end + 1e-9) return problem('spar-across-joint', `${path}.to`, texts.problems.sparAcrossJoint);
    return sparOn(run, ring, spar, tubes.get(spar.tubeId ?? ''), path);
  });
  return {
    operations: found.flatMap(({ operations }) => operations),
    slots: found.flatMap(({ slots }) => slots),
    stockPieces: found.flatMap(({ stockPieces }) => stockPieces),
    problems: found.flatMap(({ problems }) => problems),
  };
}
