import { fileResponse } from '@/server/http/answers';
import { inWorkshop } from '@/server/http/endpoint';
import { revisionNumber } from '@/server/ids';
import { exportIn } from '@/server/read/revisions';

export const GET = inWorkshop(
  'GET /api/workshops/[workshop]/designs/[design]/revisions/[number]/export',
  async ({ db, member, params }) => {
    const file = await exportIn(db, member, params.design, revisionNumber(params.number));
    const { design, number } = file.revision;
    const bytes = `${JSON.stringify(file, null, 2)}\n`;
    return fileResponse({ bytes, type: 'application/json; charset=utf-8', name: `${design} revision ${number}.json` });
  },
);
