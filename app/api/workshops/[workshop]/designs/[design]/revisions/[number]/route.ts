import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { revisionAnswer } from '@/server/read/revisions';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]',
  async ({ db, member, params }) => ok(await revisionAnswer(db, member, params.design, revisionNumber(params.number))),
);
