import { CreateComment } from '@/lib/contract/bodies';
import { createComment } from '@/server/acts/createComment';
import { placeOf } from '@/server/acts/revisions';
import { inWorkshop } from '@/server/http/endpoint';

export const POST = inWorkshop(
  'POST /api/workshops/[workshop]/designs/[design]/revisions/[number]/threads/[thread]/comments',
  async (call) => {
    const body = await call.read(CreateComment);
    return call.create(
      (context) => createComment(context, call.member, placeOf(call.params), call.params.thread, body),
      (made) => `${call.url.pathname}/${made.id}`,
    );
  },
);
