import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { Db } from '@/db/types';
import { newId } from '@/server/context';
import { ROUTES, type RouteKey } from '@/server/routes';
import { pusher } from '../support/airframes';
import { type Account, account, requestTo } from '../support/api';
import { rolledBack, testDb } from '../support/db';
import { chainEngine } from '../support/engine';
import { joinWorkshop } from '../support/people';
import { fillPath, handlersOnDisk, type RouteHandler } from '../support/routes';
import { endedSession, type Ids, removedMember, type StagedWorkshop, stagedWorkshop } from '../support/stage';

const current = vi.hoisted((): { db: Db | null } => ({ db: null }));
vi.mock('@/db/client', () => ({ getDb: async () => current.db ?? (await testDb()) }));
vi.mock('@/server/engine', () => ({
  // Pages are not what this is about; they are drawn in plan.test.ts.
  runEngine: (request: Parameters<typeof chainEngine>[0]) =>
    request.kind === 'freeze'
      ? chainEngine(request)
      : { ok: true, kind: 'plan', pdfBase64: '', manifest: { version: 1, units: 'mm', otherPages: [], sheets: [] } },
}));

const W = '/api/workshops/[workshop]';
const D = `${W}/designs/[design]` as const;
const R = `${D}/revisions/[number]` as const;

type Row = {
  readonly key: RouteKey;
  /** "anybody", "signed in", or the roles that may: one letter each for owner, designer, builder, reviewer. */
  readonly may: 'anybody' | 'signed in' | `${'o' | ''}${'d' | ''}${'b' | ''}${'r' | ''}`;
  /** Status for those who may. */
  readonly status: number;
  readonly body?: (ids: Ids) => unknown;
  readonly headers?: Readonly<Record<string, string>>;
};

// Typed by hand from the roles' jobs, apart from the table that the server enforces: a slip in either shows here.
const TABLE: readonly Row[] = [
  { key: 'GET /api/health', may: 'anybody', status: 200 },
  { key: 'GET /api/auth/[...all]', may: 'anybody', status: 200 },
  { key: 'POST /api/auth/[...all]', may: 'anybody', status: 200, body: () => ({}) },
  { key: 'GET /api/workshops', may: 'signed in', status: 200 },
  { key: 'POST /api/workshops', may: 'signed in', status: 201, body: () => ({ name: 'Mine' }) },
  // Signed in is enough to ask; whose address it was sent to decides, and none of these is it.
  { key: 'POST /api/invitations/[token]/accept', may: 'signed in', status: 403 },
  { key: `GET ${W}`, may: 'odbr', status: 200 },
  { key: `PATCH ${W}`, may: 'o', status: 200, body: () => ({ name: 'Renamed' }) },
  { key: `GET ${W}/members`, may: 'odbr', status: 200 },
  { key: `PATCH ${W}/members/[member]`, may: 'o', status: 200, body: () => ({ roles: ['builder', 'reviewer'] }) },
  { key: `DELETE ${W}/members/[member]`, may: 'o', status: 204 },
  { key: `GET ${W}/invitations`, may: 'o', status: 200 },
  {
    key: `POST ${W}/invitations`,
    may: 'o',
    status: 201,
    body: () => ({ email: 'new.hand@example.test', roles: ['builder'] }),
  },
  { key: `DELETE ${W}/invitations/[invitation]`, may: 'o', status: 204 },
  { key: `GET ${W}/designs`, may: 'odbr', status: 200 },
  { key: `POST ${W}/designs`, may: 'd', status: 201, body: () => ({ name: 'Another', layout: 'trainer' }) },
  { key: `GET ${D}`, may: 'odbr', status: 200 },
  { key: `PATCH ${D}`, may: 'd', status: 200, body: () => ({ name: 'Renamed' }) },
  { key: `DELETE ${D}`, may: 'od', status: 204 },
  { key: `GET ${D}/draft`, may: 'odbr', status: 200 },
  {
    key: `PUT ${D}/draft`,
    may: 'd',
    status: 200,
    body: () => ({ airframe: pusher(650) }),
    headers: { 'if-match': '"1"' },
  },
  { key: `GET ${D}/draft/plan`, may: 'db', status: 200 },
  { key: `GET ${D}/draft/manifest`, may: 'db', status: 200 },
  { key: `GET ${D}/revisions`, may: 'odbr', status: 200 },
  {
    key: `POST ${D}/revisions`,
    may: 'd',
    status: 201,
    body: () => ({ reason: 'Because.', expectedEffect: 'Better.', draftVersion: 1 }),
  },
  { key: `GET ${R}`, may: 'odbr', status: 200 },
  { key: `GET ${R}/plan`, may: 'odbr', status: 200 },
  { key: `GET ${R}/manifest`, may: 'odbr', status: 200 },
  { key: `GET ${R}/export`, may: 'odbr', status: 200 },
  { key: `GET ${R}/threads`, may: 'odbr', status: 200 },
  {
    key: `POST ${R}/threads`,
    may: 'odbr',
    status: 201,
    body: () => ({ anchor: { kind: 'point', view: 'plan', mm: [12, 34] }, text: 'Look here.' }),
  },
  { key: `PATCH ${R}/threads/[thread]`, may: 'dr', status: 200, body: () => ({ state: 'closed' }) },
  { key: `POST ${R}/threads/[thread]/comments`, may: 'odbr', status: 201, body: () => ({ text: 'Seen.' }) },
  { key: `GET ${R}/verdicts`, may: 'odbr', status: 200 },
  { key: `POST ${R}/verdicts`, may: 'r', status: 201, body: () => ({ verdict: 'goodToCut', note: '' }) },
];

