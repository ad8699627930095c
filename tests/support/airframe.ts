import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Drive } from '@/lib/airframe/schema/equipment';
import type { Body, Boom } from '@/lib/airframe/schema/fuselage';
import type { Material, Tube } from '@/lib/airframe/schema/stock';
import type { Control, Panel, Surface } from '@/lib/airframe/schema/surface';

// Small documents for tests: everything the schema asks for, nothing that a test does not say itself.

export const board = (over: Partial<Material> = {}): Material => ({
  id: 'board',
  kind: 'paperFacedBoard',
  thicknessMm: 5,
  arealMassGm2: 300,
  facesGm2: 150,
  grain: 'none',
  sheets: [{ wMm: 700, hMm: 1000 }],
  source: 'test',
  ...over,
});

export const tube = (over: Partial<Tube> = {}): Tube => ({
  id: 'tube',
  kind: 'tube',
  outerMm: [4, 4],
  innerMm: [2, 2],
  massPerMetreG: 15,
  stockLengthMm: 1000,
  ...over,
});

export const panel = (over: Partial<Panel> = {}): Panel => ({
  id: 'p1',
  lengthMm: 310,
  rootChordMm: 190,
  tipChordMm: 190,
  sweepDeg: 0,
  dihedralDeg: 0,
  washoutDeg: 0,
  materialId: 'board',
  section: { kind: 'flat' },
  joint: 'bevel',
  ...over,
});

export const surface = (over: Partial<Surface> = {}): Surface => ({
  id: 'wing',
  role: 'wing',
  mount: { to: 'datum', at: [0, 0, 0] },
  mirrored: true,
  incidenceDeg: 0,
  cantDeg: 0,
  panels: [panel()],
  tip: { shape: 'square' },
  cutouts: [],
  ribs: [],
  spars: [],
  controls: [],
  ...over,
});

export const control = (over: Partial<Control> = {}): Control => ({
  id: 'aileron',
  kind: 'aileron',
  from: 0.5,
  to: 0.95,
  chordShare: [0.25, 0.3],
  endGapMm: 1.5,
  neutralDeg: 0,
  hinge: { kind: 'paper', side: 'upper', bevelDeg: [0, 40] },
  throwsDeg: { up: 15, down: 15, lowShare: 0.7 },
  differential: 0,
  mix: { pitch: 0, roll: 1, yaw: 0, flap: 0 },
  ...over,
});

export const boom = (over: Partial<Boom> = {}): Boom => ({
  id: 'boom',
  mount: { to: 'datum', at: [40, 90, -2] },
  tubeId: 'tube',
  lengthMm: 420,
  pitchDeg: 0,
  yawDeg: 0,
  mirrored: true,
  sleeve: 'slot',
  ...over,
});

export const body = (over: Partial<Body> = {}): Body => ({
  id: 'body',
  kind: 'box',
  mount: { to: 'datum', at: [-120, 0, -10] },
  materialId: 'board',
  stations: [
    { id: 's1', xMm: 0, widthMm: 50, topMm: 20, bottomMm: -30, cornerMm: 0 },
    { id: 's2', xMm: 90, widthMm: 64, topMm: 28, bottomMm: -34, cornerMm: 0 },
    { id: 's3', xMm: 260, widthMm: 60, topMm: 28, bottomMm: -30, cornerMm: 0 },
    { id: 's4', xMm: 520, widthMm: 24, topMm: 12, bottomMm: -4, cornerMm: 0 },
  ],
  doublers: [],
  formers: [],
  openings: [],
  ...over,
});

export const airframe = (over: Partial<Airframe> = {}): Airframe => ({
  format: 'foldspar.airframe',
  version: 1,
  name: 'Test',
  materials: [board()],
  tubes: [tube()],
  coverings: [],
  surfaces: [surface()],
  bodies: [],
  booms: [],
  drives: [],
  items: [],
  gear: [],
  joints: [],
  radio: { lowRate: 0.7, expo: 0.25, roles: [] },
  flight: {
    altitudeM: 0,
    temperatureOffsetC: 0,
    cruiseMs: 12,
    staticMarginPct: [7, 12],
    launch: 'hand',
  },
  build: { cutter: 'hand', kerfMm: 0.1, slotClearanceMm: 0.2, glueGPerM: 8, glueGm2: 30, tapeGm2: 50 },
  ...over,
});

/** A small tractor by default; the mount is the disc's centre. */
export const drive = (over: Partial<Extract<Drive, { kind: 'propeller' }>> = {}): Drive => ({
  id: 'motor',
  kind: 'propeller',
  mount: { to: 'datum', at: [-200, 0, 0] },
  mirrored: false,
  facing: 'tractor',
  turns: 'cw',
  thrustDeg: [0, 0],
  motor: { massG: 40, diameterMm: 28, lengthMm: 30, kvRpmPerV: 1000 },
  propeller: { diameterMm: 203, pitchMm: 127, blades: 2, massG: 8 },
  ...over,
});
