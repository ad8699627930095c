import { describe, expect, it } from 'vitest';
import { setUpSheet } from '@/lib/figures/setUp';
import { contains } from '@/lib/geometry/polygons';
import { radFromDeg, type Vec2 } from '@/lib/numerics/vec';
import { develop } from '@/lib/parts/develop';
import { fromPart, offPart, toPart } from '@/lib/parts/shape/frame';
import { distanceToRing } from '@/lib/parts/shape/ring';
import type { Part } from '@/lib/parts/types';
import { aidAircraft, aidsOf, partOf, sizeOf, tipOf } from '@/tests/support/aids';

// Aids against the aircraft's own sheets as they stand, and against each other.

const CG_X = 62;
const wingSheet = (parts: readonly Part[], side: 'stbd' | 'port'): Part => partOf(parts, `wing/p1/sheet/${side}`);
const textsOf = ({ labels }: Part): string => labels.map(({ text }) => text.replaceAll(' · ', ' ')).join(' | ');

describe('the CG stand', () => {
  const aircraft = aidAircraft();
  const sheets = develop(aircraft).parts;
  const aids = aidsOf(aircraft, CG_X);

  it.each(['stbd', 'port'] as const)('touches the underside of the %s wing on the CG line', (side) => {
    const tip = tipOf(partOf(aids, `aid/cg-stand/upright/${side}`));
    expect(Math.abs(tip[0] - CG_X)).toBeLessThan(0.3);
    const sheet = wingSheet(sheets, side);
    expect(contains(sheet.outline, toPart(sheet.frame, tip))).toBe(true);
    // Half of 5 mm below the middle of the sheet, whichever face the part is drawn on.
    expect(Math.abs(Math.abs(offPart(sheet.frame, tip)) - 2.5)).toBeLessThan(0.3);
    const above = fromPart(sheet.frame, toPart(sheet.frame, tip));
    expect(above[2]).toBeGreaterThan(tip[2]);
  });

  it('passes the body, and lets it hang free of the base', () => {
    const upright = partOf(aids, 'aid/cg-stand/upright/stbd');
    // The body is 64 mm wide and reaches 44 mm below the datum near the CG: its mount is at -10, its deepest bottom at -34.
    expect(upright.frame.origin[1]).toBeGreaterThan(32 + 5 / 2);
    expect(upright.frame.origin[2]).toBeLessThan(-44);
  });

  it('has slots where the uprights stand, for their tabs', () => {
    const [base, upright] = [partOf(aids, 'aid/cg-stand/base/centre'), partOf(aids, 'aid/cg-stand/upright/stbd')];
    const apart = base.holes.map((hole) => hole.reduce((sum, [x]) => sum + x, 0) / hole.length);
    expect(apart[1]).toBeCloseTo(upright.frame.origin[1], 6);
    expect(apart[0]).toBeCloseTo(-upright.frame.origin[1], 6);
    const tab = upright.outline.filter(([, y]) => y < 0).map(([x]) => x);
    // Tab and slot: clearance 0.2 and kerf 0.1.
    expect(sizeOf(base.holes[0] ?? [])[1] - (Math.max(...tab) - Math.min(...tab))).toBeCloseTo(0.3, 6);
  });

  it('has a marker whose notch is under the CG line when its hook is on the leading edge', () => {
    const marker = partOf(aids, 'aid/cg-stand/marker/centre');
    const sheet = wingSheet(sheets, 'stbd');
    const edge = toPart(sheet.frame, fromPart(marker.frame, [0, 0]));
    expect(distanceToRing(edge, sheet.outline)).toBeLessThan(0.3);
    const notch = marker.outline.find(([x, y]) => x > 0 && y < 0 && y > -10) ?? [0, 0];
    expect(Math.abs(fromPart(marker.frame, [notch[0], 0])[0] - CG_X)).toBeLessThan(0.3);
    expect(textsOf(marker)).toContain(`notch ${notch[0].toFixed(1)} mm behind it`);
  });
});