const ACTORS = ['nobody', 'outsider', 'reviewer', 'builder', 'designer', 'owner', 'removed', 'idle', 'aged'] as const;
type Actor = (typeof ACTORS)[number];
const LETTER: Partial<Record<Actor, string>> = { owner: 'o', designer: 'd', builder: 'b', reviewer: 'r' };

function expected(row: Row, actor: Actor): number {
  if (row.may === 'anybody') return row.status;
  if (actor === 'nobody' || actor === 'idle' || actor === 'aged') return 401;
  if (row.may === 'signed in') return row.status;
  const letter = LETTER[actor];
  if (letter === undefined) return 404;
  return row.may.includes(letter) ? row.status : 403;
}

let handlers: Map<string, RouteHandler>;
let here: StagedWorkshop;
let there: StagedWorkshop;
let people: Record<Actor, Account | null>;

beforeAll(async () => {
  const db = await testDb();
  handlers = await handlersOnDisk();
  here = await stagedWorkshop(db, 'Here');
  there = await stagedWorkshop(db, 'There');
  const outsider = await account('Odo Outsider');
  await joinWorkshop(db, outsider.who, there.ids.workshop, ['owner', 'designer', 'builder', 'reviewer']);
  // Both would be allowed everything if their sessions still stood.
  const [idle, aged] = [await account('Ida Idle'), await account('Agnes Aged')];
  for (const one of [idle, aged])
    await joinWorkshop(db, one.who, here.ids.workshop, ['owner', 'designer', 'builder', 'reviewer']);
  await endedSession(db, idle.who, 'idle');
  await endedSession(db, aged.who, 'age');
  people = { ...here, nobody: null, outsider, removed: await removedMember(db, here), idle, aged };
});

