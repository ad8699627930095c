import type { Airframe } from '@/lib/airframe/schema/airframe';
import { edges } from '@/lib/geometry/polygons';
import type { Facet } from '@/lib/parts/shape/facets';
import { fromPart } from '@/lib/parts/shape/frame';
import type { Operation, Part } from '@/lib/parts/types';
import { type Piece, platePieces, rodPiece, together } from './piece';

// Glue that a part holds without marking it on the sheet.

/** Ids of what stands or lies in glue inside bodies. */
export interface InsideGlue {
  readonly formers: readonly string[];
  readonly doublers: readonly string[];
}

type Build = Airframe['build'];

const someOf = (pieces: readonly Piece[]): Piece | null =>
  pieces.some(({ massG }) => massG > 0) ? together(pieces) : null;

/** Formers stand in glue all round their edge, doublers lie in it over their area. */
export function insideGlue(
  part: Part,
  facets: readonly Facet[],
  { formers, doublers }: InsideGlue,
  build: Build,
): Piece | null {
  if (formers.includes(part.elementId)) return someOf(edges(part.outline).map((edge) => lineOf(part, build, edge)));
  return doublers.includes(part.elementId) ? someOf(platePieces(facets, 0, build.glueGm2)) : null;
}

/** Glue along booms let into a sheet. A boom on saddles is marked by the sheet itself. */
export function boomGlue(part: Part, slotted: readonly string[], build: Build): Piece | null {
  return someOf(
    boomChannels(part, slotted).flatMap(({ path }) =>
      edges(path)
        .slice(0, -1)
        .map((edge) => lineOf(part, build, edge)),
    ),
  );
}

/** Glue along a line of a part that lies flat. */
function lineOf(part: Part, { glueGPerM }: Build, [a, b]: ReturnType<typeof edges>[number]): Piece {
  const massG = (Math.hypot(b[0] - a[0], b[1] - a[1]) * glueGPerM) / 1000;
  return rodPiece(massG, fromPart(part.frame, a), fromPart(part.frame, b));
}

/** Channels that a slotted boom lies in, by the ids that the parts give them. */
function boomChannels({ operations }: Part, slotted: readonly string[]): Operation[] {
  const isOf = (id: string, boomId: string) =>
    id.startsWith(boomId) && /^(-\d+)?(-port)?-slot$/.test(id.slice(boomId.length));
  return operations.filter(({ kind, id }) => kind === 'foamOut' && slotted.some((boom) => isOf(id, boom)));
}
