import { openInvitations } from '@/db/queries/members';
import { CreateInvitation } from '@/lib/contract/bodies';
import { createInvitation } from '@/server/acts/createInvitation';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { deliverSoon } from '@/server/mail';

export const GET = inWorkshop('GET /api/workshops/[workshop]/invitations', async ({ db, member, context }) =>
  ok(await openInvitations(db, member.workshopId, context.now)),
);

export const POST = inWorkshop('POST /api/workshops/[workshop]/invitations', async (call) => {
  const body = await call.read(CreateInvitation);
  const answer = await call.create(
    (context) => createInvitation(context, call.member, body),
    (made) => `/api/workshops/${call.member.workshopId}/invitations/${made.id}`,
  );
  deliverSoon(call.db, call.context.now);
  return answer;
});
