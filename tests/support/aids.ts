import { workshopAids } from '@/lib/aids/workshopAids';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Panel } from '@/lib/airframe/schema/surface';
import type { Vec2, Vec3 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import { fromPart } from '@/lib/parts/shape/frame';
import type { Part } from '@/lib/parts/types';
import { airframe, board, body, boom, control, panel, surface } from './airframe';

// A small aircraft with everything that asks for an aid, and what tests ask of the aids.

/** Wing of 500 x 200 mm a side, 3° up, 2° of incidence; tail 1° down; booms 180 mm apart. */
export function aidAircraft(thicknessMm = 5, wingPanel: Partial<Panel> = {}): Airframe {
  return airframe({
    materials: [board({ thicknessMm })],
    surfaces: [
      surface({
        incidenceDeg: 2,
        panels: [panel({ lengthMm: 500, rootChordMm: 200, tipChordMm: 200, dihedralDeg: 3, ...wingPanel })],
        controls: [control({ chordShare: [0.25, 0.25], throwsDeg: { up: 15, down: 10, lowShare: 0.6 } })],
      }),
      surface({
        id: 'tail',
        role: 'tailplane',
        mount: { to: 'datum', at: [360, 0, 10] },
        incidenceDeg: -1,
        panels: [panel({ lengthMm: 150, rootChordMm: 100, tipChordMm: 100 })],
        controls: [
          control({
            id: 'elevator',
            kind: 'elevator',
            from: 0,
            to: 1,
            chordShare: [0.3, 0.3],
            neutralDeg: -2,
            mix: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
            throwsDeg: { up: 12, down: 12, lowShare: 0.5 },
          }),
        ],
      }),
    ],
    bodies: [body()],
    booms: [boom()],
  });
}

/** Aids of an aircraft with its parts as developed. */
export const aidsOf = (of: Airframe, firstFlightCgXMm: number | null): Part[] =>
  workshopAids({ airframe: of, parts: develop(of).parts, firstFlightCgXMm });

/** The part with a key; throws where there is none. */
export function partOf(parts: readonly Part[], key: string): Part {
  const part = parts.find((one) => one.key === key);
  if (!part) throw new RangeError(`no part ${key} among ${parts.map((one) => one.key).join(', ')}`);
  return part;
}

/** The highest point of a part, the middle of it where that is an edge, in the aircraft. */
export function tipOf({ outline, frame }: Part): Vec3 {
  const high = Math.max(...outline.map(([, y]) => y));
  const top = outline.filter(([, y]) => high - y < 1e-9);
  const x = top.reduce((sum, [at]) => sum + at, 0) / top.length;
  return fromPart(frame, [x, high]);
}

/** Size of the box around a ring, mm. */
export function sizeOf(ring: readonly Vec2[]): Vec2 {
  const along = (axis: 0 | 1): number => {
    const all = ring.map((p) => p[axis]);
    return Math.max(...all) - Math.min(...all);
  };
  return [along(0), along(1)];
}
