import type { Material, Tube } from './schema/stock';

// What a newcomer starts from. Every default says what it rests on: CP is common practice without a source, M is from memory
// and wants a check on the bench. Weigh and measure your own.

export type Basis = 'CP' | 'M';

export interface Default<T> {
  readonly value: T;
  readonly unit: string;
  readonly basis: Basis;
  readonly note: string;
}

/** A default that is common practice, without a source. */
export const cp = <T>(value: T, unit: string, note: string): Default<T> => ({ value, unit, basis: 'CP', note });
/** A default from memory: check it on the bench. */
export const m = <T>(value: T, unit: string, note: string): Default<T> => ({ value, unit, basis: 'M', note });

const SHEETS_BOARD = [
  { wMm: 1000, hMm: 700 },
  { wMm: 762, hMm: 508 },
];

/** Sheet materials, as the document holds them. `basis` is said again in each one's source. */
export const MATERIALS = {
  lightBoard5: {
    id: 'board-5',
    kind: 'paperFacedBoard',
    thicknessMm: 5,
    arealMassGm2: 320,
    facesGm2: 150,
    grain: 'alongWidth',
    sheets: SHEETS_BOARD,
    source: 'CP: light paper-faced board, 280 to 330 g/m²; weigh yours',
  },
  displayBoard5: {
    id: 'board-5d',
    kind: 'paperFacedBoard',
    thicknessMm: 5,
    arealMassGm2: 480,
    facesGm2: 300,
    grain: 'alongWidth',
    sheets: SHEETS_BOARD,
    source: 'CP: display-grade paper-faced board, 450 to 700 g/m²; weigh yours',
  },
  lightBoard3: {
    id: 'board-3',
    kind: 'paperFacedBoard',
    thicknessMm: 3,
    arealMassGm2: 250,
    facesGm2: 150,
    grain: 'alongWidth',
    sheets: SHEETS_BOARD,
    source: 'M: light paper-faced board of 3 mm; weigh yours',
  },
  displayBoard10: {
    id: 'board-10d',
    kind: 'paperFacedBoard',
    thicknessMm: 10,
    arealMassGm2: 650,
    facesGm2: 300,
    grain: 'alongWidth',
    sheets: SHEETS_BOARD,
    source: 'M: display-grade paper-faced board of 10 mm; weigh yours',
  },
  xps3: {
    id: 'xps-3',
    kind: 'xps',
    thicknessMm: 3,
    arealMassGm2: 110,
    facesGm2: 0,
    grain: 'none',
    sheets: [{ wMm: 1250, hMm: 800 }],
    source: 'CP: extruded polystyrene 3 mm; weigh yours',
  },
  xps6: {
    id: 'xps-6',
    kind: 'xps',
    thicknessMm: 6,
    arealMassGm2: 220,
    facesGm2: 0,
    grain: 'none',
    sheets: [{ wMm: 1250, hMm: 800 }],
    source: 'CP: extruded polystyrene 6 mm; weigh yours',
  },
  epp6: {
    id: 'epp-6',
    kind: 'epp',
    thicknessMm: 6,
    arealMassGm2: 120,
    facesGm2: 0,
    grain: 'none',
    sheets: [{ wMm: 900, hMm: 600 }],
    source: 'CP: EPP of 20 kg/m³, 20 g/m² per mm; weigh yours',
  },
  ply2: {
    id: 'ply-2',
    kind: 'ply',
    thicknessMm: 2,
    arealMassGm2: 1300,
    facesGm2: 0,
    grain: 'alongWidth',
    sheets: [{ wMm: 300, hMm: 200 }],
    source: 'M: birch ply 2 mm; weigh yours',
  },
} satisfies Record<string, Material>;

const carbon = (outer: number, inner: number, massPerMetreG: number): Tube => ({
  id: `carbon-${outer}-${inner}`,
  kind: 'tube',
  outerMm: [outer, outer],
  innerMm: [inner, inner],
  massPerMetreG,
  stockLengthMm: 1000,
  eGpa: 110,
});

/** Pultruded carbon tubes (CP; modulus 100 to 120 GPa). */
export const TUBES = {
  carbon42: carbon(4, 2, 15),
  carbon53: carbon(5, 3, 20),
  carbon64: carbon(6, 4, 25),
  carbon86: carbon(8, 6, 35),
} as const;

