import { SetThreadState } from '@/lib/contract/bodies';
import { placeOf } from '@/server/acts/revisions';
import { setThreadState } from '@/server/acts/setThreadState';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';

export const PATCH = inWorkshop(
  'PATCH /api/workshops/[workshop]/designs/[design]/revisions/[number]/threads/[thread]',
  async (call) => {
    const body = await call.read(SetThreadState);
    return ok(await setThreadState(call.context, call.member, placeOf(call.params), call.params.thread, body));
  },
);
