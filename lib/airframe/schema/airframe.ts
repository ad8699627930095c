import { z } from 'zod';
import { between, type Id, text } from './common';
import { Drive, Flight, Item, Radio } from './equipment';
import { Body, Boom, Gear, Joint } from './fuselage';
import { AIRFRAME_FORMAT, AIRFRAME_VERSION } from './limits';
import { Build, Covering, Material, Tube } from './stock';
import { Surface } from './surface';

export { AIRFRAME_FORMAT, AIRFRAME_VERSION } from './limits';

/** The document's shape. References between elements are checked in `checkReferences`, after the shape holds. */
export const AirframeShape = z.strictObject({
  format: z.literal(AIRFRAME_FORMAT),
  version: z.literal(AIRFRAME_VERSION),
  name: text(),
  origin: z.strictObject({ airframeHash: z.string().regex(/^[0-9a-f]{64}$/), factor: between(0.01, 100) }).optional(),
  materials: z.array(Material).min(1).max(40),
  tubes: z.array(Tube).max(40),
  coverings: z.array(Covering).max(20),
  surfaces: z.array(Surface).min(1).max(20),
  bodies: z.array(Body).max(10),
  booms: z.array(Boom).max(10),
  drives: z.array(Drive).max(8),
  items: z.array(Item).max(100),
  gear: z.array(Gear).max(20),
  joints: z.array(Joint).max(100),
  radio: Radio,
  flight: Flight,
  build: Build,
});
export type Airframe = z.infer<typeof AirframeShape>;
export type ElementId = z.infer<typeof Id>;
