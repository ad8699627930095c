import { z } from 'zod';
import { angleDeg, between, coordinateMm, downRightDeg, Id, lengthMm, Mount, massG, text, Vec2Mm } from './common';

const Face = z.enum(['port', 'stbd', 'top', 'bottom']);

/** Body stations: xMm from the body's own origin (its mount), aft; heights from that origin, up. */
export const Body = z.strictObject({
  id: Id,
  name: text().optional(),
  kind: z.enum(['box', 'profile', 'nacelle']),
  mount: Mount,
  materialId: Id,
  stations: z
    .array(
      z.strictObject({
        id: Id,
        xMm: coordinateMm,
        widthMm: lengthMm(0),
        topMm: coordinateMm,
        bottomMm: coordinateMm,
        cornerMm: lengthMm(0),
      }),
    )
    .min(2)
    .max(40),
  outline: z.array(Vec2Mm).min(3).max(200).optional(),
  doublers: z
    .array(z.strictObject({ id: Id, face: Face, fromX: coordinateMm, toX: coordinateMm, materialId: Id }))
    .max(20),
  formers: z
    .array(
      z.strictObject({
        id: Id,
        xMm: coordinateMm,
        role: z.enum(['former', 'firewall']),
        materialId: Id,
        tiltDeg: downRightDeg,
      }),
    )
    .max(40),
  openings: z
    .array(
      z.strictObject({
        id: Id,
        face: Face,
        fromX: coordinateMm,
        toX: coordinateMm,
        widthMm: lengthMm(1),
        purpose: z.enum(['hatch', 'servo', 'pack', 'inlet', 'outlet', 'saddle', 'tube']),
      }),
    )
    .max(40),
});

export const Boom = z.strictObject({
  id: Id,
  name: text().optional(),
  mount: Mount,
  tubeId: Id,
  lengthMm: lengthMm(10),
  pitchDeg: angleDeg(30),
  yawDeg: angleDeg(30),
  mirrored: z.boolean(),
  sleeve: z.enum(['slot', 'saddle']),
});

export const Gear = z.strictObject({
  id: Id,
  kind: z.enum(['wheel', 'skid', 'keel', 'towHook']),
  mount: Mount,
  mirrored: z.boolean(),
  tubeId: Id.optional(),
  legMm: lengthMm(0).optional(),
  wheelMm: between(5, 300).optional(),
  massG,
});

export const Joint = z.strictObject({
  id: Id,
  between: z.tuple([Id, Id]),
  kind: z.enum(['glued', 'bands', 'bolts', 'tube']),
});
export type Body = z.infer<typeof Body>;
export type Boom = z.infer<typeof Boom>;
export type Gear = z.infer<typeof Gear>;
export type Joint = z.infer<typeof Joint>;
