import { add3, mirror3, scale3, type Vec3 } from '@/lib/numerics/vec';
import type { Facet } from '@/lib/parts/shape/facets';
import type { MassLine } from './line';
import { gathered, mirrorSpread, plate, rodSpread, scaleSpread } from './spread';

/** A mass with its centre and its spread, before it is a line of the list. Foam that was taken away is a piece of negative mass. */
export type Piece = Pick<MassLine, 'massG' | 'at' | 'spread'>;

/** Several masses as one: their sum at their common centre. Throws RangeError when nothing is left to have a centre. */
export function together(pieces: readonly Piece[]): Piece {
  const whole = gathered(pieces);
  if (!(whole.massG > 0)) throw new RangeError(`pieces together must weigh something, got ${whole.massG} g`);
  return whole;
}

/** A mass spread evenly along a straight line. */
export const rodPiece = (massG: number, from: Vec3, to: Vec3): Piece => ({
  massG,
  at: scale3(add3(from, to), 0.5),
  spread: rodSpread(massG, from, to),
});

/** Flat pieces of a part weighed by their area, g/m2, where its folds bring them. */
export const platePieces = (facets: readonly Facet[], thicknessMm: number, arealMassGm2: number): Piece[] =>
  facets.map(({ outline, holes, frame }) => {
    const flat = plate(outline, holes, thicknessMm, frame);
    const massG = (flat.areaMm2 * arealMassGm2) / 1e6;
    return { massG, at: flat.at, spread: scaleSpread(flat.spread, massG) };
  });

/** The same mass on the other side of the aircraft. */
export const mirrorPiece = ({ massG, at, spread }: Piece): Piece => ({
  massG,
  at: mirror3(at),
  spread: mirrorSpread(spread),
});
