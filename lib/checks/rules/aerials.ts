import { CLEARANCE } from '@/lib/airframe/practice';
import type { Tube } from '@/lib/airframe/schema/stock';
import { mirror3, type Vec3 } from '@/lib/numerics/vec';
import type { StockPiece } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/checks';
import { fill } from '@/lib/text/fill';
import { type Context, leastLevel, mm, result } from '../context';
import { boxedEquipment } from '../equipment';
import { type Box, lineToBox } from '../geometry/box';
import { CARBON_FROM_GPA } from '../practice';
import type { CheckResult } from '../types';

/** An aerial can be led away from carbon, so nearness is never worse than "watch". */
const NEVER_BAD = 0;

interface Carbon {
  readonly piece: StockPiece;
  readonly tube: Tube;
}

function carbonPieces({ airframe, development }: Context): Carbon[] {
  const tubes = new Map(airframe.tubes.map((tube) => [tube.id, tube]));
  return development.stockPieces.flatMap((piece): Carbon[] => {
    const tube = tubes.get(piece.tubeId);
    const carbon = tube && tube.kind !== 'foamBox' && (tube.eGpa ?? CARBON_FROM_GPA.value) >= CARBON_FROM_GPA.value;
    return carbon ? [{ piece, tube }] : [];
  });
}

interface Near {
  readonly mm: number;
  readonly at: Vec3;
  readonly name: string;
}

function nearestCarbon(box: Box, carbon: readonly Carbon[]): Near | null {
  const all = carbon.flatMap(({ piece, tube }): Near[] => {
    const lines: [Vec3, Vec3][] = [[piece.from, piece.to]];
    if (piece.count > 1) lines.push([mirror3(piece.from), mirror3(piece.to)]);
    return lines.map(([from, to]) => {
      const found = lineToBox(box, from, to);
      return { mm: Math.max(0, found.mm - Math.max(...tube.outerMm) / 2), at: found.at, name: piece.name };
    });
  });
  return all.reduce<Near | null>((best, one) => (best && best.mm <= one.mm ? best : one), null);
}

/** Receivers and the carbon next to them: an aerial begins at the receiver, and where it lies is not drawn. */
export function aerialRule(context: Context): CheckResult[] {
  const carbon = carbonPieces(context);
  const limit = CLEARANCE.aerialFromCarbonMm.value;
  return boxedEquipment(context).flatMap(({ id, kind, box }): CheckResult[] => {
    const near = kind === 'receiver' ? nearestCarbon(box, carbon) : null;
    if (!near) return [];
    const what = fill(texts.things.spar, { name: near.name });
    return [
      result('aerial-carbon', {
        elementId: id,
        path: context.pathOf(id),
        at: near.at,
        level: leastLevel(near.mm, limit, NEVER_BAD),
        words: fill(texts.words.aerial, { mm: mm(near.mm), what, limit: mm(limit) }),
        measured: { value: near.mm, quantity: 'mm', least: limit },
        fix: fill(texts.rules['aerial-carbon'].fix, { limit: mm(limit) }),
        basis: CLEARANCE.aerialFromCarbonMm.basis,
      }),
    ];
  });
}
