import { CreateThread } from '@/lib/contract/bodies';
import { createThread } from '@/server/acts/createThread';
import { placeOf } from '@/server/acts/revisions';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { threadsIn } from '@/server/read/revisions';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]/threads',
  async ({ db, member, params }) => ok(await threadsIn(db, member, params.design, revisionNumber(params.number))),
);

export const POST = inWorkshop(
  'POST /api/workshops/[workshop]/designs/[design]/revisions/[number]/threads',
  async (call) => {
    const body = await call.read(CreateThread);
    return call.create(
      (context) => createThread(context, call.member, placeOf(call.params), body),
      (made) => `${call.url.pathname}/${made.id}`,
    );
  },
);
