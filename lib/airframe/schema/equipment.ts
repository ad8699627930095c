import { z } from 'zod';
import { between, downRightDeg, Id, lengthMm, Mount, massG, text } from './common';

const Motor = z.strictObject({
  name: text().optional(),
  massG,
  diameterMm: between(5, 120),
  lengthMm: between(5, 200),
  kvRpmPerV: between(50, 20_000),
  resistanceOhm: between(0.0005, 20).optional(),
  noLoadA: between(0, 50).optional(),
  noLoadV: between(0.1, 100).optional(),
  maxA: between(0.1, 500).optional(),
  maxW: between(1, 20_000).optional(),
});

const Propeller = z.strictObject({
  diameterMm: between(30, 800),
  pitchMm: between(10, 800),
  blades: z.number().int().min(1).max(6),
  massG,
});

const Fan = z.strictObject({
  diameterMm: between(20, 200),
  hubMm: between(5, 120),
  blades: z.number().int().min(2).max(20),
  massG,
});

const drive = {
  id: Id,
  name: text().optional(),
  mount: Mount,
  mirrored: z.boolean(),
  facing: z.enum(['tractor', 'pusher']),
  turns: z.enum(['cw', 'ccw']),
  thrustDeg: downRightDeg,
  motor: Motor,
  controllerItemId: Id.optional(),
  packItemId: Id.optional(),
  /** What a bench test or the maker states, until the power prediction takes over. */
  statedThrustN: between(0, 500).optional(),
};

/** The mount is the propeller's or fan's disc centre. */
export const Drive = z.discriminatedUnion('kind', [
  z.strictObject({ ...drive, kind: z.literal('propeller'), propeller: Propeller }),
  z.strictObject({
    ...drive,
    kind: z.literal('ductedFan'),
    fan: Fan,
    duct: z.strictObject({ inletMm2: between(1, 1e6), outletMm2: between(1, 1e6) }).optional(),
  }),
]);

/** The mount is the item's centre. */
export const Item = z.strictObject({
  id: Id,
  name: text().optional(),
  kind: z.enum(['pack', 'controller', 'servo', 'receiver', 'ballast', 'hardware', 'other']),
  massG,
  sizeMm: z.tuple([lengthMm(0), lengthMm(0), lengthMm(0)]),
  mount: Mount,
  /** How far it can be moved from its place, along x: negative forward. */
  slide: z.strictObject({ fromMm: between(-2000, 2000), toMm: between(-2000, 2000) }).optional(),
  spec: text(200).optional(),
});

export const Radio = z.strictObject({
  lowRate: between(0.1, 1),
  expo: between(0, 1),
  roles: z.array(text(40)).max(16),
});

export const Flight = z.strictObject({
  altitudeM: between(-500, 6_000),
  temperatureOffsetC: between(-50, 40),
  cruiseMs: between(1, 100),
  staticMarginPct: z.tuple([between(0, 60), between(0, 60)]),
  clMax: between(0.2, 2.5).optional(),
  loadFactor: between(1, 40).optional(),
  massLimitG: massG.optional(),
  launch: z.enum(['hand', 'ground', 'bungee']),
});
export type Drive = z.infer<typeof Drive>;
export type Item = z.infer<typeof Item>;
export type Radio = z.infer<typeof Radio>;
export type Flight = z.infer<typeof Flight>;
