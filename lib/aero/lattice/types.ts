import type { Vec3 } from '@/lib/numerics/vec';

// What goes into the vortex lattice: plain data, so that a published planform can be fed in as it is printed.
// Axes: x aft, y to starboard, z up; any one unit of length throughout. Angles in radians.

/** A change in the slope of a mean line, as seen from the leading edge: dz/dx, positive when the line turns up. */
export interface Kink {
  /** Share of the chord. */
  readonly at: number;
  readonly slope: number;
}

/** Camber as the lattice takes it: the line midway between the faces as straight stretches. Empty for a flat plate. */
export type MeanLine = readonly Kink[];

/** A chordwise cut of a surface. The lattice lies along x from `le`; incidence and camber turn the normals only. */
export interface LatticeSection {
  readonly le: Vec3;
  readonly chord: number;
  /** Leading edge up is positive. */
  readonly incidenceRad: number;
  readonly meanLine?: MeanLine;
}

export interface LatticeSurface {
  readonly id: string;
  /** Root to tip, at least two. */
  readonly sections: readonly LatticeSection[];
  /** True: this is the starboard one of a pair. False: it stands on the centre plane. */
  readonly mirrored: boolean;
  /** Strips wanted from root to tip. */
  readonly strips: number;
  /** Panels along the chord. */
  readonly rows: number;
}

/** A part of a surface, aft of a hinge line, that turns trailing edge down (fins: to starboard) by a unit angle. */
export interface LatticeControl {
  readonly id: string;
  readonly surfaceId: string;
  /** Ends as a share of the surface's length from root to tip. */
  readonly from: number;
  readonly to: number;
  /** Chord of the control as a share of the local chord at its inner and outer end. */
  readonly chordShare: readonly [inner: number, outer: number];
}

/** What the coefficients are made dimensionless with, and the point that moments are taken about. */
export interface LatticeReference {
  readonly area: number;
  /** For pitching moments and the pitch rate. */
  readonly chord: number;
  /** For rolling and yawing moments and their rates. */
  readonly span: number;
  readonly point: Vec3;
}

export interface LatticeOptions {
  /**
   * The lattice ends this share of a strip inside each free tip. P. E. Hough, "Remarks on vortex-lattice methods",
   * Journal of Aircraft 10 (1973): a quarter.
   */
  readonly tipInset: number;
  /** Radius of the core of a trailing leg, in strip widths, as a surface feels it that does not meet the leg's at an angle. Own tests: 0.15, with
   * what the leg does taken as the mean over the strip it passes. */
  readonly coreShare: number;
  /** Normals whose product is larger count as nearly parallel. */
  readonly parallel: number;
  /** Begin a strip where another surface stands. Without it the leg from that surface's root passes beside control points. */
  readonly alignJunctions: boolean;
}

export const LATTICE_DEFAULTS: LatticeOptions = {
  tipInset: 0.25,
  coreShare: 0.15,
  parallel: 0.7,
  alignJunctions: true,
};

/** What is solved: geometry and controls. What coefficients are measured by comes later, and costs nothing to change. */
export interface LatticeProblem {
  readonly surfaces: readonly LatticeSurface[];
  readonly controls: readonly LatticeControl[];
  readonly options?: Partial<LatticeOptions>;
}

export interface LatticeInput extends LatticeProblem {
  readonly reference: LatticeReference;
}

/**
 * The lattice itself in flat arrays. Surfaces that are mirrored come first, so that the symmetric problem, in which
 * surfaces on the centre plane carry nothing, is the leading part of the antisymmetric one.
 */
export interface Lattice {
  readonly options: LatticeOptions;
  readonly surfaces: readonly LaidSurface[];
  /** Panels of mirrored surfaces. */
  readonly mirroredCount: number;
  /** All panels. */
  readonly count: number;
  /** Control points and normals, three numbers a panel. */
  readonly points: Float64Array;
  readonly normals: Float64Array;
  /** Corners of the vortices: x by edge and row, y and z by edge. Edges of a surface follow each other. */
  readonly edgeY: Float64Array;
  readonly edgeZ: Float64Array;
  readonly cornerX: Float64Array;
}

/** A surface, or a run of one between steps in its chord. */
export interface LaidSurface {
  readonly input: LatticeSurface;
  readonly rows: number;
  readonly strips: readonly LaidStrip[];
  readonly firstPanel: number;
  readonly firstEdge: number;
  readonly firstCorner: number;
  /** Surfaces that continue each other share a family: there is no leg core between them. */
  readonly family: number;
  /** Number of the surface among all, and those of the surfaces that it meets. */
  readonly index: number;
  readonly touches: ReadonlySet<number>;
}

export interface LaidStrip {
  /** Shares of the surface's length, tip inset taken off. */
  readonly from: number;
  readonly to: number;
  /** Length in the front view. */
  readonly width: number;
  /** Unit normal of the flat strip in the front view: (0, ny, nz). */
  readonly ny: number;
  readonly nz: number;
  readonly inner: LatticeSection;
  readonly outer: LatticeSection;
}
