import { ReleaseRevision } from '@/lib/contract/bodies';
import { releaseRevision } from '@/server/acts/releaseRevision';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionsIn } from '@/server/read/revisions';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions',
  async ({ db, member, params }) => ok(await revisionsIn(db, member, params.design)),
);

export const POST = inWorkshop('POST /api/workshops/[workshop]/designs/[design]/revisions', async (call) => {
  const body = await call.read(ReleaseRevision);
  return call.create(
    (context) => releaseRevision(context, call.member, call.params.design, body),
    (made) => `${call.url.pathname}/${made.number}`,
  );
});
