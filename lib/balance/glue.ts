import type { ResolvedAirframe, ResolvedSurface } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { meetsItsMirror } from '@/lib/parts/surface/run';
import type { Development, Part, StockPiece } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/balance';
import { fill } from '@/lib/text/fill';
import type { MassLine } from './line';
import type { PartMasses } from './partMasses';
import { type Piece, rodPiece, together } from './piece';
import { onSides } from './sides';
import { scaleSpread } from './spread';

// Glue: what the parts mark, and the joints that follow from how the aircraft is put together. Not counted: glue that holds horns,
// servos, gear and the motor, and what is squeezed out.

/** Glue as a share of the foam's mass when no part says where it goes. Common practice, no source: weigh yours. */
const GLUE_SHARE = 0.05;

const glueLine = (key: string, name: string, piece: Piece): MassLine => ({
  key,
  name,
  group: 'glue',
  basis: 'glue',
  ...piece,
});

/** How many lines of glue hold a surface's root: one along the foot of what stands on something; two where a whole wing is glued across a body. */
function footLines(airframe: Airframe, resolved: ResolvedSurface): number {
  const { surface } = resolved;
  const joints = airframe.joints.filter(({ between }) => between.includes(surface.id));
  const turns = surface.controls.some(({ kind, from, to }) => kind === 'allMoving' && from === 0 && to === 1);
  if (turns) return 0;
  if (!meetsItsMirror(resolved)) return joints.length === 0 || joints.some(({ kind }) => kind === 'glued') ? 1 : 0;
  const bodies = new Set(airframe.bodies.map(({ id }) => id));
  const onBody = joints.some(({ kind, between }) => kind === 'glued' && between.some((id) => bodies.has(id)));
  return onBody ? 2 : 0;
}

/** Glue under surfaces, along the root chord: fins, panels set on a body's sides, and wings glued across one. */
function feetGlue(
  airframe: Airframe,
  { surfaces }: ResolvedAirframe,
  parts: readonly Part[],
  nameOf: (id: string) => string,
): MassLine[] {
  const made = new Set(parts.map(({ elementId }) => elementId));
  return surfaces.flatMap((resolved): MassLine[] => {
    const { surface, panels } = resolved;
    const root = panels[0]?.root;
    if (!root || !made.has(surface.id)) return [];
    const massG = (footLines(airframe, resolved) * root.chordMm * airframe.build.glueGPerM) / 1000;
    if (massG === 0) return [];
    const name = fill(texts.glueFoot, { element: nameOf(surface.id) });
    const line = glueLine(`${surface.id}/foot/glue`, name, rodPiece(massG, root.le, root.te));
    return onSides(line, surface.mirrored && !meetsItsMirror(resolved));
  });
}

/** Glue along each spar let into foam, by the length of the tube. */
function sparGlue({ booms, build }: Airframe, stockPieces: readonly StockPiece[]): MassLine[] {
  const boomIds = new Set(booms.map(({ id }) => id));
  return stockPieces
    .filter(({ key }) => !boomIds.has(key.split('/')[0] ?? ''))
    .flatMap(({ key, name, lengthMm, count, from, to }): MassLine[] => {
      const massG = (lengthMm * build.glueGPerM) / 1000;
      if (massG === 0) return [];
      const line = glueLine(`${key}/glue`, fill(texts.glueTube, { tube: name }), rodPiece(massG, from, to));
      return onSides(line, count === 2);
    });
}

/** Glue as a share of the foam, spread as the foam is. */
function sharedGlue(foam: readonly MassLine[]): MassLine {
  const { massG, at, spread } = together(foam);
  const piece = { massG: massG * GLUE_SHARE, at, spread: scaleSpread(spread, GLUE_SHARE) };
  return glueLine('glue', texts.glueShare, piece);
}

/**
 * All glue, each joint once: what the parts hold, the feet of surfaces, and spars let in. When nothing but spars is joined, a stated share
 * of the foam at the foam's own centre.
 */
export function glueLines(
  airframe: Airframe,
  resolved: ResolvedAirframe,
  { parts, stockPieces }: Development,
  masses: readonly PartMasses[],
  foam: readonly MassLine[],
  nameOf: (id: string) => string,
): MassLine[] {
  const held = (pick: 'markedGlue' | 'insideGlue' | 'boomGlue', key: string, name: string) =>
    parts.flatMap((part, index): MassLine[] => {
      const piece = masses[index]?.[pick];
      return piece ? [glueLine(`${part.key}/${key}`, fill(name, { part: part.name }), piece)] : [];
    });
  const joints = [
    ...held('markedGlue', 'glue', texts.glue),
    ...held('insideGlue', 'glue', texts.glue),
    ...feetGlue(airframe, resolved, parts, nameOf),
    ...held('boomGlue', 'boom-glue', texts.glueBoom),
  ];
  const spars = sparGlue(airframe, stockPieces);
  return joints.length > 0 || foam.length === 0 ? [...joints, ...spars] : [...spars, sharedGlue(foam)];
}
