import { ANGLES, MATERIALS, STATIC_MARGIN_PCT, TUBES } from '../defaults';
import type { Airframe } from '../schema/airframe';
import type { Mount } from '../schema/common';
import type { Body } from '../schema/fuselage';
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

// Twin-boom pusher, 700 mm. Wing root 190, tip 150: 11.9 dm2, mean aerodynamic chord 171 mm. Booms 220 mm apart, so a 152 mm
// propeller clears them by 31 mm. Tailplane 250 x 105 between and past the booms, 415 mm from quarter chord to quarter chord:
// tail volume 0.263 x 415 / (1.19 x 171) = 0.54. Two fins of 0.86 dm2 on about 415 mm: 0.171 x 415 / (1.19 x 700) = 0.085, above the
// trainer's range on purpose: the pod reaches far ahead of the CG and the fins are low. About 290 g, 24 g/dm2; stall near 7.2 m/s.
// The elevator ends inside the booms, which the fins stand on, and its servo sits beside the starboard boom so that no rod passes the
// propeller; the receiver hangs under the port wing against it. 2.8 N of thrust on 2.84 N of weight.

const board = MATERIALS.lightBoard5.id;
const onBoom = (x: number, y: number, z: number): Mount => ({ to: 'boom', end: 'aft', at: [x, y, z] });

const pod = (): Body => ({
  id: 'pod',
  name: 'Pod',
  kind: 'box',
  mount: datum(-230, 0, -4),
  materialId: board,
  stations: [
    { id: 's1', xMm: 0, widthMm: 44, topMm: -6, bottomMm: -40, cornerMm: 0 },
    { id: 's2', xMm: 70, widthMm: 56, topMm: 0, bottomMm: -52, cornerMm: 0 },
    { id: 's3', xMm: 325, widthMm: 56, topMm: 0, bottomMm: -52, cornerMm: 0 },
    { id: 's4', xMm: 405, widthMm: 44, topMm: 0, bottomMm: -42, cornerMm: 0 },
  ],
  doublers: [],
  formers: [
    { id: 'f1', xMm: 130, role: 'former', materialId: board, tiltDeg: [0, 0] },
    { id: 'firewall', xMm: 402, role: 'firewall', materialId: MATERIALS.ply2.id, tiltDeg: [0, 0] },
  ],
  openings: [{ id: 'hatch', face: 'bottom', fromX: 28, toX: 116, widthMm: 32, purpose: 'hatch' }],
});

const surfaces = (): Airframe['surfaces'] => [
  flatSurface({
    id: 'wing',
    name: 'Wing',
    role: 'wing',
    mount: datum(0, 0, 0),
    mirrored: true,
    panels: [flatPanel('p1', board, { length: 350, root: 190, tip: 150, sweepDeg: 0 })],
    spars: [faceSpar(TUBES.carbon42.id, [0.3, 0.3], 0.95)],
    controls: [hinged('aileron', 0.5, 0.94, [0.23, 0.26])],
  }),
  flatSurface({
    id: 'tail',
    name: 'Tailplane',
    role: 'tailplane',
    mount: onBoom(-105, -110, 6),
    mirrored: true,
    panels: [flatPanel('p1', board, { length: 125, root: 105, tip: 105, sweepDeg: 0 })],
    controls: [hinged('elevator', 0, 0.82, [0.35, 0.35])],
  }),
  flatSurface({
    id: 'fin',
    name: 'Fin',
    role: 'fin',
    mount: onBoom(-105, 0, 9),
    mirrored: true,
    cantDeg: 90,
    panels: [flatPanel('p1', board, { length: 95, root: 105, tip: 75, sweepDeg: 10 })],
  }),
];

const items = (): Airframe['items'] => [
  pack([72, [70, 32, 20]], datum(-165, 0, -30), { fromMm: -20, toMm: 20 }, '3 cells 850 mAh'),
  controller([12, [40, 20, 7]], datum(-60, 0, -25), '15 A'),
  receiver(datum(25, -80, -9)),
  servo('servo-ail-stbd', 'Aileron servo, starboard', datum(75, 200, 0), 7),
  servo('servo-ail-port', 'Aileron servo, port', datum(75, -200, 0), 7),
  servo('servo-ele', 'Elevator servo', datum(60, 93, -4), 7),
  hardware('links', 'Horns and rods', [8, [300, 10, 6]], datum(200, 0, -5)),
];

/** Twin-boom pusher: pod, wing with ailerons, two carbon booms, tailplane across them and a fin on each. */
export function pusher(name: string): Airframe {
  return {
    ...blank(name),
    materials: structuredClone([MATERIALS.lightBoard5, MATERIALS.ply2]),
    tubes: structuredClone([TUBES.carbon53, TUBES.carbon42]),
    surfaces: surfaces(),
    bodies: [pod()],
    booms: [
      {
        id: 'boom',
        name: 'Boom',
        mount: datum(40, 110, -5),
        tubeId: TUBES.carbon53.id,
        lengthMm: 500,
        pitchDeg: 0,
        yawDeg: 0,
        mirrored: true,
        sleeve: 'saddle',
      },
    ],
    drives: [
      {
        id: 'motor',
        name: 'Motor',
        kind: 'propeller',
        mount: datum(205, 0, -24),
        mirrored: false,
        facing: 'pusher',
        turns: 'cw',
        thrustDeg: [...ANGLES.pusherThrust.value],
        motor: { massG: 28, diameterMm: 23, lengthMm: 26, kvRpmPerV: 1300, maxW: 70 },
        propeller: { diameterMm: 152, pitchMm: 102, blades: 2, massG: 5 },
        controllerItemId: 'esc',
        packItemId: 'pack',
        statedThrustN: 2.8,
      },
    ],
    items: items(),
    joints: [
      { id: 'wing-seat', between: ['wing', 'pod'], kind: 'glued' },
      { id: 'boom-seat', between: ['boom', 'wing'], kind: 'glued' },
    ],
    radio: { ...blank(name).radio, roles: ['aileron', 'elevator', 'throttle'] },
    flight: atSeaLevel(13, STATIC_MARGIN_PCT.sport.value, 'hand'),
  };
}
