import { GiveVerdict } from '@/lib/contract/bodies';
import { giveVerdict } from '@/server/acts/giveVerdict';
import { placeOf } from '@/server/acts/revisions';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { verdictsIn } from '@/server/read/revisions';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]/verdicts',
  async ({ db, member, params }) => ok(await verdictsIn(db, member, params.design, revisionNumber(params.number))),
);

export const POST = inWorkshop(
  'POST /api/workshops/[workshop]/designs/[design]/revisions/[number]/verdicts',
  async (call) => {
    const body = await call.read(GiveVerdict);
    return call.create(
      (context) => giveVerdict(context, call.member, placeOf(call.params), body),
      (made) => `${call.url.pathname}/${made.id}`,
    );
  },
);
