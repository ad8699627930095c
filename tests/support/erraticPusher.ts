import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Item } from '@/lib/airframe/schema/equipment';
import type { Control, Surface } from '@/lib/airframe/schema/surface';
import { massesOf } from '@/lib/figures/masses';
import { airframe, boom, control, drive, panel, surface, tube } from './airframe';

// An aircraft that is hard to fly, and what may be changed about it. A swept wing of bare 5 mm board, 900 x 190 mm, elevons over the outer
// third; a heavy motor on a stick 110 mm behind the root's trailing edge, the pack on the same stick to balance it, nothing behind but
// small fins at the tips. Chord and chord share are the same from root to tip, so elevons moved inboard keep their span and area.

const HALF_SPAN_MM = 450;
const CHORD_MM = 190;
const MOTOR_G = 110;
const PROPELLER_G = 10;
const PACK_G = 150;
export const MOTOR_FORWARD_MM = 100;

type Place = [number, number, number];

const item = (id: string, kind: Item['kind'], massG: number, sizeMm: Item['sizeMm'], at: Place): Item => ({
  id,
  kind,
  massG,
  sizeMm,
  mount: { to: 'datum', at },
});

const elevon = (): Control =>
  control({
    id: 'elevon',
    kind: 'elevon',
    from: 0.66,
    to: 0.99,
    chordShare: [0.25, 0.25],
    neutralDeg: -2.5,
    throwsDeg: { up: 14, down: 14, lowShare: 0.6 },
    mix: { pitch: 1, roll: 1, yaw: 0, flap: 0 },
  });

const wing = (): Surface =>
  surface({
    panels: [panel({ lengthMm: HALF_SPAN_MM, rootChordMm: CHORD_MM, tipChordMm: CHORD_MM, sweepDeg: 25 })],
    spars: [
      {
        id: 'spar',
        tubeId: 'tube',
        chordShare: [0.3, 0.3],
        from: 0,
        to: 0.9,
        let: 'face',
        face: 'lower',
      },
    ],
    controls: [elevon()],
  });

const tipFin = (): Surface =>
  surface({
    id: 'tipfin',
    role: 'tipFin',
    cantDeg: 90,
    mount: { to: 'wing', at: { station: 1, chordShare: 0.3 } },
    panels: [panel({ lengthMm: 70, rootChordMm: 120, tipChordMm: 80, sweepDeg: 20 })],
  });

/** The aircraft as it is, hard to fly. */
export const erraticPusher = (): Airframe =>
  airframe({
    name: 'Erratic pusher',
    tubes: [tube(), tube({ id: 'stick', outerMm: [8, 8], innerMm: [6, 6], massPerMetreG: 35 })],
    surfaces: [wing(), tipFin()],
    booms: [
      boom({ id: 'stick', tubeId: 'stick', mirrored: false, lengthMm: 390, mount: { to: 'datum', at: [-100, 0, 8] } }),
    ],
    drives: [
      drive({
        mount: { to: 'datum', at: [300, 0, 50] },
        facing: 'pusher',
        motor: { massG: MOTOR_G, diameterMm: 28, lengthMm: 34, kvRpmPerV: 1400 },
        propeller: { diameterMm: 178, pitchMm: 152, blades: 2, massG: PROPELLER_G },
        statedThrustN: 8,
      }),
    ],
    items: [
      item('pack', 'pack', PACK_G, [80, 35, 27], [-15, 0, -10]),
      item('esc', 'controller', 24, [50, 25, 9], [150, 0, -4]),
      item('rx', 'receiver', 8, [40, 22, 12], [100, 0, -6]),
      item('servo-stbd', 'servo', 12, [23, 12, 24], [185, 290, 4]),
      item('servo-port', 'servo', 12, [23, 12, 24], [185, -290, 4]),
    ],
    flight: { ...airframe().flight, cruiseMs: 21, staticMarginPct: [5, 10] },
  });

/** A change that a builder may make, in any order with the others. */
export type Change = (from: Airframe) => Airframe;

