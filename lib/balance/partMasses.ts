import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Material } from '@/lib/airframe/schema/stock';
import { edges, signedArea } from '@/lib/geometry/polygons';
import { eachKept, type Kept } from '@/lib/numerics/kept';
import { type Facet, facetsOf } from '@/lib/parts/shape/facets';
import { fromPart } from '@/lib/parts/shape/frame';
import type { Operation, Part } from '@/lib/parts/types';
import { facetAt } from './facetAt';
import { boomGlue, type InsideGlue, insideGlue } from './partGlue';
import { mirrorPiece, type Piece, platePieces, rodPiece, together } from './piece';
import { removedPieces } from './removed';

// Masses of what is cut from sheet, and of the glue and tape that its parts hold: all that a part alone decides.

/** Width of a strip of tape when the part does not say, mm: clear packing tape. Common practice, no source. */
const TAPE_WIDTH_MM = 48;

interface Size {
  readonly lengthMm: number;
  /** What a closed path encloses; 0 for an open one. */
  readonly areaMm2: number;
}

/** What a part brings with it; `null` for what it has none of. */
export interface PartMasses {
  readonly foam: Piece;
  /** Glue that the part marks, each joint once: along each line by its length, over each area by its area. */
  readonly markedGlue: Piece | null;
  /** Glue round a former or under a doubler. */
  readonly insideGlue: Piece | null;
  /** Glue along booms let in. */
  readonly boomGlue: Piece | null;
  /** Tape along each marked line, as wide as the part says or as the roll is. */
  readonly tape: Piece | null;
}

/** What of the document the masses of every part depend on. */
interface Shop {
  readonly materials: Airframe['materials'];
  readonly build: Airframe['build'];
  readonly inside: InsideGlue;
  /** Booms that lie in a slot. */
  readonly slotted: readonly string[];
}

const shopOf = ({ materials, build, bodies, booms }: Airframe): Shop => ({
  materials,
  build,
  inside: {
    formers: bodies.flatMap(({ formers }) => formers.map(({ id }) => id)),
    doublers: bodies.flatMap(({ doublers }) => doublers.map(({ id }) => id)),
  },
  slotted: booms.filter(({ sleeve }) => sleeve === 'slot').map(({ id }) => id),
});

/** Masses of each part, in their order. Throws RangeError for a part of an unknown material. */
export function partMasses(airframe: Airframe, parts: readonly Part[], memory?: Kept<PartMasses>): PartMasses[] {
  const shop = shopOf(airframe);
  const keys = new Set(parts.map(({ key }) => key));
  const hasFellow = ({ mirrorOf }: Part) => mirrorOf !== undefined && keys.has(mirrorOf);
  const weighed = parts.filter((part) => !hasFellow(part));
  const masses = eachKept(memory, shop, weighed, {
    nameOf: ({ key }) => key,
    from: (part) => part,
    work: (part) => massesOf(part, shop),
  });
  const byKey = new Map(weighed.map(({ key }, index) => [key, masses[index]]));
  return parts.map((part): PartMasses => {
    const own = byKey.get(part.key);
    const fellow = byKey.get(part.mirrorOf ?? '');
    if (own) return own;
    if (fellow) return mirrored(fellow);
    throw new RangeError(`part ${part.key} mirrors a mirror image`);
  });
}

const mirrored = ({ foam, markedGlue, insideGlue: inside, boomGlue: boom, tape }: PartMasses): PartMasses => ({
  foam: mirrorPiece(foam),
  markedGlue: markedGlue && mirrorPiece(markedGlue),
  insideGlue: inside && mirrorPiece(inside),
  boomGlue: boom && mirrorPiece(boom),
  tape: tape && mirrorPiece(tape),
});

function massesOf(part: Part, { materials, build, inside, slotted }: Shop): PartMasses {
  const material = materials.find(({ id }) => id === part.materialId);
  if (!material) throw new RangeError(`part ${part.key} names an unknown material ${part.materialId}`);
  const facets = facetsOf(part);
  return {
    foam: foamOf(part, material, facets),
    markedGlue: along(part, facets, 'glue', ({ lengthMm, areaMm2 }) =>
      areaMm2 > 0 ? (areaMm2 * build.glueGm2) / 1e6 : (lengthMm * build.glueGPerM) / 1000,
    ),
    insideGlue: insideGlue(part, facets, inside, build),
    boomGlue: boomGlue(part, slotted, build),
    tape: along(part, facets, 'tape', ({ lengthMm, areaMm2 }, { widthMm }) => {
      const area = areaMm2 > 0 ? areaMm2 : lengthMm * (widthMm ?? TAPE_WIDTH_MM);
      return (area * build.tapeGm2) / 1e6;
    }),
  };
}

/**
 * Its area with holes off, times the sheet's mass per area, less what bevels and channels take away, spread as the plates it is folded
 * to. Where cuts overlap so far that they would leave nothing, the sheet is weighed as if uncut.
 */
function foamOf(part: Part, material: Material, facets: readonly Facet[]): Piece {
  const sheet = platePieces(facets, part.thicknessMm, material.arealMassGm2);
  const worked = [...sheet, ...removedPieces(part, material, facets)];
  const leaves = worked.reduce((sum, { massG }) => sum + massG, 0) > 0;
  return together(leaves ? worked : sheet);
}

/** Glue or tape on one part, in the places where its folds bring it. */
function along(
  part: Part,
  facets: readonly Facet[],
  kind: Operation['kind'],
  massOf: (size: Size, operation: Operation) => number,
): Piece | null {
  const pieces = part.operations
    .filter((operation) => operation.kind === kind)
    .flatMap((operation): Piece[] => {
      const { path, closed, sharedBy = 1 } = operation;
      const areaMm2 = closed ? Math.abs(signedArea(path)) : 0;
      const stretches = closed ? edges(path) : edges(path).slice(0, -1);
      const lengths = stretches.map(([a, b]) => Math.hypot(b[0] - a[0], b[1] - a[1]));
      const lengthMm = lengths.reduce((sum, length) => sum + length, 0);
      if (lengthMm === 0) return [];
      const whole = massOf({ lengthMm, areaMm2 }, operation) / sharedBy;
      return stretches.map(([a, b], index) => {
        const massG = (whole * (lengths[index] ?? 0)) / lengthMm;
        const { frame } = facetAt(facets, [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]);
        return rodPiece(massG, fromPart(frame, a), fromPart(frame, b));
      });
    });
  return pieces.some(({ massG }) => massG > 0) ? together(pieces) : null;
}
