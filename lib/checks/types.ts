import type { ResolvedAirframe } from '@/lib/airframe/resolved';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { Vec3 } from '@/lib/numerics/vec';
import type { Development } from '@/lib/parts/types';
import type { texts } from '@/lib/text/en/checks';
import type { Quantity } from '@/lib/units/quantity';

/** Stable: a waiver names it. */
export type RuleId = keyof typeof texts.rules;

/** "note" is for the builder to decide; it is neither kept nor broken. */
export type CheckLevel = 'ok' | 'watch' | 'bad' | 'note';

/** What was measured against what, in the quantity's own unit. */
export interface Measured {
  readonly value: number;
  readonly quantity: Quantity;
  readonly least?: number;
  readonly most?: number;
}

/** One rule at one element. A rule says the worst it found there, so rule and element name one result. */
export interface CheckResult {
  readonly ruleId: RuleId;
  readonly elementId: string;
  /** In the document, with dots: "drives.0", "surfaces.0.spars.1". */
  readonly path: string;
  /** Where to pin it, aircraft axes, mm. */
  readonly at: Vec3;
  readonly level: CheckLevel;
  readonly title: string;
  /** What was found, with its numbers and the limit. */
  readonly words: string;
  readonly measured: Measured | null;
  /** What to do; null where nothing has to be done. */
  readonly fix: string | null;
  readonly source: string;
  /** A person may let it pass with a reason. */
  readonly waivable: boolean;
  /** Why it was let pass; null when it was not. */
  readonly waived: string | null;
}

/** A rule that a person lets pass at one element, and why. */
export interface Waiver {
  readonly ruleId: string;
  readonly elementId: string;
  readonly reason: string;
}

/** What is taken from the figures, as plain numbers; a rule that needs one that is missing says nothing. */
export interface CheckFigures {
  readonly cg?: Vec3;
  /** How far the packs go for the first flight's CG, mm, aft positive. */
  readonly packFirstFlightMm?: number;
  /** Share of the servo's stall torque that full throw takes at twice the highest level speed, %. */
  readonly hingeTorquePct?: number;
}

export interface CheckInput {
  readonly airframe: Airframe;
  readonly resolved: ResolvedAirframe;
  readonly development: Development;
  readonly figures?: CheckFigures;
}
