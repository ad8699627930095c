import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { printLog } from '@/db/schema';
import { runEngine } from '@/server/engine';
import { sha256 } from '@/server/ids';
import type { RouteKey } from '@/server/routes';
import { pusher } from '../support/airframes';
import { requestTo } from '../support/api';
import { testDb } from '../support/db';
import { fillPath, handlersOnDisk, type RouteHandler } from '../support/routes';
import { type StagedWorkshop, stagedWorkshop } from '../support/stage';

vi.mock('@/db/client', () => ({ getDb: () => testDb() }));

const run = promisify(execFile);
const CLI = path.resolve(import.meta.dirname, '../../scripts/cli.mjs');
const D = '/api/workshops/[workshop]/designs/[design]';
const R = `${D}/revisions/[number]` as const;

let handlers: Map<string, RouteHandler>;
let stage: StagedWorkshop;
let folder: string;

/** Prints a file with the command line; it bundles itself first when its sources are newer. */
async function sheets(name: string, contents: string): Promise<{ pdf: Buffer; manifest: unknown }> {
  const file = path.join(folder, `${name}.json`);
  const out = path.join(folder, name);
  await writeFile(file, contents);
  await run(process.execPath, [CLI, 'sheets', file, '--paper', 'a4', '--out', out]);
  const manifest: unknown = JSON.parse(await readFile(path.join(out, 'manifest.json'), 'utf8'));
  return { pdf: await readFile(path.join(out, 'plan.pdf')), manifest };
}

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'foldspar-plan-'));
  // The server forks the bundle that this leaves behind.
  await sheets('bundled', JSON.stringify(pusher()));
  handlers = await handlersOnDisk();
  stage = await stagedWorkshop(await testDb(), 'Print');
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function get(key: RouteKey, query = ''): Promise<Response> {
  const handler = handlers.get(key);
  if (handler === undefined) throw new RangeError(`no handler for ${key}`);
  const params = { ...stage.ids };
  const request = requestTo(`${fillPath(key.split(' ')[1] ?? '', params)}${query}`, { cookie: stage.builder.cookie });
  return handler(request, { params: Promise.resolve(params) });
}

const bytesOf = async (response: Response): Promise<Buffer> => Buffer.from(await response.arrayBuffer());

describe('the plan of a revision', () => {
  it('has the same bytes from the server as from the command line fed with the export', async () => {
    const plan = await get(`GET ${R}/plan`, '?paper=a4');
    expect([plan.status, plan.headers.get('content-type')]).toEqual([200, 'application/pdf']);
    expect(plan.headers.get('content-disposition')).toContain('attachment; filename="Print-one-revision-1-a4.pdf"');
    const pdf = await bytesOf(plan);
    const exported = await get(`GET ${R}/export`);
    expect(exported.headers.get('content-disposition')).toMatch(/^attachment;/);
    const printed = await sheets('exported', await exported.text());
    expect(sha256(printed.pdf)).toBe(sha256(pdf));
    const manifest = await (await get(`GET ${R}/manifest`, '?paper=a4')).json();
    expect(manifest).toEqual(printed.manifest);
    expect(manifest.pdfSha256).toBe(sha256(pdf));
  });

  it('is written into the print log, and its manifest is not', async () => {
    const db = await testDb();
    const before = await db.select().from(printLog);
    await get(`GET ${R}/manifest`);
    expect(await db.select().from(printLog)).toHaveLength(before.length);
    const pdf = await bytesOf(await get(`GET ${R}/plan`, '?paper=letter'));
    const log = (await db.select().from(printLog)).filter((row) => !before.some((old) => old.id === row.id));
    expect(log).toMatchObject([
      { paper: 'letter', pdfSha256: sha256(pdf), draftVersion: null, printedBy: stage.builder.who.userId },
    ]);
    expect(log[0]?.pages).toBeGreaterThan(2);
  });
});

describe('the plan of a draft', () => {
  it('has the same bytes as the command line gives for the airframe alone, which prints "draft"', async () => {
    const plan = await get(`GET ${D}/draft/plan`, '?paper=a4');
    expect(plan.headers.get('content-disposition')).toContain('draft-1');
    const printed = await sheets('draft', JSON.stringify(pusher()));
    expect(sha256(await bytesOf(plan))).toBe(sha256(printed.pdf));
  });

  it('on a paper that does not exist is refused', async () => {
    const answer = await get(`GET ${D}/draft/plan`, '?paper=a17');
    expect(answer.status).toBe(422);
    expect((await answer.json()).errors).toMatchObject([{ path: 'paper', message: expect.stringContaining('letter') }]);
  });
});

describe('the engine', () => {
  it('answers with problems for a document that the chain refuses', async () => {
    const broken = { ...pusher(), surfaces: [] };
    const answer = await runEngine({ kind: 'freeze', airframe: broken });
    expect(answer).toMatchObject({ ok: false, problems: [{ path: expect.stringContaining('surfaces') }] });
  });

  it('stops when nobody waits for the answer any more', async () => {
    const leave = new AbortController();
    const answer = runEngine({ kind: 'plan', airframe: pusher(), paper: 'a4' }, leave.signal);
    leave.abort();
    await expect(answer).rejects.toMatchObject({ kind: 'busy' });
  });
});
