import type { Vec2 } from '@/lib/numerics/vec';

// Two shapes of an incidence gauge, drawn with the reference level along x. Their first point on the chord is at 0, 0; the chord falls aft
// by `slope`.

/** Height over the front foot, length of a foot, and how far the part between them keeps off the surface. mm. */
const HEIGHT_MM = 42;
const FOOT_MM = 12;
const RELIEF_MM = 4;

/** Stands with two feet on the upper face of a flat sheet; its top edge is the reference. */
export function wedge(lengthMm: number, slope: number): Vec2[] {
  const top = HEIGHT_MM + Math.max(0, -slope) * lengthMm;
  const on = (x: number, off = 0): Vec2 => [x, off - slope * x];
  const feet: Vec2[] =
    lengthMm > 3 * FOOT_MM
      ? [
          on(0),
          on(FOOT_MM),
          on(FOOT_MM, RELIEF_MM),
          on(lengthMm - FOOT_MM, RELIEF_MM),
          on(lengthMm - FOOT_MM),
          on(lengthMm),
        ]
      : [on(0), on(lengthMm)];
  return [...feet, [lengthMm, top], [0, top]];
}

/** Room under a section, as a share of the distance between its edges: most of a section stands above its chord. */
const ROOM_SHARE = 0.2;
const NOTCH_MM = 3;
const HORN_MM = 16;
const BAR_MM = 30;

/** Holds the leading and the trailing edge in two notches from below; its bottom edge is the reference. `alongMm` is level. */
export function cradle(alongMm: number, slope: number): Vec2[] {
  const rise = -slope * alongMm;
  const low = Math.min(0, rise) - ROOM_SHARE * alongMm - 6;
  const bottom = low - BAR_MM;
  const back = alongMm + HORN_MM;
  return [
    [-HORN_MM, bottom],
    [back, bottom],
    [back, rise + 10],
    [alongMm - NOTCH_MM, rise + 10],
    [alongMm - NOTCH_MM, rise + 4],
    [alongMm, rise],
    [alongMm - NOTCH_MM, rise - 4],
    [alongMm - NOTCH_MM, low],
    [NOTCH_MM, low],
    [NOTCH_MM, -4],
    [0, 0],
    [NOTCH_MM, 4],
    [NOTCH_MM, 10],
    [-HORN_MM, 10],
  ];
}
