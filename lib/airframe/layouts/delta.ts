import { MATERIALS, STATIC_MARGIN_PCT, TUBES } from '../defaults';
import type { Airframe } from '../schema/airframe';
import {
  atSeaLevel,
  blank,
  controller,
  datum,
  faceSpar,
  flatPanel,
  flatSurface,
  hardware,
  hinged,
  pack,
  receiver,
  servo,
} from './kit';

// Delta, 600 mm. Root 400, tip 120, straight trailing edge (quarter chord swept 35°): 15.6 dm2, aspect ratio 2.3, mean aerodynamic
// chord 285 mm with its leading edge at x = 115 mm, so its quarter chord lies at x = 186 mm; a static margin near 9 % puts the CG about
// 162 mm aft of the apex. About 260 g, 17 g/dm2; it flies slowly at a high angle, stall near 6 m/s. 2.6 N of thrust on 2.55 N of weight.

const board = MATERIALS.lightBoard5.id;

const surfaces = (): Airframe['surfaces'] => [
  flatSurface({
    id: 'wing',
    name: 'Wing',
    role: 'wing',
    mount: datum(0, 0, 0),
    mirrored: true,
    panels: [flatPanel('p1', board, { length: 300, root: 400, tip: 120, sweepDeg: 35 })],
    spars: [faceSpar(TUBES.carbon42.id, [0.55, 0.3], 0.85)],
    controls: [hinged('elevon', 0.25, 0.95, [0.16, 0.32])],
  }),
  flatSurface({
    id: 'fin',
    name: 'Fin',
    role: 'fin',
    mount: datum(230, 0, 2.5),
    mirrored: false,
    cantDeg: 90,
    panels: [flatPanel('p1', board, { length: 132, root: 166, tip: 92, sweepDeg: 25 })],
  }),
];

const items = (): Airframe['items'] => [
  pack([90, [72, 34, 24]], datum(180, 0, -14), { fromMm: -40, toMm: 40 }, '3 cells 1100 mAh'),
  controller([20, [45, 22, 8]], datum(60, 0, -7), '25 A'),
  receiver(datum(80, 0, 9)),
  servo('servo-stbd', 'Elevon servo, starboard', datum(270, 130, -4)),
  servo('servo-port', 'Elevon servo, port', datum(270, -130, -4)),
  hardware('mount', 'Motor mount', [8, [14, 30, 30]], datum(-4, 0, 0)),
  hardware('links', 'Horns and rods', [8, [80, 200, 6]], datum(320, 0, -4)),
];

/** Delta: a pointed wing with elevons, a fin on the centre line, motor in the nose. */
export function delta(name: string): Airframe {
  return {
    ...blank(name),
    materials: structuredClone([MATERIALS.lightBoard5]),
    tubes: structuredClone([TUBES.carbon42]),
    surfaces: surfaces(),
    drives: [
      {
        id: 'motor',
        name: 'Motor',
        kind: 'propeller',
        mount: datum(-38, 0, 0),
        mirrored: false,
        facing: 'tractor',
        turns: 'cw',
        thrustDeg: [0, 0],
        motor: { massG: 35, diameterMm: 28, lengthMm: 26, kvRpmPerV: 900, maxW: 75 },
        propeller: { diameterMm: 178, pitchMm: 114, blades: 2, massG: 6 },
        controllerItemId: 'esc',
        packItemId: 'pack',
        statedThrustN: 2.6,
      },
    ],
    items: items(),
    radio: { ...blank(name).radio, roles: ['elevon', 'throttle'] },
    flight: atSeaLevel(14, STATIC_MARGIN_PCT.tailless.value, 'hand'),
  };
}
