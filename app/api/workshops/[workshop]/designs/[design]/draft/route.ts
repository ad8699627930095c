import { SaveDraft } from '@/lib/contract/bodies';
import { saveDraft } from '@/server/acts/saveDraft';
import { ok } from '@/server/http/answers';
import { baseVersionOf, draftEtag, versionEtag } from '@/server/http/draftVersion';
import { inWorkshop } from '@/server/http/endpoint';
import { DOCUMENT_MAX_KB } from '@/server/http/readJson';
import { draftIn } from '@/server/read/designs';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/draft',
  async ({ db, member, params }) => {
    const draft = await draftIn(db, member, params.design);
    return ok(draft, draftEtag(draft));
  },
);

export const PUT = inWorkshop('PUT /api/workshops/[workshop]/designs/[design]/draft', async (call) => {
  const base = baseVersionOf(call.request.headers);
  const body = await call.read(SaveDraft, DOCUMENT_MAX_KB);
  const saved = await saveDraft(call.context, call.member, call.params.design, base, body);
  return ok(saved, versionEtag(saved.version));
});
