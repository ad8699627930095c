import { cross3, type Vec2, type Vec3 } from '@/lib/numerics/vec';
import { unit3 } from '@/lib/parts/shape/frame';
import type { Part } from '@/lib/parts/types';
import { texts } from '@/lib/text/en/aids';
import { fill } from '@/lib/text/fill';
import { fixedDigits, trimmedDigits } from '@/lib/units/number';
import { type CgPlace, cgPlace, STAND_HALF_MM } from './cgPlace';
import { markLine, onePiece, pairOf, sideOn } from './piece';
import { slotHole, slotLengthMm, slotWidthMm } from './slots';
import type { AidSource } from './source';

const words = texts.cgStand;

/** What hangs lowest keeps this far from the base, so that the aircraft may tip. mm. */
const CLEAR_MM = 20;
const LEAST_HEIGHT_MM = 70;
/** Half the width of a finger's tip: blunt enough not to dent the foam, and no more than a pencil line off. mm. */
const TIP_HALF_MM = 1.5;
const TAB_MM = 40;
const RIM_MM = 30;

const heightOf = ({ touch, lowZ }: CgPlace): number => Math.max(LEAST_HEIGHT_MM, touch[2] - lowZ + CLEAR_MM);

function uprights(source: AidSource, place: CgPlace): Part[] {
  const { material } = source;
  const height = heightOf(place);
  const [half, tab, t] = [STAND_HALF_MM - 5, TAB_MM / 2, material.thicknessMm];
  const [x, y, z] = place.touch;
  const outline: Vec2[] = [
    [-half, 0],
    [-tab, 0],
    [-tab, -t],
    [tab, -t],
    [tab, 0],
    [half, 0],
    [9, height - 30],
    [TIP_HALF_MM, height],
    [-TIP_HALF_MM, height],
    [-9, height - 30],
  ];
  return pairOf({
    key: 'aid/cg-stand/upright',
    name: words.upright,
    about: [fill(words.uprightAbout, { y: fixedDigits(y, 1) })],
    material,
    outline,
    operations: [
      markLine(
        'cg',
        [
          [0, height - 1],
          [0, height - Math.min(60, 0.7 * height)],
        ],
        words.line,
        'inner',
      ),
    ],
    frame: sideOn([x, y, z - height]),
    faces: ['inner', 'outer'],
  });
}

function base(source: AidSource, place: CgPlace): Part {
  const { material, airframe } = source;
  const [x, y, z] = place.touch;
  const t = material.thicknessMm;
  const [w, h] = [y + RIM_MM, STAND_HALF_MM];
  const outline: Vec2[] = [
    [-w, -h],
    [w, -h],
    [w, h],
    [-w, h],
  ];
  const slots = [-y, y].map((at) =>
    slotHole([at, 0], slotWidthMm(t, airframe.build), slotLengthMm(TAB_MM, airframe.build)),
  );
  return onePiece({
    key: 'aid/cg-stand/base',
    name: words.base,
    about: [fill(words.baseAbout, { apart: fixedDigits(2 * y, 1) }), words.baseUse],
    material,
    outline,
    holes: slots,
    frame: { origin: [x, 0, z - heightOf(place) - t / 2], ex: [0, 1, 0], ey: [-1, 0, 0] },
    faces: ['upper', 'lower'],
  });
}

/** Hook of the marker: how thick it is, how deep the bar below it, and how far the bar runs on behind the notch. mm. */
const HOOK_MM = 12;
const BAR_MM = 28;
const BEHIND_MM = 25;
const NOTCH_MM = 2;

/** A bar that hooks on the leading edge and shows where the CG line runs on the lower face; none where the two are too close. */
function marker(source: AidSource, place: CgPlace): Part[] {
  const { aft, touch, behindEdgeMm: d, thicknessMm } = place;
  if (d < 3 * NOTCH_MM) return [];
  const up = unit3(cross3(aft, unit3(cross3([0, 0, 1], aft))));
  const along = (mm: number): Vec3 => [touch[0] + aft[0] * mm, touch[1] + aft[1] * mm, touch[2] + aft[2] * mm];
  const outline: Vec2[] = [
    [-HOOK_MM, -BAR_MM],
    [d + BEHIND_MM, -BAR_MM],
    [d + BEHIND_MM, 0],
    [d + NOTCH_MM, 0],
    [d, -2 * NOTCH_MM],
    [d - NOTCH_MM, 0],
    [0, 0],
    [0, thicknessMm + 3],
    [-HOOK_MM, thicknessMm + 3],
  ];
  return [
    onePiece({
      key: 'aid/cg-stand/marker',
      name: words.marker,
      about: [
        fill(words.markerAbout, { y: trimmedDigits(touch[1], 0) }),
        fill(words.markerUse, { d: fixedDigits(d, 1) }),
      ],
      material: source.material,
      outline,
      frame: { origin: along(-d), ex: aft, ey: up },
    }),
  ];
}

/**
 * A stand that carries the aircraft on two fingers under its first-flight CG line, and the bar to mark that line with. Nothing when the line
 * passes under no wing.
 * @param firstFlightCgXMm aircraft axes
 */
export function cgStand(source: AidSource, firstFlightCgXMm: number): Part[] {
  const place = cgPlace(source, firstFlightCgXMm);
  if (!place) return [];
  return [...uprights(source, place), base(source, place), ...marker(source, place)];
}
