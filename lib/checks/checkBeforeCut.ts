import { contextOf } from './context';
import { aerialRule } from './rules/aerials';
import { boxRules } from './rules/boxes';
import { coolingRules } from './rules/cooling';
import { fanRules } from './rules/fan';
import { groundRules } from './rules/ground';
import { hingeRule } from './rules/hinge';
import { holdRule } from './rules/hold';
import { motorRules } from './rules/motor';
import { noteRules } from './rules/notes';
import { packHatchRule } from './rules/packHatch';
import { packSlideRule } from './rules/packSlide';
import { propellerRules } from './rules/propeller';
import { sparRules } from './rules/spars';
import type { CheckInput, CheckResult } from './types';

const RULES = [
  propellerRules,
  groundRules,
  boxRules,
  packHatchRule,
  packSlideRule,
  motorRules,
  coolingRules,
  fanRules,
  aerialRule,
  hingeRule,
  sparRules,
  holdRule,
  noteRules,
] as const;

/**
 * The clearance and access rules of the trade over a resolved airframe and its parts, in a fixed order: what is kept and what is not,
 * each with its numbers and its place. A rule that does not concern the aircraft, or needs a figure that is not given, says nothing.
 */
export function checkBeforeCut(input: CheckInput): CheckResult[] {
  const context = contextOf(input);
  return RULES.flatMap((rule) => rule(context));
}
