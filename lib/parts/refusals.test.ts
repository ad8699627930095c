import { describe, expect, it } from 'vitest';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { airframe, boom, control, panel, surface, tube } from '@/tests/support/airframe';
import { develop } from './develop';

describe('what cannot be developed', () => {
  const problemsOf = (over: Partial<Airframe>) =>
    develop(airframe(over)).problems.map(({ code, path }) => `${code} ${path}`);
  const withPanel = (over: Parameters<typeof panel>[0]) => ({
    surfaces: [surface({ panels: [panel(over)] }), surface({ id: 'tail', mount: { to: 'datum', at: [400, 0, 0] } })],
  });

  it.each([
    {
      name: 'another section',
      over: withPanel({
        section: { kind: 'stepped', layers: [{ from: 0, to: 0.4, face: 'upper', materialId: 'board' }] },
      }),
      problem: 'not-built-yet surfaces.0.panels.0.section.kind',
    },
    { name: 'washout', over: withPanel({ washoutDeg: 2 }), problem: 'not-built-yet surfaces.0.panels.0.washoutDeg' },
  ])('names $name and still gives the other parts', ({ over, problem }) => {
    const { parts } = develop(airframe(over));
    expect(problemsOf(over)).toEqual([problem]);
    expect(parts.map(({ key }) => key)).toEqual(['tail/p1/sheet/centre']);
  });

  const two = (over: Parameters<typeof panel>[0]) => [
    panel({ lengthMm: 155 }),
    panel({ id: 'p2', lengthMm: 155, ...over }),
  ];
  it.each([
    {
      name: 'a step in chord',
      surfaces: [surface({ panels: two({ rootChordMm: 180 }) })],
      problem: 'chord-step surfaces.0.panels.1.rootChordMm',
    },
    {
      name: 'a control across a dihedral joint',
      surfaces: [surface({ panels: two({ dihedralDeg: 8 }), controls: [control({ from: 0.3, to: 0.7 })] })],
      problem: 'control-across-joint surfaces.0.controls.0.to',
    },
    {
      name: 'a tube higher than the sheet',
      surfaces: [
        surface({
          spars: [{ id: 's', tubeId: 'thick', chordShare: [0.3, 0.3], from: 0, to: 0.5, let: 'face', face: 'lower' }],
        }),
      ],
      problem: 'spar-too-high surfaces.0.spars.0.tubeId',
    },
    {
      name: 'a spar across a dihedral joint',
      surfaces: [
        surface({
          panels: two({ dihedralDeg: 8 }),
          spars: [{ id: 's', tubeId: 'tube', chordShare: [0.3, 0.3], from: 0, to: 0.8, let: 'face', face: 'lower' }],
        }),
      ],
      problem: 'spar-across-joint surfaces.0.spars.0.to',
    },
    {
      name: 'a spar under a control',
      surfaces: [
        surface({
          controls: [control()],
          spars: [{ id: 's', tubeId: 'tube', chordShare: [0.85, 0.85], from: 0, to: 0.9, let: 'face', face: 'lower' }],
        }),
      ],
      problem: 'spar-off-sheet surfaces.0.spars.0.chordShare',
    },
    {
      name: 'a tip radius that does not fit',
      surfaces: [surface({ tip: { shape: 'rounded', radiusMm: 96 } })],
      problem: 'tip-does-not-fit surfaces.0.tip.radiusMm',
    },
    {
      name: 'a cutout that parts the sheet',
      surfaces: [
        surface({
          cutouts: [
            {
              id: 'c',
              outline: [
                [0.4, 0],
                [0.6, 0],
                [0.6, 1],
                [0.4, 1],
              ],
            },
          ],
        }),
      ],
      problem: 'opening-parts-sheet surfaces.0.cutouts.0.outline',
    },
  ] satisfies { name: string; surfaces: Airframe['surfaces']; problem: string }[])('$name', ({ surfaces, problem }) => {
    const tubes = [tube(), tube({ id: 'thick', outerMm: [6, 6] })];
    expect(problemsOf({ surfaces, tubes })).toEqual([problem]);
  });

  it('a boom longer than its tube is sold', () => {
    expect(problemsOf({ booms: [boom({ lengthMm: 1001 })] })).toEqual(['tube-too-short booms.0.lengthMm']);
    expect(problemsOf({ booms: [boom({ lengthMm: 1000 })] })).toEqual([]);
  });

  it('panels that meet more sharply than a blade can bevel', () => {
    // Half of the angle between the two sides is the panel's own: 60 degrees can be cut, 61 not.
    const at = (dihedralDeg: number) => ({ surfaces: [surface({ panels: [panel({ dihedralDeg })] })] });
    expect(problemsOf(at(60))).toEqual([]);
    expect(problemsOf(at(61))).toEqual(['joint-too-sharp surfaces.0.panels.0.dihedralDeg']);
  });

  it('ribs and gussets, named while the panels still come', () => {
    const gusset = { surfaces: [surface({ ribs: [{ id: 'r', station: 0.5 }], panels: [panel({ joint: 'gusset' })] })] };
    expect(problemsOf(gusset)).toEqual(['not-built-yet surfaces.0.panels.0.joint', 'not-built-yet surfaces.0.ribs']);
    expect(develop(airframe(gusset)).parts).toHaveLength(1);
  });
});
