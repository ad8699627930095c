import { designsOf } from '@/db/queries/designs';
import { CreateDesign } from '@/lib/contract/bodies';
import { createDesign } from '@/server/acts/createDesign';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { DOCUMENT_MAX_KB } from '@/server/http/readJson';

export const GET = inWorkshop('GET /api/workshops/[workshop]/designs', async ({ db, member }) =>
  ok(await designsOf(db, member.workshopId)),
);

export const POST = inWorkshop('POST /api/workshops/[workshop]/designs', async (call) => {
  const body = await call.read(CreateDesign, DOCUMENT_MAX_KB);
  return call.create(
    (context) => createDesign(context, call.member, body),
    (made) => `/api/workshops/${call.member.workshopId}/designs/${made.id}`,
  );
});
