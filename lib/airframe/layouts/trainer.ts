import { ANGLES, MATERIALS, STATIC_MARGIN_PCT, TUBES } from '../defaults';
import type { Airframe } from '../schema/airframe';
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

// Plain trainer, 900 mm. Wing 900 x 190: 17.1 dm2, aspect ratio 4.7. Tailplane 380 x 110 with 410 mm from quarter chord to
// quarter chord: tail volume 0.418 x 410 / (1.71 x 190) = 0.53 (dm2 over dm2, mm over mm; ten times each). Fin 1.56 dm2 on
// about 410 mm: 0.156 x 410 / (1.71 x 900) = 0.042. Both lie inside the trainer's ranges. About 385 g, 23 g/dm2; stall near 7 m/s.
// The body ends at the elevator's hinge and the rudder begins above the elevator, so both move freely. 3.05 N of thrust on 3.8 N of weight.

const board = MATERIALS.lightBoard5.id;

const body = (): Body => ({
  id: 'body',
  name: 'Body',
  kind: 'box',
  mount: datum(-160, 0, -4),
  materialId: board,
  stations: [
    { id: 's1', xMm: 0, widthMm: 52, topMm: -10, bottomMm: -60, cornerMm: 0 },
    { id: 's2', xMm: 70, widthMm: 64, topMm: 0, bottomMm: -78, cornerMm: 0 },
    { id: 's3', xMm: 360, widthMm: 64, topMm: 0, bottomMm: -78, cornerMm: 0 },
    { id: 's4', xMm: 660, widthMm: 28, topMm: -20, bottomMm: -50, cornerMm: 0 },
  ],
  doublers: [],
  formers: [
    { id: 'firewall', xMm: 4, role: 'firewall', materialId: MATERIALS.ply2.id, tiltDeg: [2, 2] },
    { id: 'f1', xMm: 200, role: 'former', materialId: board, tiltDeg: [0, 0] },
    { id: 'f2', xMm: 350, role: 'former', materialId: board, tiltDeg: [0, 0] },
  ],
  openings: [{ id: 'hatch', face: 'bottom', fromX: 75, toX: 155, widthMm: 42, purpose: 'hatch' }],
});

const surfaces = (): Airframe['surfaces'] => [
  flatSurface({
    id: 'wing',
    name: 'Wing',
    role: 'wing',
    mount: datum(0, 0, 0),
    mirrored: true,
    incidenceDeg: 1,
    panels: [
      flatPanel('p1', board, {
        length: 450,
        root: 190,
        tip: 190,
        sweepDeg: 0,
        dihedralDeg: ANGLES.dihedralWithAilerons.value,
      }),
    ],
    spars: [faceSpar(TUBES.carbon53.id, [0.3, 0.3], 0.9)],
    controls: [hinged('aileron', 0.55, 0.95, [0.22, 0.22])],
  }),
  flatSurface({
    id: 'tail',
    name: 'Tailplane',
    role: 'tailplane',
    mount: datum(430, 0, -30),
    mirrored: true,
    panels: [flatPanel('p1', board, { length: 190, root: 110, tip: 110, sweepDeg: 0 })],
    controls: [hinged('elevator', 0, 0.98, [0.35, 0.35])],
  }),
  flatSurface({
    id: 'fin',
    name: 'Fin',
    role: 'fin',
    mount: datum(400, 0, -24),
    mirrored: false,
    cantDeg: 90,
    panels: [flatPanel('p1', board, { length: 130, root: 140, tip: 100, sweepDeg: 12 })],
    controls: [hinged('rudder', 0.08, 0.98, [0.4, 0.4])],
  }),
];

const items = (): Airframe['items'] => [
  pack([85, [72, 34, 22]], datum(-30, 0, -56), { fromMm: -35, toMm: 30 }, '3 cells 1000 mAh'),
  controller([18, [45, 22, 8]], datum(-110, 0, -32), '20 A'),
  receiver(datum(70, 0, -50)),
  servo('servo-ail-stbd', 'Aileron servo, starboard', datum(75, 270, 8)),
  servo('servo-ail-port', 'Aileron servo, port', datum(75, -270, 8)),
  servo('servo-ele', 'Elevator servo', datum(120, 12, -45)),
  servo('servo-rud', 'Rudder servo', datum(120, -12, -45)),
  hardware('links', 'Horns and rods', [12, [350, 10, 10]], datum(250, 0, -35)),
];

/** Plain trainer: high wing, box body, tailplane and fin, motor in the nose. */
export function trainer(name: string): Airframe {
  return {
    ...blank(name),
    materials: structuredClone([MATERIALS.lightBoard5, MATERIALS.ply2]),
    tubes: structuredClone([TUBES.carbon53]),
    surfaces: surfaces(),
    bodies: [body()],
    drives: [
      {
        id: 'motor',
        name: 'Motor',
        kind: 'propeller',
        mount: datum(-192, 0, -39),
        mirrored: false,
        facing: 'tractor',
        turns: 'cw',
        thrustDeg: [...ANGLES.tractorThrust.value],
        motor: { massG: 45, diameterMm: 28, lengthMm: 28, kvRpmPerV: 950, maxW: 90 },
        propeller: { diameterMm: 178, pitchMm: 127, blades: 2, massG: 7 },
        controllerItemId: 'esc',
        packItemId: 'pack',
        statedThrustN: 3.05,
      },
    ],
    items: items(),
    joints: [{ id: 'wing-seat', between: ['wing', 'body'], kind: 'bands' }],
    radio: { ...blank(name).radio, roles: ['aileron', 'elevator', 'rudder', 'throttle'] },
    flight: atSeaLevel(12, STATIC_MARGIN_PCT.trainer.value, 'hand'),
  };
}
