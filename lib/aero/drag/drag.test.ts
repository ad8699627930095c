import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { airframe, body, boom, control, panel, surface } from '@/tests/support/airframe';
import { drive } from '@/tests/support/drive';
import { airAt } from '../atmosphere';
import { bodyDragArea } from './bodies';
import { type DragItem, dragAreaOf, dragBuildUp } from './buildUp';
import { gearDragArea, stoppedDragArea } from './fittings';
import { laminarFriction, plateFriction, turbulentFriction } from './friction';
import { dragSection, edgeDrag, frictionDrag, liftedDrag } from './section';

const air = airAt(0);
const reynolds = fc.double({ min: 5e3, max: 5e6, noNaN: true });

describe('friction', () => {
  it('lies between laminar and turbulent, the more laminar the later it turns', () => {
    fc.assert(
      fc.property(reynolds, fc.double({ min: 0, max: 0.5, noNaN: true }), (re, share) => {
        const at = plateFriction(re, share);
        const later = plateFriction(re, Math.min(1, share + 0.2));
        expect(at).toBeLessThanOrEqual(turbulentFriction(re) + 1e-12);
        expect(at).toBeGreaterThanOrEqual(laminarFriction(re) - 1e-12);
        expect(later).toBeLessThanOrEqual(at + 1e-9);
      }),
    );
  });

  it('is Blasius when nothing trips it, and refuses no air', () => {
    expect(plateFriction(9e4, 1)).toBeCloseTo(1.328 / 300, 10);
    expect(() => laminarFriction(0)).toThrow(RangeError);
  });
});

describe('a section', () => {
  const flat = dragSection({ kind: 'flat' }, 150, 5, 0);

  it('of blunt sheet costs more than its friction, less when swept', () => {
    const friction = frictionDrag(flat, 1e5);
    expect(edgeDrag(flat, friction.value, 0).value).toBeGreaterThan(0);
    expect(edgeDrag(flat, friction.value, 0.7).value).toBeLessThan(edgeDrag(flat, friction.value, 0).value);
  });

  it('has a blunter edge the shorter the chord', () => {
    expect(dragSection({ kind: 'flat' }, 75, 5, 0).frontEdge).toBeCloseTo(2 * flat.frontEdge, 12);
  });

  it('folded has no blunt front and gains by staying laminar', () => {
    const folded = { kind: 'folded', thicknessShare: 0.08, maxAt: 0.3, lowerTo: 0.6, webAt: 0.3 } as const;
    const plain = dragSection(folded, 200, 5, 0);
    const tripped = dragSection({ ...folded, turbulatorMm: 0.3 }, 200, 5, 0);
    expect(plain.frontEdge).toBe(0);
    expect(frictionDrag(plain, 3e5).value).toBeLessThan(frictionDrag(tripped, 3e5).value);
  });

  it('drags more the nearer it is to its stall, a curved nose less, and nothing past it', () => {
    const [slow, fast] = [liftedDrag('flat', 0.9), liftedDrag('flat', 0.5)];
    expect(slow).toBeGreaterThan(5 * fast);
    expect(liftedDrag('flat', -0.9)).toBe(slow);
    expect(liftedDrag('folded', 0.9)).toBeLessThan(slow);
    expect(() => liftedDrag('flat', 1.2)).toThrow(RangeError);
  });
});

describe('bodies and fittings', () => {
  it('a longer tail behind the same box has less base and more skin', () => {
    const blunt = body().stations.slice(0, 3);
    const tapered = body().stations;
    const bluntArea = bodyDragArea({ stations: blunt }, 12, air);
    const taperedArea = bodyDragArea({ stations: tapered }, 12, air);
    // Two boxes with one nose: the short one is stubbier and ends in its full frame.
    expect(bluntArea.value).toBeGreaterThan(0.6 * taperedArea.value);
    expect(bluntArea.low).toBeLessThan(bluntArea.value);
    expect(bluntArea.high).toBeGreaterThan(bluntArea.value);
  });

  it('rounded corners cost less than sharp ones', () => {
    const rounded = body().stations.map((s) => ({ ...s, cornerMm: 8 }));
    expect(bodyDragArea({ stations: rounded }, 12, air).value).toBeLessThan(bodyDragArea(body(), 12, air).value);
  });

  it('two wheels cost twice one, and what has no size costs nothing', () => {
    const wheel = { id: 'w', kind: 'wheel', mount: { to: 'datum', at: [0, 0, 0] }, wheelMm: 50, massG: 10 } as const;
    const gear = {
      ...wheel,
      mount: { to: 'datum', at: [0, 0, 0] satisfies [number, number, number] },
      mirrored: false,
    };
    const one = gearDragArea(gear, { tubes: [] }).value;
    // 0.3 of 50 mm times 15 mm.
    expect(one).toBeCloseTo(225, 9);
    expect(gearDragArea({ ...gear, mirrored: true }, { tubes: [] }).value).toBeCloseTo(450, 9);
    expect(gearDragArea({ ...gear, wheelMm: undefined }, { tubes: [] }).value).toBe(0);
  });

  it('a stopped propeller drags with its blades and the square of its size', () => {
    const small = stoppedDragArea(drive({ diameterMm: 150 })).value;
    expect(stoppedDragArea(drive({ diameterMm: 300 })).value).toBeCloseTo(4 * small, 9);
    expect(stoppedDragArea(drive({ diameterMm: 150, blades: 3 })).value).toBeCloseTo(1.5 * small, 9);
  });
});

function buildUp(document: Airframe, speedMs = 12): DragItem[] {
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('does not resolve');
  return dragBuildUp(document, resolved.value, speedMs, air);
}
const total = (document: Airframe, speedMs?: number) => dragAreaOf(buildUp(document, speedMs)).value;

describe('the build-up', () => {
  const plain = airframe();

  it.each([
    { what: 'a body', document: airframe({ bodies: [body()] }) },
    { what: 'booms', document: airframe({ booms: [boom()] }) },
    { what: 'a motor', document: airframe({ drives: [drive()] }) },
    { what: 'a hinge', document: airframe({ surfaces: [surface({ controls: [control()] })] }) },
  ])('grows by $what', ({ document }) => expect(total(document)).toBeGreaterThan(total(plain)));

  it('is the sum of its items, and says whose each is', () => {
    const items = buildUp(airframe({ bodies: [body()], surfaces: [surface({ controls: [control()] })] }));
    const sum = items.reduce((all, { areaMm2 }) => all + areaMm2.value, 0);
    expect(dragAreaOf(items).value).toBeCloseTo(sum, 9);
    expect(items.map(({ elementId, kind }) => `${elementId} ${kind}`)).toEqual([
      'wing friction',
      'wing edges',
      'wing gaps',
      'body body',
      'null small',
    ]);
  });

  it('is the same for a panel cut in two of equal chord', () => {
    const whole = airframe({ surfaces: [surface({ panels: [panel({ lengthMm: 400 })] })] });
    const cut = airframe({
      surfaces: [surface({ panels: [panel({ lengthMm: 150 }), panel({ id: 'p2', lengthMm: 250 })] })],
    });
    expect(total(cut)).toBeCloseTo(total(whole), 6);
  });

  it('needs a little less area the faster it goes', () => {
    expect(total(plain, 24)).toBeLessThan(total(plain, 12));
    expect(total(plain, 24)).toBeGreaterThan(0.8 * total(plain, 12));
  });
});
