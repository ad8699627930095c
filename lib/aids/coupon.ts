import type { Build, Material } from '@/lib/airframe/schema/stock';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import { AID_ID, across, markLine, onePiece, type Piece } from './piece';
import { drawnSlotMm } from './slots';

// The stock coupon: three pieces that tell what a board really is. `readCoupon` turns what was read on them into a record of the board.

const words = texts.coupon;

/** Side of the square that is weighed, mm. */
export const SQUARE_MM = 100;
/** Width of the bending strip, and how far it reaches past its supports. mm. */
export const STRIP_WIDTH_MM = 30;
const STRIP_PAST_MM = 25;
/** Usual length between the supports, mm. */
export const STRIP_SPAN_MM = 200;
/**
 * Shortest span over the thickness at which a strip tells bending rather than shear (16 to 1: ASTM D790, "Flexural Properties of Unreinforced
 * and Reinforced Plastics", the support span; from memory).
 */
export const LEAST_SPAN_SHARE = 16;
const SPAN_STEP_MM = 50;

/** Length between the supports for a board: 200 mm, more where it is thick. mm. */
export const bendingSpanMm = (thicknessMm: number): number =>
  Math.max(STRIP_SPAN_MM, SPAN_STEP_MM * Math.ceil((LEAST_SPAN_SHARE * thicknessMm) / SPAN_STEP_MM - 1e-9));

/** The usual comb, mm: it suits boards sold as 5 and as 6 mm. */
const COMB_FROM_MM = 4.4;
const COMB_STEP_MM = 0.2;
const COMB_SLOTS = 12;
const TOOTH_MM = 12;
const SLOT_DEEP_MM = 25;
const COMB_HIGH_MM = 72;

/** Widths of the comb's slots: 4.4 to 6.6 mm by 0.2 where the board lies well inside, else as many about its stated thickness. mm. */
function combWidthsMm(thicknessMm: number): number[] {
  const steps = Math.round(thicknessMm / COMB_STEP_MM);
  const usual = Math.round(COMB_FROM_MM / COMB_STEP_MM);
  const first = thicknessMm >= 4.8 && thicknessMm <= 6.2 ? usual : Math.max(2, steps - 5);
  return Array.from({ length: COMB_SLOTS }, (_, i) => (first + i) / Math.round(1 / COMB_STEP_MM));
}

const rectangle = (w: number, h: number): Vec2[] => [
  [0, 0],
  [w, 0],
  [w, h],
  [0, h],
];

function comb(material: Material, build: Pick<Build, 'kerfMm'>): Pick<Piece, 'outline' | 'operations' | 'labelAt'> {
  const outline: Vec2[] = [[0, 0]];
  const operations: Operation[] = [];
  let x = 0;
  for (const [i, width] of combWidthsMm(material.thicknessMm).entries()) {
    const [a, b] = [x + TOOTH_MM, x + TOOTH_MM + drawnSlotMm(width, build)];
    outline.push([a, 0], [a, SLOT_DEEP_MM], [b, SLOT_DEEP_MM], [b, 0]);
    const y = SLOT_DEEP_MM + 2;
    operations.push(
      markLine(
        `slot-${i + 1}`,
        [
          [a, y],
          [b, y],
        ],
        fill(words.slot, { width: fixedDigits(width, 1) }),
        'outer',
      ),
    );
    x = b;
  }
  outline.push([x + TOOTH_MM, 0], [x + TOOTH_MM, COMB_HIGH_MM], [0, COMB_HIGH_MM]);
  // Clear of the widths that stand over the slots.
  return { outline, operations, labelAt: [(x + TOOTH_MM) / 2, COMB_HIGH_MM - 20] };
}

function strip(spanMm: number): Pick<Part, 'outline' | 'operations'> {
  const at = (id: string, x: number, note: string): Operation =>
    markLine(
      id,
      [
        [x, 0],
        [x, STRIP_WIDTH_MM],
      ],
      note,
      'outer',
    );
  return {
    outline: rectangle(spanMm + 2 * STRIP_PAST_MM, STRIP_WIDTH_MM),
    operations: [
      at('support-1', STRIP_PAST_MM, words.support),
      at('load', STRIP_PAST_MM + spanMm / 2, words.load),
      at('support-2', STRIP_PAST_MM + spanMm, words.support),
    ],
  };
}

/** Square, bending strip and slot comb of a material, as flat parts; `name` is the material's, as it is to be read. */
export function couponParts(material: Material, name: string, build: Pick<Build, 'kerfMm'>): Part[] {
  const spanMm = bendingSpanMm(material.thicknessMm);
  const base = { material, frame: across([0, 0, 0]) };
  const named = (what: string): string => fill(what, { material: name });
  const key = (what: string): string => `${AID_ID}/coupon/${material.id}/${what}`;
  const parts = [
    onePiece({
      ...base,
      key: key('square'),
      name: named(words.square),
      about: [words.squareAbout],
      outline: rectangle(SQUARE_MM, SQUARE_MM),
    }),
    onePiece({
      ...base,
      ...strip(spanMm),
      key: key('strip'),
      name: named(words.strip),
      about: [fill(words.stripAbout, { span: trimmedDigits(spanMm, 0) }), words.stripReads],
      grainDeg: 0,
    }),
    onePiece({
      ...base,
      ...comb(material, build),
      key: key('comb'),
      name: named(words.comb),
      about: [words.combAbout, words.combReads],
    }),
  ];
  return parts;
}
