import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { perimeter } from '@/lib/geometry/polygons';
import { develop } from '@/lib/parts/develop';
import type { MassLine } from './line';
import { massList } from './masses';

// Joints that no sheet marks. The layouts glue with 8 g per metre and 30 g/m2.

const pusher = startFrom('pusher', 'Test');
const trainer = startFrom('trainer', 'Test');

function glue(airframe: Airframe): MassLine[] {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError('the layout resolves');
  return massList(airframe, resolved.value, develop(airframe)).filter(({ group }) => group === 'glue');
}
const of = (lines: readonly MassLine[], key: string): MassLine | undefined => lines.find((line) => line.key === key);
const mass = (lines: readonly MassLine[], key: string): number => of(lines, key)?.massG ?? 0;

describe('formers and doublers', () => {
  it('a former stands in glue all round, at its own place', () => {
    const former = develop(pusher).parts.find(({ key }) => key === 'pod/f1/former/centre');
    const line = of(glue(pusher), 'pod/f1/former/centre/glue');
    expect(line?.massG).toBeCloseTo((perimeter(former?.outline ?? []) * 8) / 1000, 9);
    // The pod begins at -230; the former's front face stands 130 mm behind that, its middle half a sheet further.
    expect(line?.at[0]).toBeCloseTo(-97.5, 6);
    expect(line?.spread.yy).toBeGreaterThan(0);
  });
  it('a doubler lies in glue over its area, at its own middle', () => {
    const doubled: Airframe = {
      ...pusher,
      bodies: pusher.bodies.map((body) => ({
        ...body,
        doublers: [{ id: 'd1', face: 'stbd', fromX: 100, toX: 200, materialId: 'ply-2' }],
      })),
    };
    const line = of(glue(doubled), 'pod/d1/doubler/stbd/glue');
    // 100 mm long between the sheets of top and bottom: 52 less 10 mm high, where the pod no longer grows.
    expect(line?.massG).toBeCloseTo((100 * 42 * 30) / 1e6, 2);
    expect(line?.at[1]).toBeGreaterThan(20);
    expect(line?.at[0]).toBeCloseTo(-230 + 150, 0);
  });
});

describe('feet of surfaces', () => {
  it('a pair of fins stands in glue along both root chords', () => {
    const lines = glue(pusher);
    expect(mass(lines, 'fin/foot/glue/stbd')).toBeCloseTo((105 * 8) / 1000, 9);
    expect(of(lines, 'fin/foot/glue/port')?.at[1]).toBeCloseTo(-(of(lines, 'fin/foot/glue/stbd')?.at[1] ?? 0), 9);
  });
  it('a wing glued across a body lies in two lines; held by bands, in none', () => {
    expect(mass(glue(pusher), 'wing/foot/glue')).toBeCloseTo((2 * 190 * 8) / 1000, 9);
    const banded = { ...pusher, joints: pusher.joints.map((joint) => ({ ...joint, kind: 'bands' as const })) };
    expect(of(glue(banded), 'wing/foot/glue')).toBeUndefined();
    expect(of(glue(trainer), 'wing/foot/glue')).toBeUndefined();
  });
  it('a fin that is bolted on has none, and neither has one that turns as a whole', () => {
    const bolted: Airframe = { ...trainer, joints: [{ id: 'j', between: ['fin', 'body'], kind: 'bolts' }] };
    expect(mass(glue(trainer), 'fin/foot/glue')).toBeGreaterThan(0);
    expect(of(glue(bolted), 'fin/foot/glue')).toBeUndefined();
    const turning: Airframe = {
      ...trainer,
      surfaces: trainer.surfaces.map((surface) =>
        surface.id === 'fin'
          ? {
              ...surface,
              controls: surface.controls.map((control) => ({ ...control, kind: 'allMoving' as const, from: 0, to: 1 })),
            }
          : surface,
      ),
    };
    expect(of(glue(turning), 'fin/foot/glue')).toBeUndefined();
  });
});

describe('booms', () => {
  it('let into a sheet lie in glue along it; on saddles the sheet marks it itself', () => {
    const slotted: Airframe = {
      ...pusher,
      booms: pusher.booms.map((boom) => ({ ...boom, sleeve: 'slot', mount: { to: 'datum', at: [40, 110, 0] } })),
    };
    const line = glue(slotted).find(({ key }) => key === 'wing/p1/sheet/centre/boom-glue');
    // Two booms from 40 mm to the trailing edge at 110 mm out: chord 177.4, its quarter point at 47.5.
    const te = 47.5 + 0.75 * (190 - (40 * 110) / 350);
    expect(line?.massG).toBeCloseTo((2 * (te - 40) * 8) / 1000, 2);
    expect(line?.at[1]).toBeCloseTo(0, 6);
    expect(glue(pusher).some(({ key }) => key.endsWith('/boom-glue'))).toBe(false);
  });
});
