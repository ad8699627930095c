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

// Swept tailless, 800 mm. Root 240, tip 140, quarter chord swept 22°: 15.2 dm2, mean aerodynamic chord 194 mm at 182 mm out, its
// quarter chord at x = 60 + 182 tan 22° = 134 mm. With a static margin near 9 % the CG lies about 117 mm aft of the apex. A motor in
// the nose brings it there with the pack over the root. About 255 g, 17 g/dm2; stall near 6 m/s. 2.3 N of thrust on 2.5 N of weight.

const board = MATERIALS.lightBoard5.id;

const surfaces = (): Airframe['surfaces'] => [
  flatSurface({
    id: 'wing',
    name: 'Wing',
    role: 'wing',
    mount: datum(0, 0, 0),
    mirrored: true,
    panels: [flatPanel('p1', board, { length: 400, root: 240, tip: 140, sweepDeg: 22 })],
    spars: [faceSpar(TUBES.carbon42.id, [0.3, 0.3], 0.9)],
    controls: [hinged('elevon', 0.3, 0.94, [0.2, 0.28])],
  }),
  flatSurface({
    id: 'tipfin',
    name: 'Tip fin',
    role: 'tipFin',
    mount: { to: 'wing', at: { station: 1, chordShare: 0.1 } },
    mirrored: true,
    cantDeg: 90,
    panels: [flatPanel('p1', board, { length: 115, root: 126, tip: 85, sweepDeg: 20 })],
  }),
];

const items = (): Airframe['items'] => [
  pack([85, [72, 34, 22]], datum(114, 0, 14), { fromMm: -29, toMm: 35 }, '3 cells 1000 mAh'),
  controller([18, [45, 22, 8]], datum(26, 0, 7), '20 A'),
  receiver(datum(210, 0, 9)),
  servo('servo-stbd', 'Elevon servo, starboard', datum(165, 150, 4)),
  servo('servo-port', 'Elevon servo, port', datum(165, -150, 4)),
  hardware('mount', 'Motor mount', [8, [14, 30, 30]], datum(-4, 0, 0)),
  hardware('links', 'Horns and rods', [8, [80, 200, 6]], datum(215, 0, 4)),
];

/** Swept tailless: one wing with elevons, fins at its tips, motor in the nose. */
export function tailless(name: string): Airframe {
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
        motor: { massG: 28, diameterMm: 23, lengthMm: 26, kvRpmPerV: 1200, maxW: 65 },
        propeller: { diameterMm: 152, pitchMm: 102, blades: 2, massG: 5 },
        controllerItemId: 'esc',
        packItemId: 'pack',
        statedThrustN: 2.3,
      },
    ],
    items: items(),
    radio: { ...blank(name).radio, roles: ['elevon', 'throttle'] },
    flight: atSeaLevel(13, STATIC_MARGIN_PCT.tailless.value, 'hand'),
  };
}
