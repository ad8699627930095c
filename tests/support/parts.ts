import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';

// Hand-made flat parts for tests of the layout and the plan. Dimensions are invented.

/** A part around an outline; everything that a test does not care about is filled in. */
export const makePart = (key: string, outline: readonly Vec2[], more: Partial<Part> = {}): Part => ({
  key,
  name: key,
  elementId: key.split('/')[0] ?? key,
  side: 'centre',
  materialId: 'foam-5',
  thicknessMm: 5,
  face: 'upper',
  outline,
  holes: [],
  operations: [],
  labels: [],
  grainDeg: null,
  frame: { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] },
  ...more,
});

export const rectangle = (w: number, h: number): Vec2[] => [
  [0, 0],
  [w, 0],
  [w, h],
  [0, h],
];

/** A swept half wing seen from above: root on the y = 0 line, chord along x. */
export const sweptHalf = (root: number, tip: number, half: number, sweepMm: number): Vec2[] => [
  [0, 0],
  [root, 0],
  [sweepMm + tip, half],
  [sweepMm, half],
];

const mirrored = (outline: readonly Vec2[]): Vec2[] => outline.map(([x, y]): Vec2 => [-x, y]).reverse();

const operation = (id: string, kind: Operation['kind'], path: readonly Vec2[], more: Partial<Operation> = {}) => ({
  id,
  kind,
  path,
  closed: false,
  face: 'upper' as const,
  ...more,
});

/** A wing in two halves with hinged ailerons and a tube slot, a tail with a rounded tip, a fin, a former with a hole. */
export function sampleParts(): Part[] {
  const half = sweptHalf(180, 110, 310, 60);
  const wing = (side: 'stbd' | 'port'): Part => {
    const flip = (path: readonly Vec2[]): Vec2[] => (side === 'stbd' ? [...path] : path.map(([x, y]): Vec2 => [-x, y]));
    return makePart(`wing/p1/sheet/${side}`, side === 'stbd' ? half : mirrored(half), {
      name: `Wing panel, ${side}`,
      side,
      grainDeg: 90,
      holes: [],
      operations: [
        operation(
          'hinge',
          'cutToPaper',
          flip([
            [149.6, 105],
            [137.3, 290],
          ]),
        ),
        operation(
          'hinge-bevel',
          'bevel',
          flip([
            [146.6, 105],
            [134.3, 290],
          ]),
          { angleDeg: 35 },
        ),
        operation(
          'inner-end',
          'cut',
          flip([
            [149.6, 105],
            [176.6, 105],
          ]),
        ),
        operation(
          'spar',
          'reference',
          flip([
            [54, 0],
            [90, 300],
          ]),
        ),
      ],
      labels: [{ at: side === 'stbd' ? [90, 60] : [-90, 60], text: `WING ${side}`, heightMm: 5, angleDeg: 0 }],
    });
  };
  const arc: Vec2[] = Array.from({ length: 25 }, (_, i): Vec2 => {
    const angle = (i / 24) * Math.PI - Math.PI / 2;
    return [130 + 40 * Math.cos(angle), 40 + 40 * Math.sin(angle)];
  });
  const round: Vec2[] = Array.from({ length: 32 }, (_, i): Vec2 => {
    const angle = (-i / 32) * 2 * Math.PI;
    return [24 + 9 * Math.cos(angle), 20 + 9 * Math.sin(angle)];
  });
  return [
    wing('stbd'),
    wing('port'),
    makePart('tail/sheet', [[0, 0], ...arc, [0, 80]], {
      name: 'Tailplane',
      operations: [
        operation('hinge', 'cutToPaper', [
          [0, 25],
          [163, 25],
        ]),
        operation(
          'fold',
          'crease',
          [
            [60, 25],
            [60, 80],
          ],
          { angleDeg: 12 },
        ),
        operation('glue', 'glue', [
          [5, 72],
          [120, 72],
        ]),
      ],
    }),
    makePart(
      'fin/sheet',
      [
        [0, 0],
        [95, 0],
        [78, 100],
        [38, 100],
      ],
      { name: 'Fin', grainDeg: 0 },
    ),
    makePart('body/f1', rectangle(48, 40), { name: 'Former', holes: [round], materialId: 'ply-3', thicknessMm: 3 }),
  ];
}
