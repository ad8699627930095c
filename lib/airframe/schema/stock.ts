import { z } from 'zod';
import { between, Id, lengthMm, price, text } from './common';

export const Material = z.strictObject({
  id: Id,
  kind: z.enum(['paperFacedBoard', 'xps', 'epp', 'balsa', 'ply']),
  thicknessMm: between(0.4, 60),
  arealMassGm2: between(5, 20_000),
  /** Mass of both faces together, g/m2; 0 for plain foam. It does not grow with the thickness. */
  facesGm2: between(0, 2_000),
  /** Which way the sheet is strong, in the sheet's own axes; "none" for a sheet without grain. */
  grain: z.enum(['alongWidth', 'alongHeight', 'none']),
  foldAllowanceMm: between(0, 10).optional(),
  eMpa: between(0.1, 50_000).optional(),
  strengthMpa: between(0.01, 2_000).optional(),
  sheets: z
    .array(z.strictObject({ wMm: lengthMm(50), hMm: lengthMm(50), price: price.optional() }))
    .min(1)
    .max(20),
  source: text(200),
});

export const Tube = z.strictObject({
  id: Id,
  kind: z.enum(['tube', 'rod', 'strip', 'foamBox']),
  outerMm: z.tuple([between(0.3, 100), between(0.3, 100)]),
  innerMm: z.tuple([between(0, 99), between(0, 99)]).optional(),
  massPerMetreG: between(0.1, 5_000),
  stockLengthMm: lengthMm(50),
  eGpa: between(0.1, 500).optional(),
  strengthMpa: between(0.1, 5_000).optional(),
  price: price.optional(),
});

export const Covering = z.strictObject({ id: Id, name: text(), arealMassGm2: between(1, 1_000) });

export const Build = z.strictObject({
  cutter: z.enum(['hand', 'dragKnife', 'hotWire', 'laser']),
  kerfMm: between(0, 3),
  slotClearanceMm: between(0, 2),
  glueGPerM: between(0, 50),
  glueGm2: between(0, 500),
  tapeGm2: between(0, 200),
});
export type Material = z.infer<typeof Material>;
export type Tube = z.infer<typeof Tube>;
export type Covering = z.infer<typeof Covering>;
export type Build = z.infer<typeof Build>;
