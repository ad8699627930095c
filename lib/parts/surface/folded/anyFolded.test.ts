import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { resolve } from '@/lib/airframe/resolve';
import { signedArea } from '@/lib/geometry/polygons';
import { airframe, board, control, panel, surface, tube } from '@/tests/support/airframe';
import { partFault } from '../../validate';
import { foldedParts } from './foldedParts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const anySection = fc.record({
  kind: fc.constant('folded' as const),
  thicknessShare: between(0.09, 0.25),
  maxAt: between(0.15, 0.5),
  lowerTo: between(0.35, 0.85),
  webAt: between(0, 1),
});
const anyPanel = fc.record({
  section: anySection,
  lengthMm: between(20, 900),
  chords: fc.tuple(between(150, 400), between(60, 400)),
  sweepDeg: between(-40, 50),
  dihedralDeg: between(-10, 60),
  joint: fc.constantFrom('bevel' as const, 'none' as const),
});
const anyWing = fc.record({
  panels: fc.array(anyPanel, { minLength: 1, maxLength: 3 }),
  incidenceDeg: between(-10, 10),
  reflexDeg: fc.option(between(-15, 15), { nil: undefined }),
  plain: fc.boolean(),
  rakeDeg: between(-60, 60),
  hinge: fc.constantFrom('paper' as const, 'tape' as const),
  controlShare: between(0.02, 0.6),
  spar: fc.record({ at: fc.tuple(between(0, 1), between(0, 1)), inside: fc.boolean(), upper: fc.boolean() }),
});

type Wing = typeof anyWing extends fc.Arbitrary<infer Value> ? Value : never;

const tipOf = ({ chords }: { readonly chords: readonly [number, number] }): number => Math.max(20, chords[1]);

function document(wing: Wing) {
  const { spar } = wing;
  return airframe({
    materials: [board(wing.plain ? { kind: 'epp', facesGm2: 0 } : {})],
    surfaces: [
      surface({
        incidenceDeg: wing.incidenceDeg,
        mount: { to: 'datum', at: [0, 5, 0] },
        tip: { shape: 'raked', angleDeg: wing.rakeDeg },
        panels: wing.panels.map((one, i) =>
          panel({
            id: `p${i + 1}`,
            lengthMm: one.lengthMm,
            rootChordMm: i === 0 ? one.chords[0] : tipOf(wing.panels[i - 1] ?? one),
            // Only the last may run out to a point.
            tipChordMm: i + 1 < wing.panels.length ? tipOf(one) : one.chords[1],
            sweepDeg: one.sweepDeg,
            dihedralDeg: one.dihedralDeg,
            joint: one.joint,
            section: { ...one.section, ...(wing.reflexDeg === undefined ? {} : { reflexDeg: wing.reflexDeg }) },
          }),
        ),
        spars: [
          {
            id: 'spar',
            tubeId: 'tube',
            chordShare: [...spar.at],
            from: 0,
            to: 0.3,
            let: spar.inside ? 'inside' : 'face',
            face: spar.upper ? 'upper' : 'lower',
          },
        ],
        controls: [
          control({
            from: 0.05,
            to: 0.2,
            chordShare: [wing.controlShare, wing.controlShare],
            hinge: { kind: wing.hinge, side: 'upper', bevelDeg: [0, 40] },
          }),
        ],
      }),
    ],
  });
}

describe('any folded wing', () => {
  it('never throws; each panel is cut or told about, and mirrored sides are alike', () => {
    fc.assert(
      fc.property(anyWing, (wing) => {
        const airframeHere = document(wing);
        const resolved = resolve(airframeHere);
        if (!resolved.ok) return;
        const [surfaceHere] = resolved.value.surfaces;
        if (!surfaceHere) return;
        const { parts, problems } = foldedParts(surfaceHere, surfaceHere.panels, {
          controls: resolved.value.controls,
          materials: new Map(airframeHere.materials.map((entry) => [entry.id, entry])),
          tubes: new Map([['tube', tube()]]),
          booms: [],
        });
        for (const { index, panel: own } of surfaceHere.panels) {
          const has = parts.some(({ key }) => key.startsWith(`wing/${own.id}/skin`));
          const told = problems.some(({ path }) => path.startsWith(`surfaces.0.panels.${index}.`));
          expect(has || told).toBe(true);
        }
        const byKey = new Map(parts.map((part) => [part.key, part]));
        for (const part of parts) {
          const fellow = byKey.get(part.mirrorOf ?? '');
          if (!fellow) continue;
          expect(partFault(part) === null).toBe(partFault(fellow) === null);
          expect(Math.abs(signedArea(part.outline) - signedArea(fellow.outline))).toBeLessThan(1e-6);
        }
      }),
      { numRuns: 150 },
    );
  });

  it('within sizes that are built, can be cut', () => {
    const sane = fc.record({
      thicknessShare: between(0.11, 0.15),
      maxAt: between(0.25, 0.35),
      chord: between(180, 260),
      taper: between(0.75, 1.2),
      sweepDeg: between(-10, 20),
      dihedralDeg: between(0, 8),
    });
    fc.assert(
      fc.property(sane, ({ thicknessShare, maxAt, chord, taper, sweepDeg, dihedralDeg }) => {
        const own = airframe({
          surfaces: [
            surface({
              panels: [
                panel({
                  lengthMm: 400,
                  rootChordMm: chord,
                  tipChordMm: chord * taper,
                  sweepDeg,
                  dihedralDeg,
                  section: { kind: 'folded', thicknessShare, maxAt, lowerTo: 0.6, webAt: maxAt },
                }),
              ],
            }),
          ],
        });
        const resolved = resolve(own);
        if (!resolved.ok) throw new RangeError(JSON.stringify(resolved.problems));
        const { parts } = foldedParts(resolved.value.surfaces[0] ?? fail(), resolved.value.surfaces[0]?.panels ?? [], {
          controls: [],
          materials: new Map(own.materials.map((entry) => [entry.id, entry])),
          tubes: new Map(),
          booms: [],
        });
        expect(parts.length).toBeGreaterThanOrEqual(4);
        for (const part of parts) expect(partFault(part)).toBeNull();
      }),
      { numRuns: 100 },
    );
  });
});

function fail(): never {
  throw new RangeError('a wing');
}