const movedX = <T extends Airframe['items'][number] | Airframe['drives'][number]>(element: T, byMm: number): T => {
  const { at } = element.mount;
  if (!Array.isArray(at)) throw new RangeError(`${element.id} stands on a surface`);
  return { ...element, mount: { ...element.mount, at: [at[0] + byMm, at[1], at[2]] } };
};

/** (a) The motor 100 mm forward; what that does to the CG is left. */
export const motorForward: Change = (from) => ({
  ...from,
  drives: from.drives.map((each) => movedX(each, -MOTOR_FORWARD_MM)),
});

/** (a') The same with the CG held: the pack goes aft by as many gram millimetres. */
export const motorForwardPackAft: Change = (from) => ({
  ...motorForward(from),
  items: from.items.map((each) =>
    each.id === 'pack' ? movedX(each, (MOTOR_FORWARD_MM * (MOTOR_G + PROPELLER_G)) / PACK_G) : each,
  ),
});

const BOOM_Y_MM = 115;

/** Two booms past the propeller, for whatever goes on them first. */
const onBooms = (from: Airframe, added: Surface): Airframe => ({
  ...from,
  surfaces: [...from.surfaces, added],
  booms: from.booms.some(({ id }) => id === 'boom')
    ? from.booms
    : [...from.booms, boom({ lengthMm: 330, mount: { to: 'datum', at: [160, BOOM_Y_MM, -3] } })],
});

export const FIN_HEIGHT_MM = 90;

/** A fin at the end of each boom; what that does to the CG is left. */
export const bareFins: Change = (from) =>
  onBooms(
    from,
    surface({
      id: 'fin',
      role: 'fin',
      cantDeg: 90,
      mount: { to: 'boom', end: 'aft', at: [-85, 0, 9] },
      panels: [panel({ lengthMm: FIN_HEIGHT_MM, rootChordMm: 85, tipChordMm: 60, sweepDeg: 10 })],
    }),
  );

/** Span, chord and root leading edge of the tailplane. */
export const TAIL = { spanMm: 300, chordMm: 85, leXMm: 405 } as const;

/** A tailplane across the booms, without an elevator: the elevons stay what they are. What that does to the CG is left. */
const bareTail: Change = (from) =>
  onBooms(
    from,
    surface({
      id: 'tail',
      role: 'tailplane',
      mount: { to: 'boom', end: 'aft', at: [-TAIL.chordMm, -BOOM_Y_MM, 6] },
      panels: [panel({ lengthMm: TAIL.spanMm / 2, rootChordMm: TAIL.chordMm, tipChordMm: TAIL.chordMm })],
    }),
  );

/** Mass and CG of a document. */
function weighed(document: Airframe): { massG: number; cgX: number } {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  const { balance } = massesOf(document, resolved.value);
  if (!balance.ok) throw new RangeError('has no balance');
  return { massG: balance.value.massG, cgX: balance.value.cg[0] };
}

/** The pack goes forward by what a change adds behind the CG of the aircraft as it was; so changes still come to the same in any order. */
function balanced(change: Change): Change {
  const home = weighed(erraticPusher()).cgX;
  const moment = (document: Airframe) => {
    const { massG, cgX } = weighed(document);
    return massG * (cgX - home);
  };
  return (from) => {
    const to = change(from);
    const shift = (moment(from) - moment(to)) / PACK_G;
    return { ...to, items: to.items.map((each) => (each.id === 'pack' ? movedX(each, shift) : each)) };
  };
}

/** (b) A fin at the end of each of two booms, the pack forward to balance them. */
export const finsOnBooms = balanced(bareFins);

/** (c) A tailplane across the booms, the pack forward to balance it. */
export const tailOnBooms = balanced(bareTail);

/** (d) The elevons moved inboard: same span, same chord, same area. */
export const elevonsInboard: Change = (from) => ({
  ...from,
  surfaces: from.surfaces.map((each) =>
    each.id === 'wing' ? { ...each, controls: each.controls.map((c) => ({ ...c, from: 0.33, to: 0.66 })) } : each,
  ),
});
