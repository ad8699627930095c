import { describe, expect, it } from 'vitest';
import { type PlanformStation, planform } from '@/lib/geometry/planform';
import { STATIC_MARGIN_PCT, TAIL_VOLUMES } from '../defaults';
import { parseAirframe } from '../parse';
import { resolve, sectionAt } from '../resolve';
import type { ResolvedSurface } from '../resolved';
import { startFrom, startingLayouts } from '.';

function surfacesOf(layout: string): Map<string, ResolvedSurface> {
  const resolved = resolve(startFrom(layout, 'Test'));
  if (!resolved.ok) throw new RangeError('a layout resolves');
  return new Map(resolved.value.surfaces.map((surface) => [surface.surface.id, surface]));
}
function planOf(surface: ResolvedSurface | undefined) {
  if (!surface) throw new RangeError('no such surface');
  const stations = [0, 1].map((at): PlanformStation => {
    const { le, chordMm } = sectionAt(surface, at);
    return { x: le[0], y: le[1], chord: chordMm };
  });
  return planform(stations);
}

describe('starting layouts', () => {
  it('there are four, with different ids, a name and a sentence', () => {
    expect(new Set(startingLayouts.map(({ id }) => id)).size).toBe(4);
    for (const { name, what } of startingLayouts) expect(name.length * what.length).toBeGreaterThan(100);
  });
  it.each(startingLayouts)('$id parses under the name it is given', ({ id }) => {
    const parsed = parseAirframe(startFrom(id, 'My first'));
    expect(parsed.ok ? parsed.value.name : parsed.problems).toBe('My first');
  });
  it('two of a kind share nothing', () => {
    const one = startFrom('trainer', 'A');
    const other = startFrom('trainer', 'A');
    one.materials[0]?.sheets.pop();
    one.surfaces[0]?.controls[0]?.chordShare.reverse();
    one.drives[0]?.thrustDeg.fill(9);
    one.flight.staticMarginPct.fill(1);
    expect(other).toEqual(startFrom('trainer', 'A'));
    expect(other.flight.staticMarginPct).toEqual(STATIC_MARGIN_PCT.trainer.value);
  });
  it('an unknown layout is refused by name', () => expect(() => startFrom('biplane', 'X')).toThrow(/biplane/));
});

describe('tail volumes (common practice, no source: trainer 0.45 to 0.60)', () => {
  it.each(['trainer', 'pusher'])('%s', (layout) => {
    const surfaces = surfacesOf(layout);
    const wing = planOf(surfaces.get('wing'));
    const tail = planOf(surfaces.get('tail'));
    const volume = (tail.area * (tail.xQuarterMac - wing.xQuarterMac)) / (wing.area * wing.mac);
    const [low, high] = TAIL_VOLUMES.horizontal.value;
    expect(volume).toBeGreaterThan(low);
    expect(volume).toBeLessThan(high);
  });
  it('the trainer’s fin lies in 0.035 to 0.05', () => {
    const surfaces = surfacesOf('trainer');
    const wing = planOf(surfaces.get('wing'));
    const fin = surfaces.get('fin');
    if (!fin) throw new RangeError('the trainer has a fin');
    const [root, tip] = [sectionAt(fin, 0), sectionAt(fin, 1)];
    const area = (130 * (root.chordMm + tip.chordMm)) / 2;
    const arm = (root.le[0] + tip.le[0]) / 2 + (root.chordMm + tip.chordMm) / 8 - wing.xQuarterMac;
    const volume = (area * arm) / (wing.area * wing.span);
    expect(volume).toBeGreaterThan(TAIL_VOLUMES.vertical.value[0]);
    expect(volume).toBeLessThan(TAIL_VOLUMES.vertical.value[1]);
  });
});

describe('clearances', () => {
  it('the pusher’s propeller clears its booms by 10 mm and more', () => {
    const { drives, booms, tubes } = startFrom('pusher', 'X');
    const [drive] = drives;
    const at = booms[0]?.mount.at;
    const reach = drive?.kind === 'propeller' ? drive.propeller.diameterMm / 2 : Number.NaN;
    const inside = (Array.isArray(at) ? at[1] : Number.NaN) - (tubes[0]?.outerMm[0] ?? Number.NaN) / 2;
    expect(inside - reach).toBeGreaterThan(10);
  });
  it.each(['tailless', 'delta'])('the elevons of the %s rest 2 to 3° up', (layout) => {
    const control = startFrom(layout, 'X').surfaces[0]?.controls[0];
    expect(control?.neutralDeg).toBeLessThanOrEqual(-2);
    expect(control?.neutralDeg).toBeGreaterThanOrEqual(-3);
  });
  it.each(startingLayouts)('every bevel of the $id is 10° more than the throw towards it', ({ id }) => {
    for (const { hinge, throwsDeg } of startFrom(id, 'X').surfaces.flatMap(({ controls }) => controls)) {
      expect(Math.max(...hinge.bevelDeg)).toBeGreaterThanOrEqual(Math.max(throwsDeg.up, throwsDeg.down) + 10);
    }
  });
});
