import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Vec2 } from '@/lib/numerics/vec';
import type { Operation, Part } from '@/lib/parts/types';
import { partMasses } from './partMasses';

// A plate of 100 x 200 mm of 5 mm board, 320 g/m2 with 150 g/m2 of paper: the core is 170 g/m2 or 0.000034 g/mm3, each face
// 0.000075 g/mm2. Whole it weighs 6.4 g with its middle at (50, 100, 0).

const base = startFrom('pusher', 'Test');
const operation = (kind: Operation['kind'], path: readonly Vec2[], rest: Partial<Operation> = {}): Operation => ({
  id: kind,
  kind,
  path,
  closed: false,
  face: 'upper',
  ...rest,
});
const plate = (operations: readonly Operation[], rest: Partial<Part> = {}): Part => ({
  key: 'wing/plate/centre',
  name: 'Plate',
  elementId: 'wing',
  side: 'centre',
  materialId: 'board-5',
  thicknessMm: 5,
  face: 'upper',
  outline: [
    [0, 0],
    [100, 0],
    [100, 200],
    [0, 200],
  ],
  holes: [],
  operations,
  labels: [],
  grainDeg: null,
  frame: { origin: [0, 0, 0], ex: [1, 0, 0], ey: [0, 1, 0] },
  ...rest,
});
const weigh = (part: Part, airframe: Airframe = base) => {
  const [masses] = partMasses(airframe, [part]);
  if (!masses) throw new RangeError('a part weighs something');
  return masses.foam;
};
const EDGE: readonly Vec2[] = [
  [0, 0],
  [0, 200],
];
const MIDDLE: readonly Vec2[] = [
  [50, 0],
  [50, 200],
];

describe('foam that work on a sheet takes away', () => {
  it('a bevel of 45 degrees takes half a square and the paper over it', () => {
    const line = weigh(plate([operation('bevel', EDGE, { angleDeg: 45, depthMm: 5 })]));
    const core = 0.5 * 5 * 5 * 200 * 0.000034;
    const paper = 5 * 200 * 0.000075;
    expect(6.4 - line.massG).toBeCloseTo(core + paper, 9);
    // It goes from the edge, a third of its width inside, and from the upper side, a third of its depth down.
    const taken = core + paper;
    expect(line.at[0]).toBeCloseTo((6.4 * 50 - taken * (5 / 3)) / (6.4 - taken), 9);
    expect(line.at[2]).toBeCloseTo((-taken * (2.5 - 5 / 3)) / (6.4 - taken), 9);
  });
  it('from the other face it goes from the other side', () => {
    const bevel = (face: Operation['face']) => weigh(plate([operation('bevel', EDGE, { angleDeg: 45, face })]));
    expect(bevel('lower').at[2]).toBeCloseTo(-bevel('upper').at[2], 12);
    expect(bevel('lower').massG).toBeCloseTo(bevel('upper').massG, 12);
  });
  it('two half bevels take half of what one through the sheet takes of the core', () => {
    const plain = { ...base, materials: base.materials.map((material) => ({ ...material, facesGm2: 0 })) };
    const taken = (operations: Operation[]) => 6.4 - weigh(plate(operations), plain).massG;
    const half = (face: Operation['face']) =>
      operation('bevel', EDGE, { id: `bevel-${face}`, angleDeg: 30, depthMm: 2.5, face });
    expect(taken([half('upper'), half('lower')])).toBeCloseTo(
      taken([operation('bevel', EDGE, { angleDeg: 30, depthMm: 5 })]) / 2,
      12,
    );
  });
  it('the groove of a fold takes both its halves', () => {
    const fold = operation('cutToPaper', MIDDLE, { id: 'fold', angleDeg: 60 });
    const groove = operation('bevel', MIDDLE, { angleDeg: 30, depthMm: 5 });
    const halves = 2 * 0.5 * 5 * 5 * Math.tan(Math.PI / 6) * 200 * 0.000034;
    const paper = 2 * 5 * Math.tan(Math.PI / 6) * 200 * 0.000075;
    expect(6.4 - weigh(plate([fold, groove])).massG).toBeCloseTo(halves + paper, 9);
    expect(6.4 - weigh(plate([groove])).massG).toBeCloseTo((halves + paper) / 2, 9);
  });
  it('a channel takes its width by its depth, and the paper over it', () => {
    const line = weigh(plate([operation('foamOut', MIDDLE, { widthMm: 4, depthMm: 4 })]));
    expect(6.4 - line.massG).toBeCloseTo(4 * 4 * 200 * 0.000034 + 4 * 200 * 0.000075, 9);
    expect(line.at[0]).toBeCloseTo(50, 9);
    expect(line.at[2]).toBeLessThan(0);
  });
  it('paper off within an area takes one face', () => {
    const square: readonly Vec2[] = [
      [20, 20],
      [60, 20],
      [60, 60],
      [20, 60],
    ];
    const line = weigh(plate([operation('paperOff', square, { closed: true })]));
    expect(6.4 - line.massG).toBeCloseTo(1600 * 0.000075, 9);
  });
  it('a bevel flatter than the sheet is wide takes no more than there is', () => {
    const narrow = plate([operation('bevel', EDGE, { angleDeg: 80, depthMm: 5 })], {
      outline: [
        [0, 0],
        [10, 0],
        [10, 200],
        [0, 200],
      ],
    });
    // 28.4 mm wide on a sheet of 10: what is left of the core is the wedge under the blade.
    const left = (10 * 10) / (2 * Math.tan((80 * Math.PI) / 180));
    expect(weigh(narrow).massG).toBeCloseTo(200 * left * 0.000034 + 200 * 10 * 0.000075, 9);
  });
  it('cuts that would leave nothing leave the sheet as it was', () => {
    const all = ['a', 'b', 'c'].map((id) => operation('foamOut', MIDDLE, { id, widthMm: 90, depthMm: 5 }));
    expect(weigh(plate(all)).massG).toBeCloseTo(6.4, 9);
  });
  it('marks and creases take nothing', () => {
    const marks = [
      operation('crease', MIDDLE),
      operation('reference', MIDDLE, { widthMm: 9 }),
      operation('cut', MIDDLE),
    ];
    expect(weigh(plate(marks.map((mark, index) => ({ ...mark, id: `m${index}` })))).massG).toBeCloseTo(6.4, 12);
  });
});
