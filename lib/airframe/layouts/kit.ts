import { ANGLES, CUTTING, GLUE_G_PER_M, KERF_MM, LAUNCH, RADIO, THROWS_DEG } from '../defaults';
import type { Airframe } from '../schema/airframe';
import type { Mount } from '../schema/common';
import type { Item } from '../schema/equipment';
import { AIRFRAME_FORMAT, AIRFRAME_VERSION } from '../schema/limits';
import type { Build } from '../schema/stock';
import type { Control, Panel, Surface } from '../schema/surface';

// Pieces that every starting layout is put together from, with the defaults filled in.

/** A document without anything in it yet; layouts lay theirs over it. */
export function blank(name: string): Omit<Airframe, 'materials' | 'surfaces' | 'flight'> {
  return {
    format: AIRFRAME_FORMAT,
    version: AIRFRAME_VERSION,
    name,
    tubes: [],
    coverings: [],
    bodies: [],
    booms: [],
    drives: [],
    items: [],
    gear: [],
    joints: [],
    radio: { lowRate: RADIO.lowRate.value, expo: RADIO.expoLow.value, roles: [] },
    build: handBuild(),
  };
}

const handBuild = (): Build => ({
  cutter: 'hand',
  kerfMm: KERF_MM.hand.value,
  slotClearanceMm: CUTTING.slotClearance.value,
  glueGPerM: GLUE_G_PER_M.hotMelt.value,
  glueGm2: 30,
  tapeGm2: 50,
});

export const datum = (x: number, y: number, z: number): Mount => ({ to: 'datum', at: [x, y, z] });

interface PanelSize {
  readonly length: number;
  readonly root: number;
  readonly tip: number;
  readonly sweepDeg: number;
  readonly dihedralDeg?: number;
}

/** One flat panel of a sheet. */
export const flatPanel = (id: string, materialId: string, size: PanelSize): Panel => ({
  id,
  lengthMm: size.length,
  rootChordMm: size.root,
  tipChordMm: size.tip,
  sweepDeg: size.sweepDeg,
  dihedralDeg: size.dihedralDeg ?? 0,
  washoutDeg: 0,
  materialId,
  section: { kind: 'flat' },
  joint: 'bevel',
});

/** A surface of one or more panels with square tips. */
export const flatSurface = (
  surface: Pick<Surface, 'id' | 'name' | 'role' | 'mount' | 'mirrored' | 'panels'> & Partial<Surface>,
): Surface => ({
  incidenceDeg: 0,
  cantDeg: 0,
  tip: { shape: 'square' },
  cutouts: [],
  ribs: [],
  spars: [],
  controls: [],
  ...surface,
});

const MIXES = {
  aileron: { pitch: 0, roll: 1, yaw: 0, flap: 0 },
  elevator: { pitch: 1, roll: 0, yaw: 0, flap: 0 },
  rudder: { pitch: 0, roll: 0, yaw: 1, flap: 0 },
  elevon: { pitch: 1, roll: 1, yaw: 0, flap: 0 },
} as const;

/** A hinged control with the default throws of its kind, a paper hinge above and the bevel below. */
export function hinged(
  kind: keyof typeof MIXES,
  from: number,
  to: number,
  chordShare: readonly [number, number],
): Control {
  const { up, down, low } = THROWS_DEG[kind].value;
  return {
    id: kind,
    kind,
    from,
    to,
    chordShare: [chordShare[0], chordShare[1]],
    endGapMm: CUTTING.hingeEndGap.value,
    neutralDeg: kind === 'elevon' ? ANGLES.reflex.value : 0,
    hinge: { kind: 'paper', side: 'upper', bevelDeg: [0, Math.max(up, down) + CUTTING.bevelOverThrow.value] },
    throwsDeg: { up, down, lowShare: low },
    differential: kind === 'aileron' ? RADIO.differential.value : 0,
    mix: { ...MIXES[kind] },
  };
}

/** A straight spar let into the lower face, from the root outward. */
export const faceSpar = (
  tubeId: string,
  chordShare: readonly [number, number],
  to: number,
): Surface['spars'][number] => ({
  id: 'spar',
  tubeId,
  chordShare: [chordShare[0], chordShare[1]],
  from: 0,
  to,
  let: 'face',
  face: 'lower',
});

type Sized = readonly [massG: number, sizeMm: readonly [number, number, number]];

const item = (
  id: string,
  kind: Item['kind'],
  [massG, [l, w, h]]: Sized,
  mount: Mount,
  rest: Partial<Item> = {},
): Item => ({
  id,
  kind,
  massG,
  sizeMm: [l, w, h],
  mount,
  ...rest,
});

export const pack = (size: Sized, mount: Mount, slide: Item['slide'], spec: string): Item =>
  item('pack', 'pack', size, mount, { name: 'Pack', slide, spec });
export const controller = (size: Sized, mount: Mount, spec: string): Item =>
  item('esc', 'controller', size, mount, { name: 'Speed controller', spec });
export const receiver = (mount: Mount): Item => item('rx', 'receiver', [8, [40, 22, 12]], mount, { name: 'Receiver' });
export const servo = (id: string, name: string, mount: Mount, massG = 9): Item =>
  item(id, 'servo', [massG, [23, 12, 24]], mount, { name });
export const hardware = (id: string, name: string, size: Sized, mount: Mount): Item =>
  item(id, 'hardware', size, mount, { name });

/** Flight settings at sea level. */
export const atSeaLevel = (
  cruiseMs: number,
  staticMarginPct: readonly [number, number],
  launch: Airframe['flight']['launch'],
): Airframe['flight'] => ({
  altitudeM: 0,
  temperatureOffsetC: 0,
  cruiseMs,
  staticMarginPct: [staticMarginPct[0], staticMarginPct[1]],
  loadFactor: LAUNCH.loadFactor.value,
  launch,
});
