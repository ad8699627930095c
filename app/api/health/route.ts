import { sql } from 'drizzle-orm';
import { connection } from 'next/server';
import { getDb } from '@/db/client';
import { texts } from '@/lib/text/en/server';
import { asAppError, problemResponse } from '@/server/http/refuse';
import { AppError } from '@/server/problems';

const PATH = '/api/health';

/** 200 when the pages and the database both answer, otherwise a problem. For the start script and for whoever watches the server. */
export async function GET(): Promise<Response> {
  await connection();
  try {
    const db = await getDb();
    await db.execute(sql`select 1`);
    return Response.json({ status: 'ok' }, { headers: { 'cache-control': 'no-store' } });
  } catch (error) {
    const { kind } = asAppError(error, `GET ${PATH}`);
    const busy = new AppError(kind === 'no-room' ? kind : 'busy', texts.details.busy, { retryAfterSeconds: 2 });
    return problemResponse(busy, PATH);
  }
}
