import { logPrint } from '@/server/acts/logPrint';
import { fileResponse } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { paperOf, revisionPlan } from '@/server/plans';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]/plan',
  async (call) => {
    const paper = paperOf(call.url);
    const { design, number } = call.params;
    const plan = await revisionPlan(call.context, call.member, design, revisionNumber(number), paper);
    await logPrint(call.context, call.member, paper, plan);
    return fileResponse({ bytes: plan.pdf, type: 'application/pdf', name: `${plan.name}.pdf` });
  },
);
