import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import type { Panel } from '@/lib/airframe/schema/surface';
import { developResolved } from '@/lib/parts/develop';
import { airframe, panel, surface } from '@/tests/support/airframe';
import { massList } from './masses';

/** Foam of a plain wing, 310 x 190 mm a side of 300 g/m2 board 5 mm thick, with one panel changed. */
function foamG(over: Partial<Panel>): number {
  const document = airframe({ surfaces: [surface({ panels: [panel(over)] })] });
  const resolved = resolve(document);
  if (!resolved.ok) throw new RangeError('refused');
  const lines = massList(document, resolved.value, developResolved(document, resolved.value));
  return lines.filter(({ group }) => group === 'foam').reduce((sum, { massG }) => sum + massG, 0);
}
// 2 x 0.310 x 0.190 m2 x 300 g/m2.
const SHEET_G = 35.34;

describe('panels whose parts cannot be drawn yet', () => {
  it('weigh what their sheet does: a twisted one as the flat one', () => {
    expect(foamG({ washoutDeg: 3 })).toBeCloseTo(SHEET_G, 2);
    expect(foamG({})).toBeCloseTo(SHEET_G, 1);
  });

  it('a folded one weighs both skins and its web', () => {
    const section = { kind: 'folded', thicknessShare: 0.1, maxAt: 0.3, lowerTo: 0.6, webAt: 0.3 } as const;
    // 1 + 0.6 + 0.1 sheets.
    // Twisted, it cannot be cut from one sheet yet.
    expect(foamG({ section, washoutDeg: 2 })).toBeCloseTo(1.7 * SHEET_G, 2);
  });

  it('a stepped one weighs its layers', () => {
    const layers = [{ from: 0, to: 0.5, face: 'upper' as const, materialId: 'board' }];
    expect(foamG({ section: { kind: 'stepped', layers } })).toBeCloseTo(1.5 * SHEET_G, 2);
  });

  it('a slab weighs its profile: a tenth of the chord thick and rectangular is 19 mm of 60 kg/m3', () => {
    const profile: [number, number][] = [
      [0, 0],
      [1, 0],
      [1, 0.1],
      [0, 0.1],
    ];
    expect(foamG({ section: { kind: 'slab', thicknessShare: 0.1, profile } })).toBeCloseTo((19 / 5) * SHEET_G, 2);
  });
});
