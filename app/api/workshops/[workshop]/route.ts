import { RenameWorkshop } from '@/lib/contract/bodies';
import { renameWorkshop } from '@/server/acts/renameWorkshop';
import { ok } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { summaryOf } from '@/server/read/workshops';

export const GET = inWorkshop('GET /api/workshops/[workshop]', async ({ db, member }) =>
  ok(await summaryOf(db, member)),
);

export const PATCH = inWorkshop('PATCH /api/workshops/[workshop]', async (call) =>
  ok(await renameWorkshop(call.context, call.member, await call.read(RenameWorkshop))),
);
