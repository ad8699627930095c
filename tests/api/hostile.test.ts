import { createServer } from 'node:net';
import { desc, eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { design, draftSave, mailOutbox, printLog, revision, session, user } from '@/db/schema';
import { handleAuth } from '@/server/http/authRoute';
import type { RouteKey } from '@/server/routes';
import { pusher } from '../support/airframes';
import { type Account, account, ORIGIN, PASSWORD, requestTo, type Sent } from '../support/api';
import { testDb } from '../support/db';
import { chainEngine } from '../support/engine';
import { joinWorkshop } from '../support/people';
import { fillPath, handlersOnDisk, type RouteHandler } from '../support/routes';
import { endedSession, type StagedWorkshop, stagedWorkshop } from '../support/stage';

// What somebody sends who wants to get in, stay in, or keep others out.

/** What happens while the engine works; a test sets it. */
const during = vi.hoisted(() => ({ engine: async (): Promise<void> => undefined }));
vi.mock('@/db/client', () => ({ getDb: () => testDb() }));
vi.mock('@/server/engine', () => ({
  runEngine: async (request: Parameters<typeof chainEngine>[0]) => {
    await during.engine();
    return chainEngine(request);
  },
}));
const logged = vi.spyOn(console, 'warn').mockImplementation(() => undefined);

const W = '/api/workshops/[workshop]';
const D = `${W}/designs/[design]` as const;

let handlers: Map<string, RouteHandler>;
let stage: StagedWorkshop;

beforeAll(async () => {
  handlers = await handlersOnDisk();
  stage = await stagedWorkshop(await testDb(), 'Fort');
});
beforeEach(() => {
  during.engine = async () => undefined;
});

function handle(key: RouteKey, request: Request, params: Readonly<Record<string, string>>): Promise<Response> {
  const handler = handlers.get(key);
  if (handler === undefined) throw new RangeError(`no handler for ${key}`);
  return handler(request, { params: Promise.resolve(params) });
}

function send(key: RouteKey, sent: Sent, ids: Readonly<Record<string, string>> = {}): Promise<Response> {
  const [method, route = ''] = key.split(' ');
  const params = { ...stage.ids, ...ids };
  return handle(key, requestTo(fillPath(route, params), { method, ...sent }), params);
}

const auth = (path: string, sent: Sent) => handleAuth(requestTo(`/api/auth${path}`, sent));
const post = (path: string, body: unknown, cookie?: string) => auth(path, { method: 'POST', body, cookie });

async function member(name: string, roles: Parameters<typeof joinWorkshop>[3]): Promise<Account & { id: string }> {
  const made = await account(name);
  const { id } = await joinWorkshop(await testDb(), made.who, stage.ids.workshop, roles);
  return { ...made, id };
}

const remove = (id: string) => send(`DELETE ${W}/members/[member]`, { cookie: stage.owner.cookie }, { member: id });

const newestMail = async (recipient: string) => {
  const mails = (await testDb()).select().from(mailOutbox).where(eq(mailOutbox.recipient, recipient));
  return (await mails.orderBy(desc(mailOutbox.createdAt)).limit(1))[0];
};

describe('the routes of identity', () => {
  const POSTS = [
    ...['/sign-up/email', '/sign-in/email', '/request-password-reset', '/reset-password', '/send-verification-email'],
    ...['/update-user', '/change-password', '/revoke-session', '/sign-in/social', '/update-session', '/delete-user'],
  ];
  const BODIES: readonly unknown[] = [
    ...['{', '[]', 'null', '1', '{"__proto__":{"admin":true}}', '{"name":"A","name":"B"}', '['.repeat(5000)],
    { email: {}, password: [] },
    { email: 'a@b.example', password: 'x\u0000y-long-enough', name: 'Ann' },
    { token: '\u0000', newPassword: 'long-enough-to-pass' },
    { token: { a: 1 }, newPassword: 5 },
    ...[5, null, '', '  ', 'a\u0000b', 'a\r\nBcc: all@example.test', 'x'.repeat(81)].map((name) => ({ name })),
    { image: 'https://elsewhere.example/eye.png' },
    { emailVerified: true, id: 'other', name: '' },
  ];

  it.each(POSTS)('%s refuses what it cannot mean, and never breaks', async (path) => {
    const { cookie } = await account('Fay Fuzz');
    for (const body of BODIES) {
      const answer = await post(path, body, cookie);
      const said = `${path} ${JSON.stringify(body).slice(0, 60)}: ${answer.status}`;
      expect(answer.status, said).toBeGreaterThanOrEqual(400);
      expect(answer.status, said).toBeLessThan(500);
      expect(answer.headers.get('content-type'), said).toContain('application/problem+json');
    }
    const db = await testDb();
    expect(await db.select().from(user).where(eq(user.name, 'Fay Fuzz'))).not.toEqual([]);
  });

  it('read no more than a form can hold, and no form of another site', async () => {
    const big = { email: 'a@b.example', name: 'Ann', password: `${'1'.repeat(100_000)}a1` };
    expect((await post('/sign-up/email', big)).status).toBe(413);
    const headers = { 'content-type': 'application/x-www-form-urlencoded' };
    const form = await auth('/sign-in/email', { method: 'POST', body: 'email=a%40b.example&password=x', headers });
    expect(form.status).toBe(415);
  });

  it.each(['/error?error=x', '/ok', '/list-accounts', '/account-info?accountId=x', '/delete-user/callback?token=x'])(
    '%s, which no page uses, is not there',
    async (path) => {
      const { cookie } = await account('Ned Nosy');
      expect((await auth(path, { cookie })).status).toBe(404);
    },
  );

  it.each(['https://elsewhere.example/', '//elsewhere.example/', '/\\elsewhere.example/', 'javascript:alert(1)'])(
    'lead nobody to %s',
    async (url) => {
      const there = encodeURIComponent(url);
      for (const path of [`/verify-email?token=x&callbackURL=${there}`, `/reset-password/x?callbackURL=${there}`]) {
        const answer = await auth(path, {});
        expect([answer.status, answer.headers.get('location')]).toEqual([403, null]);
      }
      const asked = { email: stage.builder.who.email, redirectTo: url };
      expect((await post('/request-password-reset', asked)).status).toBe(403);
    },
  );

  it('send a stranger nothing in the words of whoever signed up', async () => {
    const email = 'stranger.in.words@example.test';
    const name = 'Win now at prizes.example';
    expect((await post('/sign-up/email', { email, name, password: PASSWORD })).status).toBe(200);
    const mail = await newestMail(email);
    expect(mail?.kind).toBe('verify');
    expect(`${mail?.subject} ${mail?.text}`).not.toContain('prizes');
  });

  it('take no session past its absolute age, whatever its last use', async () => {
    const old = await account('Olaf Old');
    const db = await testDb();
    await endedSession(db, old.who, 'age');
    expect((await post('/update-user', { name: 'Olaf Older' }, old.cookie)).status).toBe(401);
    expect((await auth('/list-sessions', { cookie: old.cookie })).status).toBe(401);
    expect(await db.select().from(session).where(eq(session.userId, old.who.userId))).toEqual([]);
  });

  it('answer before a mail has been handed over, so that its time tells nothing', async () => {
    const { who } = await account('Tim Timed');
    // Takes the connection and never says a word.
    const sockets: { destroy(): void }[] = [];
    const mute = createServer((socket) => sockets.push(socket));
    await new Promise<void>((resolve) => mute.listen(0, '127.0.0.1', resolve));
    const address = mute.address();
    if (address === null || typeof address === 'string') throw new RangeError('the server has no port');
    vi.stubEnv('SMTP_URL', `smtp://127.0.0.1:${address.port}`);
    const answer = await post('/request-password-reset', { email: who.email });
    expect([answer.status, (await newestMail(who.email))?.failure]).toEqual([200, null]);
    await vi.waitFor(() => expect(sockets.length).toBeGreaterThan(0), 10_000);
    vi.stubEnv('SMTP_URL', '');
    mute.close();
    for (const socket of sockets) socket.destroy();
    await vi.waitFor(async () => expect((await newestMail(who.email))?.failure).not.toBeNull(), 10_000);
  }, 25_000);
});

describe('somebody who is removed while their request is under way', () => {
  it('saves nothing, however slowly the body came', async () => {
    const slow = await member('Sly Slow', ['designer']);
    const params = { ...stage.ids };
    const path = fillPath(`${D}/draft`, params);
    const text = new TextEncoder().encode(JSON.stringify({ airframe: pusher(650) }));
    const body = new ReadableStream<Uint8Array>(
      {
        start: (controller) => controller.enqueue(text.slice(0, 10)),
        // Asked for only after the first piece was read, and with it the membership.
        pull: async (controller) => {
          expect((await remove(slow.id)).status).toBe(204);
          controller.enqueue(text.slice(10));
          controller.close();
        },
      },
      { highWaterMark: 1 },
    );
    const headers = { host: '127.0.0.1:3000', origin: ORIGIN, cookie: slow.cookie };
    const request = new Request(`${ORIGIN}${path}`, {
      method: 'PUT',
      headers: { ...headers, 'content-type': 'application/json', 'if-match': '"1"' },
      body,
      // Node asks for it when a body is a stream.
      ...{ duplex: 'half' },
    });
    expect((await handle(`PUT ${D}/draft`, request, params)).status).toBe(404);
    const db = await testDb();
    expect(await db.select().from(draftSave).where(eq(draftSave.authorId, slow.who.userId))).toEqual([]);
    const [row] = await db.select().from(design).where(eq(design.id, stage.ids.design));
    expect(row?.draftVersion).toBe(1);
  });

  it('releases nothing', async () => {
    const gone = await member('Rae Released', ['designer']);
    during.engine = async () => void (await remove(gone.id));
    const body = { reason: 'R', expectedEffect: 'E', draftVersion: 1 };
    expect((await send(`POST ${D}/revisions`, { cookie: gone.cookie, body })).status).toBe(404);
    const db = await testDb();
    expect(await db.select().from(revision).where(eq(revision.releasedBy, gone.who.userId))).toEqual([]);
  });

  it('gets no print, and one who may print no more is told so', async () => {
    const [gone, demoted] = [await member('Pat Printed', ['builder']), await member('Dot Demoted', ['builder'])];
    during.engine = async () => void (await remove(gone.id));
    expect((await send(`GET ${D}/draft/plan`, { cookie: gone.cookie })).status).toBe(404);
    during.engine = async () => {
      const sent = { cookie: stage.owner.cookie, body: { roles: ['reviewer'] } };
      expect((await send(`PATCH ${W}/members/[member]`, sent, { member: demoted.id })).status).toBe(200);
    };
    expect((await send(`GET ${D}/draft/plan`, { cookie: demoted.cookie })).status).toBe(403);
    const db = await testDb();
    for (const { who } of [gone, demoted])
      expect(await db.select().from(printLog).where(eq(printLog.printedBy, who.userId))).toEqual([]);
  });
});

describe('inviting', () => {
  const invite = (cookie: string, email: string, ids: Readonly<Record<string, string>> = {}) =>
    send(`POST ${W}/invitations`, { cookie, body: { email, roles: ['owner'] } }, ids);
  const found = async (cookie: string): Promise<string> => {
    const answer = await send('POST /api/workshops', { cookie, body: { name: 'Another' } });
    return (await answer.json()).id;
  };

  it('one address again and again is stopped, from however many workshops', async () => {
    const { cookie } = await account('Sam Sender');
    const statuses: number[] = [];
    for (let i = 0; i < 6; i += 1) {
      const answer = await invite(cookie, 'Pestered@example.test', { workshop: await found(cookie) });
      statuses.push(answer.status);
      if (answer.status === 429) expect(Number(answer.headers.get('retry-after'))).toBeGreaterThan(3600);
    }
    expect(statuses).toEqual([...Array(5).fill(201), 429]);
    const db = await testDb();
    const mails = await db.select().from(mailOutbox).where(eq(mailOutbox.recipient, 'pestered@example.test'));
    expect(mails).toHaveLength(5);
  });

  it('ever new addresses is stopped as well', async () => {
    const { cookie } = await account('Sal Spammer');
    const workshop = await found(cookie);
    for (let i = 0; i < 60; i += 1) expect((await invite(cookie, `n${i}@example.test`, { workshop })).status).toBe(201);
    expect((await invite(cookie, 'n60@example.test', { workshop })).status).toBe(429);
  });

  it.each([
    ['is removed', (id: string) => remove(id)],
    [
      'is an owner no more',
      (id: string) =>
        send(
          `PATCH ${W}/members/[member]`,
          { cookie: stage.owner.cookie, body: { roles: ['builder'] } },
          { member: id },
        ),
    ],
  ])('oneself back in by another address fails once one %s', async (_, end) => {
    const [rogue, second] = [await member('Rob Rogue', ['owner']), await account('Rob Second')];
    expect((await invite(rogue.cookie, second.who.email)).status).toBe(201);
    const token = /\/invite\/([\w-]+)/.exec((await newestMail(second.who.email))?.text ?? '')?.[1] ?? '';
    expect((await end(rogue.id)).ok).toBe(true);
    const accepted = await send('POST /api/invitations/[token]/accept', { cookie: second.cookie }, { token });
    expect(accepted.status).toBe(410);
    expect((await send(`GET ${W}`, { cookie: second.cookie })).status).toBe(404);
  });
});

describe('a body', () => {
  it('that is no document may not be as long as one', async () => {
    const text = 'x'.repeat(100_000);
    const thread = { anchor: { kind: 'element', key: 'wing' }, text };
    const sent = { cookie: stage.reviewer.cookie, body: thread };
    expect((await send(`POST ${D}/revisions/[number]/threads`, sent)).status).toBe(413);
    const airframe = { ...pusher(), name: text };
    const made = await send(`POST ${W}/designs`, { cookie: stage.designer.cookie, body: { name: 'Long', airframe } });
    expect(made.status).toBe(422);
  });

  it('with a thousand unknown keys is told of fifty', async () => {
    const body = Object.fromEntries(Array.from({ length: 1000 }, (_, i) => [`k${i}`, 0]));
    const answer = await send(`PATCH ${W}`, { cookie: stage.owner.cookie, body });
    expect([answer.status, (await answer.json()).errors.length]).toEqual([422, 50]);
  });
});

describe('a refusal for want of rights', () => {
  it('is logged without what was typed', async () => {
    logged.mockClear();
    const body = { name: 'Mine now' };
    expect((await send(`PATCH ${W}`, { cookie: stage.builder.cookie, body })).status).toBe(403);
    expect(
      (await send(`PATCH ${W}`, { cookie: stage.owner.cookie, body, headers: { origin: 'https://elsewhere.example' } }))
        .status,
    ).toBe(403);
    const lines = logged.mock.calls.map(([line]) => JSON.parse(String(line)));
    const where = `PATCH ${fillPath(W, { ...stage.ids })}`;
    expect(lines).toEqual([
      { level: 'warn', where, kind: 'forbidden' },
      { level: 'warn', where, kind: 'cross-origin' },
    ]);
  });
});
