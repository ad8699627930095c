import type { ResolvedSurface } from '@/lib/airframe/resolved';
import type { Control } from '@/lib/airframe/schema/surface';
import type { SetUpControl } from '@/lib/figures/setUp';
import { convexHull } from '@/lib/geometry/hull';
import { contains } from '@/lib/geometry/polygons';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { beginAt, cleanRing, distanceToRing } from '@/lib/parts/shape/ring';
import type { Operation, Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { markLine, onePiece } from './piece';
import { slotWidthMm } from './slots';
import type { AidSource } from './source';
import { onArc, type ThrowMark, throwMarks } from './throwMarks';
import { type ThrowPlace, throwPlace } from './throwPlace';

const words = texts.throwGauge;

// A card beside the end of a control, with a line from the hinge for every throw. Lines from the hinge hold for any chord; the millimetres
// beside them hold at the widest chord, where the line has a corner. Axes of the card: hinge at 0, x aft along the fixed surface, y up.

/** Card beyond the trailing edge and past the last line, and half its height at its front. mm, degrees. */
const BEYOND_MM = { slipOn: 76, laidOn: 42 } as const;
const PAST_DEG = 9;
const FRONT_HALF_MM = 24;
/** How far the card reaches ahead of the hinge where it is laid on, and how far over the trailing edge where it is slipped on. mm. */
const AHEAD_MM = 62;
const OVER_MM = 40;
/** The slot ends behind the trailing edge by this much, mm. */
const SLOT_END_MM = 1;
/** Lines begin ahead of the trailing edge and end behind it. mm. */
const LINE_AHEAD_MM = 8;
const LINE_BEHIND_MM = 32;
const ARC_STEP_DEG = 3;
/** Middle of the label from the front edge of a card that is laid on, mm. */
const LABEL_X_MM = 22;

interface Card {
  readonly outline: readonly Vec2[];
  readonly slipOn: boolean;
}

/** The whole card, without a slot. */
function cardFrom(frontX: number, outer: number, marks: readonly ThrowMark[]): Vec2[] {
  const turns = marks.map(({ turnDeg }) => turnDeg);
  // Room for the label behind the trailing edge, however small the throws are.
  const least = (Math.asin(Math.min(1, FRONT_HALF_MM / outer)) * 180) / Math.PI;
  const [low, high] = [Math.min(-least, Math.min(...turns) - PAST_DEG), Math.max(least, Math.max(...turns) + PAST_DEG)];
  const steps = Math.ceil((high - low) / ARC_STEP_DEG);
  const arc = Array.from({ length: steps + 1 }, (_, i) => onArc(outer, low + ((high - low) * i) / steps));
  const steep = (turn: number): number =>
    Math.max(FRONT_HALF_MM, frontX > 0 ? frontX * Math.tan(radFromDeg(Math.min(80, Math.abs(turn)))) : 0);
  return cleanRing(convexHull([[frontX, -steep(low)], [frontX, steep(high)], ...arc]));
}

/** A slot from the front edge to behind the fixed trailing edge; null where the card's front is not straight enough for it. */
function slotted(ring: readonly Vec2[], frontX: number, endX: number, widthMm: number): Vec2[] | null {
  const front = ring.filter(([x]) => Math.abs(x - frontX) < 1e-6);
  const [top] = [...front].sort((a, b) => b[1] - a[1]);
  if (front.length !== 2 || !top || front.some(([, y]) => Math.abs(y) < widthMm)) return null;
  const h = widthMm / 2;
  // The ring runs down the front edge, so what follows its top corner is the slot.
  return beginAt(ring, top).flatMap((p, i): Vec2[] =>
    i === 0
      ? [
          [p[0], p[1]],
          [frontX, h],
          [endX, h],
          [endX, -h],
          [frontX, -h],
        ]
      : [[p[0], p[1]]],
  );
}

function cardOf(source: AidSource, { grip }: ThrowPlace, radiusMm: number, marks: readonly ThrowMark[]): Card {
  const laidOn: Card = { outline: cardFrom(-AHEAD_MM, radiusMm + BEYOND_MM.laidOn, marks), slipOn: false };
  if (!grip) return laidOn;
  const most = Math.max(...marks.map(({ turnDeg }) => Math.abs(turnDeg)));
  const begins = Math.min(radiusMm, grip.edgeMm) - LINE_AHEAD_MM;
  const frontX = Math.min(grip.edgeMm - OVER_MM, begins * Math.cos(radFromDeg(Math.min(90, most))) - 4);
  // Ahead of the hinge the slot would have to pass a bevel and its tape.
  if (frontX < 2) return laidOn;
  const width = slotWidthMm(grip.thicknessMm, source.airframe.build);
  const outline = slotted(
    cardFrom(frontX, radiusMm + BEYOND_MM.slipOn, marks),
    frontX,
    grip.edgeMm + SLOT_END_MM,
    width,
  );
  return outline ? { outline, slipOn: true } : laidOn;
}

/** The line of a throw, with a corner where the trailing edge stands at the widest chord; clear of the slot. */
function throwLine({ id, turnDeg, text }: ThrowMark, radiusMm: number, { outline }: Card): Operation {
  const begins = Math.max(1, radiusMm - LINE_AHEAD_MM);
  const clear = (p: Vec2): boolean => contains(outline, p) && distanceToRing(p, outline) > 0.5;
  const first = [begins, radiusMm - LINE_AHEAD_MM / 2].map((r) => onArc(r, turnDeg)).find(clear);
  const mark = onArc(radiusMm, turnDeg);
  const from = clear(mark) ? [...(first ? [first] : []), mark] : [onArc(radiusMm + 2, turnDeg)];
  return markLine(id, [...from, onArc(radiusMm + LINE_BEHIND_MM, turnDeg)], text, 'outer');
}

/** Where the hinge is and how the surface runs, on a card that is laid on. */
const hingeMarks: readonly Operation[] = [
  markLine(
    'hinge',
    [
      [0, -8],
      [0, 8],
    ],
    words.hinge,
    'outer',
  ),
  markLine(
    'surface',
    [
      [-12, 0],
      [8, 0],
    ],
    words.chord,
    'outer',
  ),
];

function gaugeOf(source: AidSource, surface: ResolvedSurface, control: Control, sheet: SetUpControl): Part {
  const place = throwPlace(source, surface, control);
  const marks = throwMarks(sheet);
  const card = cardOf(source, place, sheet.widestMm, marks);
  return onePiece({
    key: `aid/throw/${surface.surface.id}/${control.id}`,
    name: fill(words.name, { surface: sheet.surface, control: sheet.control }),
    about: [card.slipOn ? words.slipOn : words.layOn, fill(words.reads, { r: trimmedDigits(sheet.widestMm, 1) })],
    material: source.material,
    outline: card.outline,
    operations: [...marks.map((mark) => throwLine(mark, sheet.widestMm, card)), ...(card.slipOn ? [] : hingeMarks)],
    frame: place.frame,
    // Beside the lines, not over them.
    labelAt: card.slipOn
      ? [sheet.widestMm + (LINE_BEHIND_MM + BEYOND_MM.slipOn) / 2 + 2, 0]
      : [LABEL_X_MM - AHEAD_MM, 0],
  });
}

/** A gauge for every control of the set-up sheet: the same one serves both sides. */
export function throwGauges(source: AidSource): Part[] {
  return source.resolved.surfaces.flatMap((surface) =>
    surface.surface.controls.flatMap((control) => {
      const sheet = source.setUp.controls.find(({ id }) => id === `${surface.surface.id}/${control.id}`);
      return sheet && sheet.widestMm > 0 ? [gaugeOf(source, surface, control, sheet)] : [];
    }),
  );
}
