import type { Vec3 } from '@/lib/numerics/vec';
import type { Control, Panel, Surface } from './schema/surface';

// The document worked out to places in the aircraft's axes: what the lattice, the parts, the balance and the board all start from.

/** A chordwise cut through a surface, starboard side. */
export interface Section {
  /** Length from the root along the panels, mm. */
  readonly lengthMm: number;
  /** `lengthMm` as a share of the surface's whole length. */
  readonly station: number;
  readonly le: Vec3;
  readonly te: Vec3;
  readonly chordMm: number;
  /** Incidence here: the surface's, less the washout gathered from the root. */
  readonly incidenceDeg: number;
}

export interface ResolvedPanel {
  readonly panel: Panel;
  readonly index: number;
  readonly root: Section;
  readonly tip: Section;
  /** Roll of the panel about the x axis, from flat (0) to upright (90): cant plus dihedral. */
  readonly rollDeg: number;
}

export interface ResolvedSurface {
  readonly surface: Surface;
  /** Index in the document, for paths in problems. */
  readonly index: number;
  readonly lengthMm: number;
  readonly panels: readonly ResolvedPanel[];
}

export interface ResolvedControl {
  readonly control: Control;
  readonly surfaceId: string;
  readonly inner: Section;
  readonly outer: Section;
  readonly hingeInner: Vec3;
  readonly hingeOuter: Vec3;
}

/** A mass-bearing or drawn thing that is not a surface: where its reference point stands. */
export interface ResolvedPlace {
  readonly elementId: string;
  readonly at: Vec3;
}

export interface ResolvedBoom {
  readonly boomId: string;
  readonly fore: Vec3;
  readonly aft: Vec3;
}

export interface ResolvedAirframe {
  readonly surfaces: readonly ResolvedSurface[];
  readonly controls: readonly ResolvedControl[];
  readonly booms: readonly ResolvedBoom[];
  /** Origin of every element in the document (bodies, drives, items, gear, surfaces' root LE, booms' fore end), by id. */
  readonly places: ReadonlyMap<string, ResolvedPlace>;
}
