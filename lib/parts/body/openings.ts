import type { Body } from '@/lib/airframe/schema/fuselage';
import { contains, counterClockwise } from '@/lib/geometry/polygons';
import { notBuiltYet, type Problem } from '@/lib/numerics/result';
import type { Vec2 } from '@/lib/numerics/vec';
import { texts } from '@/lib/text/en/parts';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import type { Opening } from '../opening';
import { heightAt } from '../shape/polyline';
import { distanceToRing } from '../shape/ring';
import type { BodyFace, FacePiece } from './faces';

/** Foam left between an opening and an edge of its face, mm: less tears out. Common practice, no source. */
export const OPENING_EDGE_MM = 2;

type Cut = Body['openings'][number];

function openingRing(piece: FacePiece, { fromX, toX, widthMm }: Cut): Vec2[] {
  const across = piece.middle((fromX + toX) / 2);
  const [a, b] = [piece.unrolled.sAt(fromX), piece.unrolled.sAt(toX)];
  const corners: Vec2[] = [
    piece.place(a, across - widthMm / 2),
    piece.place(b, across - widthMm / 2),
    piece.place(b, across + widthMm / 2),
    piece.place(a, across + widthMm / 2),
  ];
  return [...counterClockwise(corners)];
}

/** A body's openings in one face, counter-clockwise in the face's axes, and what cannot be cut. `path` is the body's. */
export function openingsOn(
  face: BodyFace,
  piece: FacePiece,
  body: Body,
  path: string,
): { openings: Opening[]; problems: Problem[] } {
  const openings: Opening[] = [];
  const problems: Problem[] = [];
  for (const [index, opening] of body.openings.entries()) {
    if (opening.face !== face) continue;
    const place = `${path}.openings.${index}`;
    const middleX = (opening.fromX + opening.toX) / 2;
    const room = heightAt(piece.high, middleX) - heightAt(piece.low, middleX);
    if (opening.purpose === 'saddle' && opening.widthMm >= room - 2 * OPENING_EDGE_MM) {
      problems.push(notBuiltYet(`${place}.widthMm`, texts.notBuilt.saddleOpening));
      continue;
    }
    const ring = openingRing(piece, opening);
    const inside = ring.every((p) => contains(piece.outline, p) && distanceToRing(p, piece.outline) >= OPENING_EDGE_MM);
    if (!inside) {
      const [from, to] = [piece.unrolled.line[0]?.[0] ?? 0, piece.unrolled.line.at(-1)?.[0] ?? 0];
      const rooms = [opening.fromX, middleX, opening.toX].map((x) => heightAt(piece.high, x) - heightAt(piece.low, x));
      const widest = Math.max(0, Math.min(...rooms) - 2 * OPENING_EDGE_MM);
      const fix = fill(texts.problems.openingOffFaceFix, {
        from: trimmedDigits(from, 1),
        to: trimmedDigits(to, 1),
        widest: trimmedDigits(Math.floor(widest), 0),
      });
      problems.push({ code: 'opening-off-face', path: place, message: texts.problems.openingOffFace, fix });
      continue;
    }
    openings.push({ path: place, rings: [ring] });
  }
  return { openings, problems };
}

/** Openings of a doubler that lies behind a face: the same places. */
export function openingsThrough(face: BodyFace, piece: FacePiece, body: Body, path: string): Opening[] {
  return body.openings.flatMap((opening, index) => {
    if (opening.face !== face) return [];
    const [from, to] = [piece.unrolled.line[0]?.[0] ?? 0, piece.unrolled.line.at(-1)?.[0] ?? 0];
    if (opening.toX <= from || opening.fromX >= to) return [];
    return [{ path: `${path}.openings.${index}`, rings: [openingRing(piece, opening)] }];
  });
}
