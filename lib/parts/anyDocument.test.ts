import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseAirframe } from '@/lib/airframe/parse';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Body } from '@/lib/airframe/schema/fuselage';
import type { Control, Panel, Surface } from '@/lib/airframe/schema/surface';
import { airframe, body, boom, control, panel, surface } from '@/tests/support/airframe';
import { develop } from './develop';
import { assertParts } from './validate';

// Odd documents: whatever they hold, development answers with parts that can be cut and problems, and never throws.

const steps = (min: number, max: number, step: number) =>
  fc.integer({ min: Math.round(min / step), max: Math.round(max / step) }).map((n) => n * step);
const share = steps(0, 1, 0.001);
const mm = (min: number, max: number) => steps(min, max, 0.1);
const pair = (max: number) => fc.tuple(steps(0, max, 0.01), steps(0, max, 0.01));
const ordered = fc.tuple(share, share).map(([a, b]): [number, number] => [Math.min(a, b), Math.max(a, b)]);

const anyControl = (id: string, kind: Control['kind']): fc.Arbitrary<Control> =>
  fc
    .record({
      ends: fc.oneof(
        ordered,
        fc.constant<[number, number]>([0, 1]),
        share.map((to): [number, number] => [0, to]),
      ),
      chordShare: fc.tuple(steps(0.05, 0.6, 0.01), steps(0.05, 0.6, 0.01)),
      endGapMm: fc.constantFrom(0, 1.5, 4),
      neutralDeg: fc.integer({ min: -8, max: 8 }),
      hinge: fc.record({
        kind: fc.constantFrom('paper', 'tape', 'pinned', 'flexible'),
        side: fc.constantFrom('upper', 'lower'),
        bevelDeg: pair(60),
      }),
      roll: fc.constantFrom(0, 1),
    })
    .map(({ ends: [from, to], roll, hinge, ...rest }) =>
      control({
        id,
        kind,
        from,
        to,
        ...rest,
        hinge: { ...hinge, bevelDeg: [hinge.bevelDeg[0], hinge.bevelDeg[1]] },
        mix: { pitch: 0, roll, yaw: 0, flap: 0 },
      }),
    );

const anyPanel: fc.Arbitrary<Partial<Panel>> = fc.record({
  lengthMm: mm(20, 400),
  tipChordMm: mm(20, 300),
  sweepDeg: mm(-40, 60),
  dihedralDeg: fc.oneof(fc.constant(0), mm(-30, 40)),
});

const anyTip: fc.Arbitrary<Surface['tip']> = fc.oneof(
  fc.constant({ shape: 'square' as const }),
  mm(-60, 60).map((angleDeg) => ({ shape: 'raked' as const, angleDeg })),
  mm(1, 80).map((radiusMm) => ({ shape: 'rounded' as const, radiusMm })),
);

const anySurface: fc.Arbitrary<Surface> = fc
  .record({
    root: mm(30, 300),
    panels: fc.array(anyPanel, { minLength: 1, maxLength: 3 }),
    pointed: fc.boolean(),
    mirrored: fc.boolean(),
    incidenceDeg: fc.oneof(fc.constant(0), mm(-5, 5)),
    cantDeg: fc.constantFrom(0, 0, 35, 90),
    tip: anyTip,
    cutouts: fc.array(fc.tuple(ordered, ordered), { maxLength: 2 }),
    controls: fc.oneof(
      fc.constant([]),
      fc.tuple(anyControl('c1', 'aileron')),
      fc.tuple(anyControl('c1', 'aileron'), anyControl('c2', 'flap')),
    ),
    spar: fc.option(
      fc.record({ chordShare: fc.tuple(share, share), ends: ordered, let: fc.constantFrom('face', 'through') }),
    ),
  })
  .map(({ root, panels, pointed, cutouts, spar, controls, ...rest }) => {
    const chords = panels.map(({ tipChordMm }, index) => (pointed && index === panels.length - 1 ? 0 : tipChordMm));
    return surface({
      ...rest,
      mount: { to: 'datum', at: [0, rest.mirrored && rest.cantDeg === 90 ? 90 : 0, 0] },
      panels: panels.map((over, i) =>
        panel({ ...over, id: `p${i + 1}`, rootChordMm: i === 0 ? root : chords[i - 1], tipChordMm: chords[i] }),
      ),
      controls: [...controls],
      cutouts: cutouts.map(([[a, b], [c, d]], i) => ({
        id: `k${i}`,
        outline: [
          [a, c],
          [b, c],
          [b, d],
          [a, d],
        ],
      })),
      spars: spar
        ? [
            {
              id: 's',
              tubeId: 'tube',
              chordShare: [spar.chordShare[0], spar.chordShare[1]],
              from: spar.ends[0],
              to: spar.ends[1],
              let: spar.let,
              face: 'lower',
            },
          ]
        : [],
    });
  });

