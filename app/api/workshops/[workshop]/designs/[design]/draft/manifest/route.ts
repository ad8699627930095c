import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { draftPlan, paperOf } from '@/server/plans';

export const GET = inWorkshop('GET /api/workshops/[workshop]/designs/[design]/draft/manifest', async (call) => {
  const paper = paperOf(call.url);
  const plan = await draftPlan(call.context, call.member, call.params.design, paper);
  return ok(plan.manifest);
});