describe.each([
  { thicknessMm: 5, slot: 5.3 },
  { thicknessMm: 6, slot: 6.3 },
])('slots in a sheet of $thicknessMm mm', ({ thicknessMm, slot }) => {
  const aids = aidsOf(aidAircraft(thicknessMm), CG_X);
  const width = (ring: readonly Vec2[]): number => Math.min(...sizeOf(ring));

  it('are as wide as the sheet, the clearance of 0.2 and the kerf of 0.1', () => {
    for (const hole of aids.flatMap(({ holes }) => holes)) expect(width(hole)).toBeCloseTo(slot, 6);
    const prop = partOf(aids, 'aid/dihedral/wing/p1/prop/stbd').outline;
    const low = prop.filter(([, y]) => y === 0).map(([x]) => x);
    expect((low[2] ?? 0) - (low[1] ?? 0)).toBeCloseTo(slot, 6);
    const gauge = partOf(aids, 'aid/throw/wing/aileron/centre').outline;
    const frontX = Math.min(...gauge.map(([x]) => x));
    const mouth = gauge.filter(([x, y]) => x - frontX < 1e-9 && Math.abs(y) < 10).map(([, y]) => y);
    expect(Math.max(...mouth) - Math.min(...mouth)).toBeCloseTo(slot, 6);
  });

  it('go with tabs as long as the sheet is thick', () => {
    const upright = partOf(aids, 'aid/cg-stand/upright/stbd').outline;
    expect(Math.min(...upright.map(([, y]) => y))).toBeCloseTo(-thicknessMm, 9);
    const spacer = aids.find(({ key }) => key.startsWith('aid/bevel/spacer-'))?.outline ?? [];
    expect(sizeOf(spacer)[0]).toBeCloseTo(60 + 2 * thicknessMm, 9);
  });
});

describe('throw gauges', () => {
  const aircraft = aidAircraft();
  const aids = aidsOf(aircraft, CG_X);
  const sheet = setUpSheet(aircraft);
  if (!sheet.ok) throw new RangeError('the set-up sheet can be made');

  it.each(sheet.value.controls)(
    'show every throw of $id in mm at the widest chord',
    ({ id, widestMm, throws, neutral }) => {
      const gauge = partOf(aids, `aid/throw/${id}/centre`);
      const lines = gauge.operations.filter((one) => one.id.startsWith('throw-'));
      const direction = (one: (typeof lines)[number]): Vec2 => {
        const [x, y] = one.path.at(-1) ?? [0, 0];
        return [(x / Math.hypot(x, y)) * widestMm, (y / Math.hypot(x, y)) * widestMm];
      };
      const zero = lines.find(({ note }) => note === 'neutral');
      if (!zero) throw new RangeError('no neutral line');
      const [x0, y0] = direction(zero);
      // Up is positive on the card, as on the sheet's neutral.
      const turn = (neutral.way === 'up' ? 1 : neutral.way === 'down' ? -1 : 0) * neutral.deg;
      expect(Math.atan2(y0, x0)).toBeCloseTo(radFromDeg(turn), 9);
      for (const move of throws.flatMap(({ high, low }) => (low ? [high, low] : [high]))) {
        const off = lines.map((one) => {
          const [x, y] = direction(one);
          return { mm: Math.hypot(x - x0, y - y0), up: Math.atan2(y, x) > Math.atan2(y0, x0), note: one.note };
        });
        const mark = off.find(({ mm, up }) => Math.abs(mm - move.mm) < 0.01 && up === (move.way === 'up'));
        expect(mark?.note).toContain(`mm ${move.way}`);
      }
    },
  );

  it('slip on where fixed sheet stands beside the control, and are laid on where none does', () => {
    expect(textsOf(partOf(aids, 'aid/throw/wing/aileron/centre'))).toContain('slip it over the trailing edge');
    expect(textsOf(partOf(aids, 'aid/throw/tail/elevator/centre'))).toContain('lay it against the end');
  });

  it('hold the fixed trailing edge: the slot ends behind it', () => {
    const { outline } = partOf(aids, 'aid/throw/wing/aileron/centre');
    const frontX = Math.min(...outline.map(([x]) => x));
    const ends = outline.filter(([x, y]) => Math.abs(Math.abs(y) - 2.65) < 1e-6 && x > frontX + 1).map(([x]) => x);
    // A quarter of 200 mm behind the hinge.
    expect(ends).toHaveLength(2);
    for (const x of ends) {
      expect(x).toBeGreaterThan(50);
      expect(x).toBeLessThan(51.5);
    }
  });
});