const anyBody: fc.Arbitrary<Body> = fc
  .record({
    kind: fc.constantFrom('box', 'profile', 'nacelle'),
    stations: fc.array(fc.tuple(mm(15, 200), mm(12, 90), mm(6, 50), mm(-50, -6)), { minLength: 2, maxLength: 6 }),
    former: fc.tuple(share, mm(-20, 20), mm(-20, 20)),
    opening: fc.option(fc.tuple(ordered, mm(2, 50), fc.constantFrom('port', 'stbd', 'top', 'bottom'))),
    doubler: fc.option(fc.tuple(ordered, fc.constantFrom('port', 'stbd', 'top', 'bottom'))),
  })
  .map(({ kind, stations, former, opening, doubler }) => {
    let x = 0;
    const placed = stations.map(([step, widthMm, topMm, bottomMm], i) => {
      const xMm = x;
      x += step;
      return { id: `s${i}`, xMm, widthMm, topMm, bottomMm, cornerMm: 0 };
    });
    const length = placed.at(-1)?.xMm ?? 0;
    return body({
      kind,
      stations: placed,
      formers: [
        { id: 'f', xMm: former[0] * length, role: 'firewall', materialId: 'board', tiltDeg: [former[1], former[2]] },
      ],
      openings: opening
        ? [
            {
              id: 'o',
              fromX: opening[0][0] * length,
              toX: opening[0][1] * length,
              widthMm: opening[1],
              face: opening[2],
              purpose: 'servo',
            },
          ]
        : [],
      doublers: doubler
        ? [
            {
              id: 'd',
              fromX: doubler[0][0] * length,
              toX: doubler[0][1] * length,
              face: doubler[1],
              materialId: 'board',
            },
          ]
        : [],
    });
  });

const anyDocument: fc.Arbitrary<Airframe> = fc
  .record({ surface: anySurface, body: anyBody, sleeve: fc.constantFrom('slot', 'saddle') })
  .map((made) => airframe({ surfaces: [made.surface], bodies: [made.body], booms: [boom({ sleeve: made.sleeve })] }));

describe('develop, on any document', () => {
  it('never throws, and gives only parts that can be cut', () => {
    fc.assert(
      fc.property(anyDocument, (document) => {
        const { parts } = develop(document);
        assertParts(parts);
      }),
      { numRuns: 150 },
    );
  });

  it('leaves no part out of an accepted document without a word', () => {
    let accepted = 0;
    fc.assert(
      fc.property(anyDocument, (document) => {
        if (!parseAirframe(document).ok) return;
        accepted += 1;
        const { parts, problems } = develop(document);
        const said = (path: string): boolean => problems.some((problem) => problem.path.startsWith(path));
        expect(parts.some(({ key }) => key.startsWith('wing/')) || said('surfaces.0')).toBe(true);
        expect(parts.some(({ key }) => key.startsWith('body/')) || said('bodies.0')).toBe(true);
      }),
      { numRuns: 150 },
    );
    expect(accepted).toBeGreaterThan(3);
  });
});
