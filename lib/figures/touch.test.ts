import { describe, expect, it } from 'vitest';
import { startFrom } from '@/lib/airframe/layouts';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { body, panel } from '@/tests/support/airframe';
import { pitchContext } from '@/tests/support/pitchContext';
import { plain, tail, wing } from '@/tests/support/plainAircraft';
import { touchFigures } from './touch';

/** With the CG range laid so that the first flight is balanced at x. */
function touched(document: Airframe, firstFlightX: number | null) {
  const context = pitchContext(document);
  return touchFigures({ ...context, stability: { ...context.stability, firstFlightX } });
}
const at = (x: number): [number, number, number] => [x, 0, 0];
const station = (document: Airframe, x: number) => {
  const figure = touched(document, x).firstFlightAtStationMm;
  return { y: figure?.inputs?.[0]?.value, aft: figure?.value, problem: figure?.problem?.code };
};
/** Root chord 200, tip 120 at 400 mm out, leading edge swept back 200 mm. */
const swept = () =>
  plain({
    surfaces: [
      wing({
        panels: [
          panel({ lengthMm: 400, rootChordMm: 200, tipChordMm: 120, sweepDeg: (Math.atan(180 / 400) * 180) / Math.PI }),
        ],
      }),
    ],
  });

describe('the first-flight CG from places that can be touched', () => {
  it('is measured at the station nearest the body where a finger fits', () => {
    // Without a body: a finger's width from the centre line. The leading edge there is 12 / 400 of 200 mm back.
    const { y, aft } = station(swept(), 100);
    expect(y).toBeCloseTo(12, 6);
    expect(aft).toBeCloseTo(100 - 6, 6);
  });

  it('lies outboard where the CG line leaves the root chord behind', () => {
    // Trailing edge at 200 + 0.3 y; the line at 240 needs 12 mm of wing behind it: y = 52 / 0.3.
    const { y, aft } = station(swept(), 240);
    expect(y).toBeCloseTo(52 / 0.3, 6);
    expect(aft).toBeCloseTo(240 - 0.5 * (52 / 0.3), 6);
  });

  it('takes any wing at all where there is too little for a finger, and says so where there is none', () => {
    expect(station(swept(), 314)).toMatchObject({ problem: undefined });
    expect(station(swept(), 340)).toMatchObject({ aft: null, problem: 'does-not-apply' });
    expect(station(swept(), -30)).toMatchObject({ aft: null, problem: 'does-not-apply' });
  });

  it('stays clear of the body', () => {
    const bodied = { ...swept(), bodies: [body({ mount: { to: 'datum', at: [-120, 0, 0] } })] };
    // The body is 64 mm wide at most beside the root chord, less where the chord begins: over 30 mm a side.
    expect(station(bodied, 100).y).toBeGreaterThan(30 + 12);
    expect(station(bodied, 100).y).toBeLessThan(32 + 12 + 1e-9);
    const side = touched(bodied, 100).cgFromBodySideMm;
    expect(side?.value).toBeCloseTo(100 - 0.5 * (side?.inputs?.[0]?.value ?? 0), 6);
  });

  it('is measured from the foremost thing, by its name', () => {
    const nose = (document: Airframe) => {
      const figure = touched(document, 50).firstFlightFromNoseMm;
      return { mm: figure?.value, name: figure?.inputs?.[0]?.name };
    };
    expect(nose(plain())).toMatchObject({ mm: 50, name: expect.stringContaining('leading edge') });
    expect(nose(plain({ bodies: [body({ mount: { to: 'datum', at: [-120, 0, 0] } })] }))).toMatchObject({
      mm: 170,
      name: expect.stringContaining('body'),
    });
    const drives = startFrom('trainer', 'Test').drives.map((d) => ({
      ...d,
      mount: { to: 'datum', at: at(-150) },
    }));
    expect(nose(plain({ drives }))).toMatchObject({ mm: 200, name: expect.stringContaining('motor') });
    const foreplane = tail(-350, { id: 'fore', role: 'foreplane' });
    expect(nose(plain({ surfaces: [wing(), foreplane] })).mm).toBeCloseTo(400, 6);
  });

  it('carries the reason when there is no range', () => {
    const { cgFromBodySideMm, firstFlightFromNoseMm } = touched(plain(), null);
    expect(cgFromBodySideMm).toBeDefined();
    expect(firstFlightFromNoseMm).toEqual(cgFromBodySideMm);
  });

  it('does not move with the origin', () => {
    const dx = 83;
    const moved = plain({
      surfaces: plain().surfaces.map((s) => ({
        ...s,
        mount: { to: 'datum', at: at(560 * Number(s.id !== 'wing') + dx) },
      })),
    });
    const still = plain({
      surfaces: plain().surfaces.map((s) => ({
        ...s,
        mount: { to: 'datum', at: at(560 * Number(s.id !== 'wing')) },
      })),
    });
    const [here, there] = [touched(still, 55), touched(moved, 55 + dx)];
    for (const id of ['cgFromBodySideMm', 'firstFlightAtStationMm', 'firstFlightFromNoseMm'] as const)
      expect(there[id]?.value).toBeCloseTo(here[id]?.value ?? Number.NaN, 9);
  });
});
