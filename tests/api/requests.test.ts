import { count, eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { auditEvent, commentThread, design, idempotencyKey } from '@/db/schema';
import { newId } from '@/server/context';
import type { RouteKey } from '@/server/routes';
import { pusher } from '../support/airframes';
import { requestTo, type Sent } from '../support/api';
import { testDb } from '../support/db';
import { chainEngine } from '../support/engine';
import { fillPath, handlersOnDisk, type RouteHandler } from '../support/routes';
import { type StagedWorkshop, stagedWorkshop } from '../support/stage';

vi.mock('@/db/client', () => ({ getDb: () => testDb() }));
vi.mock('@/server/engine', () => ({ runEngine: (request: Parameters<typeof chainEngine>[0]) => chainEngine(request) }));

const W = '/api/workshops/[workshop]';
const D = `${W}/designs/[design]` as const;
const R = `${D}/revisions/[number]` as const;

let handlers: Map<string, RouteHandler>;
let stage: StagedWorkshop;

beforeAll(async () => {
  handlers = await handlersOnDisk();
  stage = await stagedWorkshop(await testDb(), 'Bench');
});

async function send(key: RouteKey, sent: Sent, ids: Readonly<Record<string, string>> = {}): Promise<Response> {
  const [method, route = ''] = key.split(' ');
  const params = { ...stage.ids, ...ids };
  const handler = handlers.get(key);
  if (handler === undefined) throw new RangeError(`no handler for ${key}`);
  return handler(requestTo(fillPath(route, params), { method, ...sent }), { params: Promise.resolve(params) });
}

const designer = (): string => stage.designer.cookie;

async function newDesign(name: string): Promise<string> {
  const made = await send(`POST ${W}/designs`, { cookie: designer(), body: { name, airframe: pusher() } });
  expect(made.status).toBe(201);
  return (await made.json()).id;
}

describe('reading', () => {
  it('again with the ETag costs no body, and a change gives another ETag', async () => {
    const first = await send(`GET ${D}`, { cookie: designer() });
    const etag = first.headers.get('etag') ?? '';
    expect(etag).toMatch(/^"[^"]+"$/);
    const same = await send(`GET ${D}`, { cookie: designer(), headers: { 'if-none-match': `W/${etag}, "x"` } });
    expect([same.status, await same.text(), same.headers.get('etag')]).toEqual([304, '', etag]);
    await send(`PATCH ${D}`, { cookie: designer(), body: { name: 'Bench two' } });
    const changed = await send(`GET ${D}`, { cookie: designer(), headers: { 'if-none-match': etag } });
    expect([changed.status, (await changed.json()).name]).toEqual([200, 'Bench two']);
  });

  it('a draft tells its version in the ETag, which a save takes back', async () => {
    const id = await newDesign('Tagged');
    const read = await send(`GET ${D}/draft`, { cookie: designer() }, { design: id });
    const etag = read.headers.get('etag') ?? '';
    const saved = await send(
      `PUT ${D}/draft`,
      { cookie: designer(), body: { airframe: pusher(640) }, headers: { 'if-match': etag } },
      { design: id },
    );
    expect([saved.status, saved.headers.get('etag')]).toEqual([200, '"2"']);
    expect(await saved.json()).toMatchObject({ designId: id, version: 2 });
  });
});

describe('saving a draft', () => {
  it('needs the version it is based on, and a stale one gets the newer draft back', async () => {
    const id = await newDesign('Stale');
    const put = (headers: Record<string, string>, span: number) =>
      send(`PUT ${D}/draft`, { cookie: designer(), body: { airframe: pusher(span) }, headers }, { design: id });
    expect((await put({}, 610)).status).toBe(428);
    expect((await put({ 'if-match': '*' }, 610)).status).toBe(422);
    expect((await put({ 'if-match': '"1"' }, 630)).status).toBe(200);
    const stale = await put({ 'if-match': '"1"' }, 650);
    expect(stale.status).toBe(412);
    expect(await stale.json()).toMatchObject({
      type: 'urn:foldspar:problem:stale',
      status: 412,
      current: { version: 2, airframe: pusher(630) },
    });
  });
});

describe('an Idempotency-Key', () => {
  const post = (key: string, text: string) =>
    send(`POST ${R}/threads`, {
      cookie: stage.reviewer.cookie,
      body: { anchor: { kind: 'element', key: 'wing' }, text },
      headers: { 'idempotency-key': key },
    });

  it('sent many times at once has one effect and one answer', async () => {
    const db = await testDb();
    const before = await db.select({ n: count() }).from(commentThread);
    const key = newId();
    const answers = await Promise.all(Array.from({ length: 8 }, () => post(key, 'Once.')));
    const texts = await Promise.all(answers.map((answer) => answer.text()));
    expect(answers.map((answer) => answer.status)).toEqual(Array(8).fill(201));
    expect(new Set(texts).size).toBe(1);
    expect(new Set(answers.map((answer) => answer.headers.get('location'))).size).toBe(1);
    const after = await db.select({ n: count() }).from(commentThread);
    expect((after[0]?.n ?? 0) - (before[0]?.n ?? 0)).toBe(1);
  });

  it('used for something else is refused, and somebody else’s key is their own', async () => {
    const key = newId();
    expect((await post(key, 'First.')).status).toBe(201);
    const other = await post(key, 'Second.');
    expect([other.status, (await other.json()).detail]).toEqual([422, expect.stringContaining('Idempotency-Key')]);
    const theirs = await send(`POST ${R}/threads`, {
      cookie: designer(),
      body: { anchor: { kind: 'element', key: 'wing' }, text: 'Second.' },
      headers: { 'idempotency-key': key },
    });
    expect(theirs.status).toBe(201);
  });

  it('of a request that was refused can be used again', async () => {
    const key = newId();
    const id = await newDesign('Retry');
    const release = (draftVersion: number) =>
      send(
        `POST ${D}/revisions`,
        {
          cookie: designer(),
          body: { reason: 'R', expectedEffect: 'E', draftVersion },
          headers: { 'idempotency-key': key },
        },
        { design: id },
      );
    expect((await release(7)).status).toBe(409);
    expect((await release(1)).status).toBe(201);
    const again = await release(1);
    expect([again.status, (await again.json()).number]).toEqual([201, 1]);
    const db = await testDb();
    expect(await db.select().from(idempotencyKey).where(eq(idempotencyKey.key, key))).toHaveLength(1);
  });

  it('that is unreadable is refused', async () => {
    expect((await post('two words', 'x')).status).toBe(422);
    expect((await post('k'.repeat(201), 'x')).status).toBe(422);
  });
});

describe('a bad body', () => {
  const problem = async (response: Response) => {
    expect(response.headers.get('content-type')).toContain('application/problem+json');
    const text = await response.text();
    expect(text).not.toMatch(/select |insert |node_modules| {4}at /i);
    expect(text).not.toContain(process.cwd());
    const body = JSON.parse(text);
    return { status: response.status, paths: (body.errors ?? []).map((row: { path: string }) => row.path) };
  };
  const rename = (body: unknown, headers?: Record<string, string>) =>
    send(`PATCH ${W}`, { cookie: stage.owner.cookie, body, headers });

  it.each([
    ['no JSON', '{"name":', 400, []],
    ['NaN', '{"name":NaN}', 400, []],
    ['a list', [], 422, ['']],
    ['null', null, 422, ['']],
    ['an unknown key', { name: 'A', nmae: 'B' }, 422, ['nmae']],
    ['a prototype', '{"name":"A","__proto__":{"admin":true}}', 422, ['__proto__']],
    ['a constructor', { name: 'A', constructor: {} }, 422, ['constructor']],
    ['a missing field', {}, 422, ['name']],
    ['a number for text', { name: 1e308 }, 422, ['name']],
    ['an empty text', { name: '   ' }, 422, ['name']],
    ['a long text', { name: 'x'.repeat(81) }, 422, ['name']],
    ['a line break in a line', { name: 'a\nb' }, 422, ['name']],
    ['a NUL', { name: 'a\u0000b' }, 422, ['name']],
    ['half a character', '{"name":"\\ud800"}', 422, ['name']],
    ['one key twice', '{"name":"A","name":"B"}', 422, ['name']],
    ['one key twice, spelt in two ways', '{"name":"A","n\\u0061me":"B"}', 422, ['name']],
    ['a hundred levels', `{"name":${'['.repeat(100)}${']'.repeat(100)}}`, 422, ['']],
  ])('%s is refused at its place', async (_, body, status, paths) => {
    expect(await problem(await rename(body))).toEqual({ status, paths });
  });

  it('that is no JSON by its type is refused before it is read', async () => {
    expect((await rename('name=A', { 'content-type': 'application/x-www-form-urlencoded' })).status).toBe(415);
    expect((await rename('{"name":"A"}', { 'content-type': 'text/plain' })).status).toBe(415);
  });

  it('over two megabytes is refused, with and without a length', async () => {
    expect((await rename({ name: 'x'.repeat(5_000_000) })).status).toBe(413);
    const stream = new ReadableStream<Uint8Array>({
      pull: (controller) => controller.enqueue(new Uint8Array(100_000).fill(32)),
    });
    const params = { ...stage.ids };
    const request = new Request(requestTo(fillPath(W, params), { method: 'PATCH', cookie: stage.owner.cookie }), {
      body: stream,
      headers: { host: '127.0.0.1:3000', 'content-type': 'application/json', cookie: stage.owner.cookie },
      // Node asks for it when a body is a stream.
      ...{ duplex: 'half' },
    });
    const answer = await handlers.get(`PATCH ${W}`)?.(request, { params: Promise.resolve(params) });
    expect(answer?.status).toBe(413);
  });

  it('that is not UTF-8 is refused', async () => {
    const params = { ...stage.ids };
    const bytes = new Uint8Array([...Buffer.from('{"name":"'), 0xff, 0xfe, ...Buffer.from('"}')]);
    const request = new Request(`http://127.0.0.1:3000${fillPath(W, params)}`, {
      method: 'PATCH',
      headers: { host: '127.0.0.1:3000', 'content-type': 'application/json', cookie: stage.owner.cookie },
      body: bytes,
    });
    expect((await handlers.get(`PATCH ${W}`)?.(request, { params: Promise.resolve(params) }))?.status).toBe(400);
  });

  it.each([
    ['negative', (a: ReturnType<typeof draft>) => Object.assign(a.surfaces[0].panels[0], { rootChordMm: -5 })],
    ['text', (a: ReturnType<typeof draft>) => Object.assign(a.surfaces[0].panels[0], { rootChordMm: '1e3' })],
    ['null', (a: ReturnType<typeof draft>) => Object.assign(a.surfaces[0].panels[0], { rootChordMm: null })],
    ['huge', (a: ReturnType<typeof draft>) => Object.assign(a.surfaces[0].panels[0], { rootChordMm: 1e308 })],
  ])('with a %s chord is refused at the chord', async (_, spoil) => {
    const airframe = draft();
    spoil(airframe);
    const id = await newDesign('Spoilt');
    const answer = await send(
      `PUT ${D}/draft`,
      { cookie: designer(), body: { airframe }, headers: { 'if-match': '"1"' } },
      { design: id },
    );
    expect(await problem(answer)).toEqual({ status: 422, paths: ['airframe.surfaces.0.panels.0.rootChordMm'] });
  });

  const draft = () => JSON.parse(JSON.stringify(pusher()));

  it('of a verdict must say what has to change', async () => {
    const answer = await send(`POST ${R}/verdicts`, {
      cookie: stage.reviewer.cookie,
      body: { verdict: 'hold', note: '  ' },
    });
    expect(await problem(answer)).toEqual({ status: 422, paths: ['note'] });
  });

  it('of a pin must say where', async () => {
    const post = (anchor: unknown) =>
      send(`POST ${R}/threads`, { cookie: stage.reviewer.cookie, body: { anchor, text: 'Here.' } });
    expect(await problem(await post({ kind: 'point', view: 'plan' }))).toEqual({ status: 422, paths: ['anchor.mm'] });
    expect(await problem(await post({ kind: 'part' }))).toEqual({ status: 422, paths: ['anchor.key'] });
    expect(await problem(await post({ kind: 'point', view: 'plan', mm: [1e9, 0] }))).toMatchObject({
      status: 422,
      paths: ['anchor.mm.0'],
    });
  });

  it('changes nothing', async () => {
    const db = await testDb();
    const [renames] = await db.select({ n: count() }).from(auditEvent).where(eq(auditEvent.act, 'workshop.rename'));
    expect(renames?.n).toBe(0);
    const spoilt = await db.select().from(design).where(eq(design.name, 'Spoilt'));
    expect(spoilt.map((row) => row.draftVersion)).toEqual([1, 1, 1, 1]);
  });
});