/** Sends one request inside a transaction that is rolled back, so that each starts from the same stage. */
async function send(
  { key, body, headers }: Row,
  cookie: string | undefined,
  ids: Record<keyof Ids, string>,
): Promise<Response> {
  const [method = '', route = ''] = key.split(' ');
  const handler = handlers.get(key);
  if (handler === undefined) throw new RangeError(`no handler for ${key}`);
  let answer: Response | undefined;
  const all = { ...ids, all: 'ok' };
  await rolledBack(async (tx) => {
    current.db = tx;
    const request = requestTo(fillPath(route, all), { method, cookie, body: body?.(here.ids), headers });
    answer = await handler(request, { params: Promise.resolve(all) });
    await answer.clone().arrayBuffer();
  }).finally(() => {
    current.db = null;
  });
  if (answer === undefined) throw new RangeError(`${key} did not answer`);
  return answer;
}

async function assertProblem(response: Response): Promise<void> {
  expect(response.headers.get('content-type')).toBe('application/problem+json; charset=utf-8');
  const problem: unknown = await response.json();
  expect(problem).toMatchObject({
    type: expect.stringMatching(/^urn:foldspar:problem:/),
    title: expect.any(String),
    status: response.status,
    instance: expect.stringMatching(/^\/api\//),
  });
}

const ours = TABLE.filter((row) => row.may !== 'anybody');

it('has a row for every route in the registry', () => {
  const registered = ROUTES.map((route) => `${route.method} ${route.path}`);
  expect(TABLE.map((row) => row.key).toSorted()).toEqual(registered.toSorted());
});

describe.each(ACTORS)('%s', (actor) => {
  it.each(ours)('$key', async (row) => {
    const response = await send(row, people[actor]?.cookie, here.ids);
    expect(response.status).toBe(expected(row, actor));
    expect(response.headers.get('cache-control')).toContain('no-store');
    if (response.status >= 400) await assertProblem(response);
  });
});

describe('what belongs to another workshop is as little there as what does not exist', () => {
  const nameable = ['member', 'invitation', 'design', 'number', 'thread'] as const;
  const cases = ours.flatMap((row) =>
    nameable.filter((name) => row.key.includes(`[${name}]`)).map((name) => ({ row, name, key: row.key })),
  );
  it.each(cases)('$name in $key', async ({ row, name }) => {
    const allowed = ACTORS.find((actor) => expected(row, actor) === row.status);
    const cookie = allowed && people[allowed]?.cookie;
    // Numbers of revisions are counted in each design, so a foreign one is one that this design does not have.
    const foreign = name === 'number' ? '2' : there.ids[name];
    const missing = name === 'number' ? 'one' : newId();
    const answers = [
      await send(row, cookie, { ...here.ids, [name]: foreign }),
      await send(row, cookie, { ...here.ids, [name]: missing }),
      await send(row, cookie, { ...here.ids, [name]: `'; drop table design; --\u0000` }),
    ];
    for (const answer of answers) expect(answer.status).toBe(404);
    const bodies = await Promise.all(answers.map(async (answer) => ({ ...(await answer.json()), instance: '' })));
    expect(bodies[0]).toEqual(bodies[1]);
  });
});

describe('an invitation', () => {
  it('that nobody sent is not found', async () => {
    const row: Row = { key: 'POST /api/invitations/[token]/accept', may: 'signed in', status: 404 };
    const answer = await send(row, people.builder?.cookie, { ...here.ids, token: 'x'.repeat(43) });
    expect(answer.status).toBe(404);
  });
});

describe('a request made by the page of another site', () => {
  const changing = ours.filter((row) => !row.key.startsWith('GET'));
  it.each(changing)('$key', async (row) => {
    const bad: Record<string, string>[] = [
      { origin: 'https://elsewhere.example' },
      { origin: 'null' },
      { 'sec-fetch-site': 'cross-site' },
      { 'sec-fetch-site': 'same-site' },
    ];
    for (const headers of bad) {
      const answer = await send({ ...row, headers: { ...row.headers, ...headers } }, people.owner?.cookie, here.ids);
      expect([answer.status, (await answer.json()).type]).toEqual([403, 'urn:foldspar:problem:cross-origin']);
    }
  });
});