describe('incidence gauges', () => {
  /** Fall of the feet against the top edge, over their length. */
  const slopeOf = ({ outline }: Part): number => {
    const [first, , , , , last] = outline;
    if (!first || !last) throw new RangeError('a gauge has feet');
    return (first[1] - last[1]) / (last[0] - first[0]);
  };
  const levelTop = ({ outline }: Part): number => {
    const high = Math.max(...outline.map(([, y]) => y));
    return outline.filter(([, y]) => y === high).length;
  };
  const aids = aidsOf(aidAircraft(), CG_X);

  it.each([
    { key: 'aid/incidence/wing/centre', deg: 2, says: '2° leading edge up' },
    { key: 'aid/incidence/tail/centre', deg: -1, says: '1° leading edge down' },
    // 2 up against 1 down.
    { key: 'aid/incidence/wing-decalage/centre', deg: 3, says: '3° leading edge up' },
  ])('$key: its feet run at $deg degrees to its top edge', ({ key, deg, says }) => {
    const gauge = partOf(aids, key);
    // The wing's roll of 3 degrees takes a thousandth of the angle in a side view.
    expect(slopeOf(gauge)).toBeCloseTo(Math.tan(radFromDeg(deg)), 3);
    expect(levelTop(gauge)).toBe(2);
    expect(textsOf(gauge)).toContain(says);
  });

  it('stand on the upper face of the sheet', () => {
    const sheet = wingSheet(develop(aidAircraft()).parts, 'stbd');
    const gauge = partOf(aids, 'aid/incidence/wing/centre');
    const foot = fromPart(gauge.frame, [0, 0]);
    expect(Math.abs(Math.abs(offPart(sheet.frame, foot)) - 2.5)).toBeLessThan(0.05);
    expect(foot[2]).toBeGreaterThan(fromPart(sheet.frame, toPart(sheet.frame, foot))[2]);
  });

  it('hold both edges of a section that is not flat sheet', () => {
    const folded = aidAircraft(5, {
      section: { kind: 'folded', thicknessShare: 0.1, maxAt: 0.3, lowerTo: 1, webAt: 0.3 },
    });
    const { outline } = partOf(aidsOf(folded, CG_X), 'aid/incidence/wing/centre');
    const at = outline.findIndex(([x, y]) => x === 0 && y === 0);
    expect(at).toBeGreaterThan(0);
    const fellow = outline.reduce<Vec2>(
      (best, p) => {
        const miss = (q: Vec2): number => Math.abs(Math.hypot(q[0], q[1]) - 200);
        return miss(p) < miss(best) ? p : best;
      },
      [0, 0],
    );
    expect(Math.hypot(...fellow)).toBeCloseTo(200, 1);
    expect(Math.atan2(-fellow[1], fellow[0])).toBeCloseTo(radFromDeg(2), 3);
  });

  it('check the tip of a twisted wing too', () => {
    const twisted = aidsOf(aidAircraft(5, { washoutDeg: 1.5 }), CG_X);
    expect(textsOf(partOf(twisted, 'aid/incidence/wing-tip/centre'))).toContain('0.5° leading edge up');
  });
});

