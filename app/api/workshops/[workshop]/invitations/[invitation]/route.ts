import { revokeInvitation } from '@/server/acts/revokeInvitation';
import { done } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';

export const DELETE = inWorkshop('DELETE /api/workshops/[workshop]/invitations/[invitation]', async (call) => {
  await revokeInvitation(call.context, call.member, call.params.invitation);
  return done();
});
