import { resolve } from '@/lib/airframe/resolve';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import { develop } from '@/lib/parts/develop';
import { checkBeforeCut } from '../checkBeforeCut';
import type { CheckFigures, CheckResult, RuleId } from '../types';

/** Every result for a document. Throws RangeError when it does not resolve. */
export function allChecked(airframe: Airframe, figures?: CheckFigures): CheckResult[] {
  const resolved = resolve(airframe);
  if (!resolved.ok) throw new RangeError(resolved.problems[0]?.message ?? 'does not resolve');
  return checkBeforeCut({
    airframe,
    resolved: resolved.value,
    development: develop(airframe),
    ...(figures ? { figures } : {}),
  });
}

/** One rule's result, at one element where several have it. Throws RangeError when the rule says nothing there. */
export function checked(airframe: Airframe, ruleId: RuleId, figures?: CheckFigures, elementId?: string): CheckResult {
  const found = allChecked(airframe, figures).find(
    (one) => one.ruleId === ruleId && (elementId === undefined || one.elementId === elementId),
  );
  if (!found) throw new RangeError(`${ruleId} says nothing`);
  return found;
}

/** Whether a rule says anything at all. */
export const speaks = (airframe: Airframe, ruleId: RuleId, figures?: CheckFigures): boolean =>
  allChecked(airframe, figures).some((one) => one.ruleId === ruleId);
