import { logPrint } from '@/server/acts/logPrint';
import { fileResponse } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { draftPlan, paperOf } from '@/server/plans';

export const GET = inWorkshop('GET /api/workshops/[workshop]/designs/[design]/draft/plan', async (call) => {
  const paper = paperOf(call.url);
  const plan = await draftPlan(call.context, call.member, call.params.design, paper);
  await logPrint(call.context, call.member, paper, plan);
  return fileResponse({ bytes: plan.pdf, type: 'application/pdf', name: `${plan.name}.pdf` });
});
