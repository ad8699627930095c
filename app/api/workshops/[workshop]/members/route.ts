import { membersOf } from '@/db/queries/members';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';

export const GET = inWorkshop('GET /api/workshops/[workshop]/members', async ({ db, member }) =>
  ok(await membersOf(db, member.workshopId)),
);
