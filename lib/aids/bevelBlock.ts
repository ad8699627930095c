import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { trimmedDigits } from '@/lib/units/number';
import { across, onePiece, pairOf, sideOn } from './piece';
import { slotHole, slotLengthMm, slotWidthMm } from './slots';
import type { AidSource } from './source';

const words = texts.bevel;

/** Bevels closer than this share a block, degrees: over 5 mm of foam it is 0.03 mm. */
const SAME_DEG = 0.3;
/** A lean that no block can guide: the cheek would be lower than a blade. */
const MOST_DEG = 82;
/** Height of a block and how far its slope may run. mm. */
const HEIGHT_MM = 40;
const SLOPE_MM = 70;
const FLAT_MM = 60;
/** The spacer's slot from the back edge, mm. */
const SLOT_BACK_MM = 12;
/** Between the cheeks, mm. */
const WIDTH_MM = 60;

/** The angles from square that a blade is led at on these parts, each once, the smallest first. */
function bevelAngles(parts: readonly Pick<Part, 'operations'>[]): number[] {
  const angles = parts
    .flatMap(({ operations }) => operations)
    .flatMap(({ kind, angleDeg }) => (kind === 'bevel' && angleDeg !== undefined ? [Math.abs(angleDeg)] : []))
    .filter((deg) => deg >= SAME_DEG && deg <= MOST_DEG)
    .sort((a, b) => a - b);
  const apart: number[] = [];
  for (const deg of angles) if (deg - (apart.at(-1) ?? 0) > SAME_DEG) apart.push(deg);
  return apart;
}

interface Block {
  readonly deg: number;
  readonly highMm: number;
}

const heightOf = (deg: number): number => Math.min(HEIGHT_MM, SLOPE_MM / Math.tan(radFromDeg(deg)));

/** The spacer's tab and what takes it, as shares of a block's height. */
const TAB_FROM = 1 / 4;
const TAB_TO = 3 / 4;

function cheeks({ material, airframe: { build } }: AidSource, { deg, highMm }: Block): Part[] {
  const slope = highMm * Math.tan(radFromDeg(deg));
  const hole = slotHole(
    [slope + FLAT_MM - SLOT_BACK_MM, highMm / 2],
    slotWidthMm(material.thicknessMm, build),
    slotLengthMm((TAB_TO - TAB_FROM) * highMm, build),
  );
  const shown = trimmedDigits(deg, 1);
  return pairOf({
    key: `aid/bevel/${shown.replace('.', '-')}`,
    name: fill(words.cheek, { deg: shown }),
    about: [fill(words.about, { deg: shown }), words.toe],
    material,
    outline: [
      [0, 0],
      [slope + FLAT_MM, 0],
      [slope + FLAT_MM, highMm],
      [slope, highMm],
    ],
    holes: [hole],
    frame: sideOn([0, (WIDTH_MM + material.thicknessMm) / 2, 0]),
  });
}

/** What holds two cheeks apart; blocks of one height take turns with it. */
function spacer({ material }: AidSource, highMm: number, degs: readonly number[]): Part {
  const [w, reach] = [WIDTH_MM / 2, WIDTH_MM / 2 + material.thicknessMm];
  const [low, top] = [TAB_FROM * highMm, TAB_TO * highMm];
  const outline: Vec2[] = [
    [-w, highMm / 10],
    [w, highMm / 10],
    [w, low],
    [reach, low],
    [reach, top],
    [w, top],
    [w, 0.9 * highMm],
    [-w, 0.9 * highMm],
    [-w, top],
    [-reach, top],
    [-reach, low],
    [-w, low],
  ];
  const list = degs.map((deg) => fill(words.degrees, { deg: trimmedDigits(deg, 1) })).join(', ');
  return onePiece({
    key: `aid/bevel/spacer-${trimmedDigits(highMm, 1).replace('.', '-')}`,
    name: words.spacer,
    about: [words.spacerAbout, fill(words.spacerFor, { degs: list })],
    material,
    outline,
    frame: across([0, 0, 0]),
  });
}

/** A block for every angle at which the aircraft's parts are bevelled: two cheeks that guide the blade, and what holds them apart. */
export function bevelBlocks(source: AidSource): Part[] {
  const blocks = bevelAngles(source.parts).map((deg): Block => ({ deg, highMm: heightOf(deg) }));
  const heights = [...new Set(blocks.map(({ highMm }) => highMm))];
  return [
    ...blocks.flatMap((block) => cheeks(source, block)),
    ...heights.map((highMm) => {
      const degs = blocks.filter((block) => block.highMm === highMm).map(({ deg }) => deg);
      return spacer(source, highMm, degs);
    }),
  ];
}
