import type { CheckResult, Waiver } from './types';

const same = (result: CheckResult, { ruleId, elementId }: Waiver): boolean =>
  result.ruleId === ruleId && result.elementId === elementId;

/**
 * Marks what somebody lets pass, with the reason. The finding stays as it was measured. What is kept needs no waiver and gets none; a
 * waiver that names nothing here, or gives no reason, changes nothing. Of several for one place the last counts.
 */
export function applyWaivers(results: readonly CheckResult[], waivers: readonly Waiver[]): CheckResult[] {
  return results.map((result) => {
    const reason = waivers.findLast((waiver) => same(result, waiver))?.reason.trim();
    return result.waivable && reason ? { ...result, waived: reason } : result;
  });
}
