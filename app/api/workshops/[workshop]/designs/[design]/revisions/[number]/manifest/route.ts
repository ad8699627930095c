import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { paperOf, revisionPlan } from '@/server/plans';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]/manifest',
  async (call) => {
    const paper = paperOf(call.url);
    const { design, number } = call.params;
    const plan = await revisionPlan(call.context, call.member, design, revisionNumber(number), paper);
    return ok(plan.manifest);
  },
);
