import { z } from 'zod';
import { angleDeg, between, Id, lengthMm, Mount, share, text, Vec2Mm } from './common';

const SectionShape = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('flat') }),
  z.strictObject({
    kind: z.literal('stepped'),
    layers: z
      .array(z.strictObject({ from: share, to: share, face: z.enum(['upper', 'lower']), materialId: Id }))
      .min(1)
      .max(4),
  }),
  z.strictObject({
    kind: z.literal('folded'),
    thicknessShare: between(0.02, 0.25),
    maxAt: between(0.05, 0.7),
    lowerTo: share,
    webAt: share,
    reflexDeg: angleDeg(15).optional(),
    turbulatorMm: between(0.1, 5).optional(),
  }),
  z.strictObject({
    kind: z.literal('slab'),
    thicknessShare: between(0.02, 0.3),
    profile: z
      .array(z.tuple([share, between(-0.5, 0.5)]))
      .min(3)
      .max(400),
  }),
]);

export const Panel = z.strictObject({
  id: Id,
  lengthMm: lengthMm(1),
  rootChordMm: lengthMm(1),
  tipChordMm: lengthMm(0),
  sweepDeg: angleDeg(75),
  dihedralDeg: angleDeg(90),
  washoutDeg: angleDeg(20),
  materialId: Id,
  coveringId: Id.optional(),
  section: SectionShape,
  joint: z.enum(['bevel', 'gusset', 'rib', 'none']),
});

const Tip = z.discriminatedUnion('shape', [
  z.strictObject({ shape: z.literal('square') }),
  z.strictObject({ shape: z.literal('raked'), angleDeg: angleDeg(60) }),
  z.strictObject({ shape: z.literal('rounded'), radiusMm: lengthMm(1) }),
  z.strictObject({ shape: z.literal('outline'), points: z.array(Vec2Mm).min(2).max(200) }),
]);

const Hinge = z.strictObject({
  kind: z.enum(['paper', 'tape', 'pinned', 'flexible']),
  side: z.enum(['upper', 'lower']),
  bevelDeg: z.tuple([between(0, 80), between(0, 80)]),
  axis: share.optional(),
});

const Linkage = z.strictObject({
  servoItemId: Id,
  servoArmMm: between(2, 60),
  hornMm: between(2, 80),
  hornStation: share,
  rodMm: between(0.5, 10),
  face: z.enum(['upper', 'lower']),
});

export const Control = z.strictObject({
  id: Id,
  kind: z.enum(['aileron', 'elevator', 'elevon', 'flaperon', 'rudder', 'ruddervator', 'flap', 'airbrake', 'allMoving']),
  /** Ends as a share of the surface's length from root to tip. */
  from: share,
  to: share,
  /** Chord of the control as a share of the local chord, at its inner and outer end. */
  chordShare: z.tuple([between(0.02, 1), between(0.02, 1)]),
  endGapMm: between(0, 20),
  neutralDeg: angleDeg(30),
  hinge: Hinge,
  throwsDeg: z.strictObject({ up: between(0, 80), down: between(0, 80), lowShare: between(0.05, 1) }),
  /** Share by which the down-going side moves less: 0 none, 1 no down at all. */
  differential: share,
  /**
   * Share of its throw that each stick takes, and by its sign the way. Positive: up stick lifts the trailing edge of a control on a wing
   * or behind it and drops it ahead of the wing (on a foreplane, or hinged ahead of the quarter point of the wing's mean chord); right
   * stick lifts the starboard side; right rudder moves trailing edges to starboard on a wing or behind it, to port ahead; flaps go down.
   * A wing flap that goes down with up stick has a negative share of pitch. The CG has no say.
   */
  mix: z.strictObject({ pitch: between(-1, 1), roll: between(-1, 1), yaw: between(-1, 1), flap: between(-1, 1) }),
  linkage: Linkage.optional(),
});

export const Surface = z.strictObject({
  id: Id,
  name: text().optional(),
  role: z.enum(['wing', 'foreplane', 'tailplane', 'fin', 'vtail', 'tipFin']),
  mount: Mount,
  mirrored: z.boolean(),
  incidenceDeg: angleDeg(20),
  /** 0 lies flat, 90 stands upright. */
  cantDeg: between(-180, 180),
  panels: z.array(Panel).min(1).max(12),
  tip: Tip,
  cutouts: z
    .array(
      z.strictObject({
        id: Id,
        outline: z
          .array(z.tuple([share, share]))
          .min(3)
          .max(60),
      }),
    )
    .max(20),
  ribs: z.array(z.strictObject({ id: Id, station: share })).max(60),
  spars: z
    .array(
      z.strictObject({
        id: Id,
        tubeId: Id.optional(),
        materialId: Id.optional(),
        chordShare: z.tuple([share, share]),
        from: share,
        to: share,
        let: z.enum(['face', 'through', 'inside']),
        face: z.enum(['upper', 'lower']),
      }),
    )
    .max(8),
  controls: z.array(Control).max(12),
});
export type SectionShape = z.infer<typeof SectionShape>;
export type Panel = z.infer<typeof Panel>;
export type Control = z.infer<typeof Control>;
export type Surface = z.infer<typeof Surface>;
