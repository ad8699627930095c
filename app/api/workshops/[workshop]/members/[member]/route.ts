import { SetRoles } from '@/lib/contract/bodies';
import { removeMember } from '@/server/acts/removeMember';
import { setRoles } from '@/server/acts/setRoles';
import { done, ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';

export const PATCH = inWorkshop('PATCH /api/workshops/[workshop]/members/[member]', async (call) =>
  ok(await setRoles(call.context, call.member, call.params.member, await call.read(SetRoles))),
);

export const DELETE = inWorkshop('DELETE /api/workshops/[workshop]/members/[member]', async (call) => {
  await removeMember(call.context, call.member, call.params.member);
  return done();
});
