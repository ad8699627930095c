import type { AntisymmetricEffect, SymmetricEffect } from './lattice/coefficients';
import type { LatticeReference } from './lattice/types';

export type { AntisymmetricEffect, SymmetricEffect } from './lattice/coefficients';

/** Antisymmetric derivatives at one flight state: per radian, rates per p b / 2V and r b / 2V, in stability axes. */
export interface LateralDerivatives {
  readonly beta: AntisymmetricEffect;
  readonly rollRate: AntisymmetricEffect;
  readonly yawRate: AntisymmetricEffect;
  /** Starboard trailing edge down and port up; fins on the centre plane, trailing edge to starboard. */
  readonly controls: ReadonlyMap<string, AntisymmetricEffect>;
}

/** One thing that the model adds up, as the reader of a figure may want to know it apart. */
export interface Contribution {
  readonly name: 'surfaces' | 'bodies' | 'propellers';
  /** Lift and nose-up moment about the reference point, per radian of angle of attack. */
  readonly alpha: SymmetricEffect;
  /** Side force, roll and yaw per radian of sideslip. */
  readonly beta: AntisymmetricEffect;
}

/** A state of symmetric flight: angle of attack, and deflections of controls by key, trailing edge down. */
export interface SymmetricState {
  readonly alphaRad: number;
  readonly deflectionsRad: ReadonlyMap<string, number>;
}

/**
 * Aerodynamics of the whole aircraft, linear about the stream along x, moments about the reference point (the CG): what lattice, body
 * correction and propeller force come to together. Per radian; pitch rate per q c / 2V.
 */
export interface AeroModel {
  /** Area mm2, chord and span mm, point mm. */
  readonly reference: LatticeReference;
  /** At no angle of attack and controls at zero deflection: incidence, washout and camber. */
  readonly base: SymmetricEffect;
  readonly alpha: SymmetricEffect;
  readonly pitchRate: SymmetricEffect;
  /** By key surface/control, both sides trailing edge down. */
  readonly controls: ReadonlyMap<string, SymmetricEffect>;
  /** Where the lift due to angle of attack acts, x in mm. */
  readonly neutralPointX: number;
  /** What it is made of; power off. */
  readonly contributions: readonly Contribution[];
  /** Derivatives in roll and yaw at an angle of attack: those that grow with lift are in them. */
  readonly lateral: (state: SymmetricState) => LateralDerivatives;
  /** Induced drag coefficient by the far field (Trefftz plane). */
  readonly inducedDrag: (state: SymmetricState) => number;
  /** CL^2 / (pi A CDi) of the load that angle of attack alone gives. */
  readonly spanEfficiency: number;
}