/** Coverings by mass per area and face. */
export const COVERINGS = {
  glass25: cp(65, 'g/m²', 'glass cloth of 25 g/m² with its resin'),
  paint: cp(30, 'g/m²', 'one coat of paint, 20 to 40'),
  film: cp(50, 'g/m²', 'film or tape'),
} as const;

export const GLUE_G_PER_M = {
  hotMelt: cp(8, 'g/m', 'hot melt along a joint'),
  polyurethane: cp(3, 'g/m', 'polyurethane or white glue along a joint'),
  tape48: cp(2.5, 'g/m', 'clear tape 48 mm wide'),
} as const;

export const KERF_MM = {
  hand: cp(0.1, 'mm', 'knife'),
  dragKnife: cp(0.1, 'mm', 'knife'),
  hotWire: cp(1, 'mm', 'hot wire'),
  laser: cp(0.2, 'mm', 'laser'),
} as const;

export const CUTTING = {
  slotClearance: cp(0.2, 'mm', 'on the measured thickness: board crushes'),
  partSpacing: cp(4, 'mm', 'between parts on a sheet'),
  sheetMargin: cp(5, 'mm', 'edges of sheets are crushed'),
  hingeEndGap: cp(1.5, 'mm', 'clearance at each end of a control'),
  bevelOverThrow: cp(12, '°', 'bevel beyond the throw towards it; at least 10'),
} as const;

export const STATIC_MARGIN_PCT = {
  trainer: cp([10, 18] as const, '% MAC', 'slow to answer, hard to upset'),
  sport: cp([7, 12] as const, '% MAC', 'quicker'),
  tailless: cp([5, 10] as const, '% MAC', 'reflex costs lift, so less is wanted'),
} as const;

export const TAIL_VOLUMES = {
  horizontal: cp([0.45, 0.6] as const, '', 'trainer'),
  vertical: cp([0.035, 0.05] as const, '', 'trainer'),
} as const;

export const ANGLES = {
  decalageFolded: cp([1.5, 2.5] as const, '°', 'folded cambered wing'),
  decalageFlat: cp([0, 1] as const, '°', 'flat wing'),
  dihedralWithAilerons: cp(2, '°', 'a side'),
  dihedralWithout: cp(6, '°', 'a side, without ailerons'),
  reflex: cp(-2.5, '°', 'elevons 2 to 3 up'),
  tractorThrust: cp([2, 2] as const, '°', 'high wing: down and right, propeller clockwise seen from behind'),
  pusherThrust: cp([0, 0] as const, '°', 'through the CG in side view, then trim'),
} as const;

/** Full throws each way; `low` is the share of them on low rate. */
export const THROWS_DEG = {
  elevator: cp({ up: 12, down: 12, low: 0.67 } as const, '°', 'trainer'),
  aileron: cp({ up: 15, down: 10, low: 0.67 } as const, '°', 'trainer, down less: differential'),
  rudder: cp({ up: 25, down: 25, low: 0.6 } as const, '°', 'trainer'),
  elevon: cp({ up: 14, down: 14, low: 0.67 } as const, '°', 'pitch and roll together under 28'),
} as const;

export const RADIO = {
  differential: cp(0.4, '', 'ailerons: down less'),
  expoLow: cp(0.25, '', 'softer at the centre, low rate'),
  expoHigh: cp(0.35, '', 'softer at the centre, high rate'),
  lowRate: cp(0.67, '', 'share of the full throw'),
} as const;

export const LINKAGE = {
  hornMm: cp(14, 'mm', '12 to 16'),
  armMm: cp(8, 'mm', '7 to 10'),
  rodMm: cp(1.2, 'mm', 'free up to 150 mm; beyond it a guided rod or 2 to 3 mm carbon'),
  freeRodMm: cp(150, 'mm', 'longest free run of 1.2 mm wire'),
} as const;

export const LAUNCH = {
  handSpeedMs: cp(8, 'm/s', 'speed of a throw'),
  loadFactor: m(5, 'g', 'pull-out of a light foam aircraft'),
} as const;
