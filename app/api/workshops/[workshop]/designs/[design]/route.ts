import { RenameDesign } from '@/lib/contract/bodies';
import { archiveDesign } from '@/server/acts/archiveDesign';
import { renameDesign } from '@/server/acts/renameDesign';
import { done, ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { summaryIn } from '@/server/read/designs';

export const GET = inWorkshop('GET /api/workshops/[workshop]/designs/[design]', async ({ db, member, params }) =>
  ok(await summaryIn(db, member, params.design)),
);

export const PATCH = inWorkshop('PATCH /api/workshops/[workshop]/designs/[design]', async (call) =>
  ok(await renameDesign(call.context, call.member, call.params.design, await call.read(RenameDesign))),
);

export const DELETE = inWorkshop('DELETE /api/workshops/[workshop]/designs/[design]', async (call) => {
  await archiveDesign(call.context, call.member, call.params.design);
  return done();
});