describe('the dihedral prop', () => {
  it('is as high as 3 degrees lift the wing where it stands', () => {
    const prop = partOf(aidsOf(aidAircraft(), CG_X), 'aid/dihedral/wing/p1/prop/stbd');
    // 500 mm less 4.5 mm from the tip: 495.5 sin 3° = 25.93 mm.
    const tops = prop.outline.filter(([, y]) => y > 20).map(([, y]) => y);
    expect(tops).toHaveLength(2);
    for (const y of tops) expect(Math.abs(y - 25.93)).toBeLessThan(0.3);
    expect(textsOf(prop)).toContain('25.9 mm high');
  });
  it('is built upside down where the wing droops', () => {
    const prop = partOf(aidsOf(aidAircraft(5, { dihedralDeg: -3 }), CG_X), 'aid/dihedral/wing/p1/prop/stbd');
    expect(textsOf(prop)).toContain('upside down');
    expect(Math.abs(Math.max(...prop.outline.map(([, y]) => y)) - 25.93)).toBeLessThan(0.3);
  });
  it('leaves its cross piece room below the panel, and both slots meet half way', () => {
    const aids = aidsOf(aidAircraft(), CG_X);
    const [prop, cross] = [
      partOf(aids, 'aid/dihedral/wing/p1/prop/stbd').outline,
      partOf(aids, 'aid/dihedral/wing/p1/cross/stbd').outline,
    ];
    const deep = Math.max(...prop.filter(([x, y]) => y > 0 && x > 5 && x < 75).map(([, y]) => y));
    const left = Math.min(...cross.filter(([, y]) => y > 0).map(([, y]) => y));
    expect(deep).toBeCloseTo(left, 9);
    expect(Math.max(...cross.map(([, y]) => y))).toBeLessThan(
      Math.min(...prop.filter(([, y]) => y > 20).map(([, y]) => y)),
    );
  });
});

describe('bevel blocks', () => {
  it('lean at every angle at which the parts are bevelled', () => {
    const aircraft = aidAircraft();
    const used = develop(aircraft).parts.flatMap(({ operations }) =>
      operations.flatMap(({ kind, angleDeg }) => (kind === 'bevel' && angleDeg ? [Math.abs(angleDeg)] : [])),
    );
    // The joint of the wing at half of 6 degrees, the hinges at 40.
    expect(used.some((deg) => Math.abs(deg - 3) < 0.01)).toBe(true);
    const cheeks = aidsOf(aircraft, CG_X).filter(({ key }) => /^aid\/bevel\/\d/.test(key));
    const leans = cheeks.map(({ outline }) => {
      const foot = outline.reduce((a, b) => (Math.abs(b[0]) + b[1] < Math.abs(a[0]) + a[1] ? b : a));
      const high = Math.max(...outline.map(([, y]) => y));
      const top = outline.filter(([, y]) => y === high).reduce((a, b) => (Math.abs(b[0]) < Math.abs(a[0]) ? b : a));
      return (Math.atan2(Math.abs(top[0] - foot[0]), top[1] - foot[1]) * 180) / Math.PI;
    });
    for (const deg of used) expect(Math.min(...leans.map((lean) => Math.abs(lean - deg)))).toBeLessThan(0.31);
    for (const lean of leans) expect(Math.min(...used.map((deg) => Math.abs(lean - deg)))).toBeLessThan(0.01);
  });
});

describe('the boom jig', () => {
  it('holds booms 180 mm apart by their undersides', () => {
    const aids = aidsOf(aidAircraft(), CG_X);
    for (const end of ['front', 'rear']) {
      const jig = partOf(aids, `aid/boom-jig/${end}/centre`);
      const top = Math.max(...jig.outline.map(([, y]) => y));
      const floors = jig.outline.filter(([, y]) => y > 0 && y < top);
      const middles = [floors.slice(0, 2), floors.slice(2)].map((two) => two.reduce((sum, [x]) => sum + x, 0) / 2);
      expect(middles[0]).toBeCloseTo(90, 6);
      expect(middles[1]).toBeCloseTo(-90, 6);
      // The booms' middle is at z = -2 and they are 4 mm thick.
      for (const floor of floors) expect(fromPart(jig.frame, floor)[2]).toBeCloseTo(-4, 6);
      // 4 mm of tube, clearance 0.2 and kerf 0.1.
      expect(Math.abs((floors[0]?.[0] ?? 0) - (floors[1]?.[0] ?? 0))).toBeCloseTo(4.3, 6);
      expect(textsOf(jig)).toContain('180 mm apart');
    }
  });
});
