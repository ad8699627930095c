import { workshopsOf } from '@/db/queries/members';
import { CreateWorkshop } from '@/lib/contract/bodies';
import { createWorkshop } from '@/server/acts/createWorkshop';
import { ok } from '@/server/http/answers';
import { signedIn } from '@/server/http/endpoint';

export const GET = signedIn('GET /api/workshops', async ({ db, who }) => ok(await workshopsOf(db, who.userId)));

export const POST = signedIn('POST /api/workshops', async (call) => {
  const body = await call.read(CreateWorkshop);
  return call.create(
    (context) => createWorkshop(context, body),
    (made) => `/api/workshops/${made.id}`,
  );
});
