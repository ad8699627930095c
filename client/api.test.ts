import { afterEach, describe, expect, it, vi } from 'vitest';
import { ApiProblem, api, Unreachable } from './api';

interface Sent {
  readonly path: string;
  readonly init: RequestInit;
}

/** A server that answers every call the same and remembers what was asked. */
function server(answer: () => Response | Promise<Response>) {
  const sent: Sent[] = [];
  vi.stubGlobal('fetch', (path: string, init: RequestInit) => {
    sent.push({ path, init });
    return Promise.resolve().then(answer);
  });
  const header = (index: number, name: string) => new Headers(sent[index]?.init.headers).get(name);
  return { sent, header };
}
afterEach(() => vi.unstubAllGlobals());

const json = (body: unknown, init: ResponseInit = {}) =>
  new Response(JSON.stringify(body), { ...init, headers: { 'content-type': 'application/json', ...init.headers } });

describe('api', () => {
  it('hands over data and etag', async () => {
    server(() => json({ version: 7 }, { headers: { etag: '"7"' } }));
    expect(await api.get('/api/health')).toEqual({ data: { version: 7 }, etag: '"7"' });
  });

  it('gives every post its own key, or the one it is told to repeat', async () => {
    const { header } = server(() => json({}, { status: 201 }));
    await api.post('/api/workshops', { name: 'Tarn Lane Workshop' });
    await api.post('/api/workshops', { name: 'Tarn Lane Workshop' });
    await api.post('/api/workshops', { name: 'Tarn Lane Workshop' }, { idempotencyKey: 'again' });
    expect(header(0, 'idempotency-key')).toMatch(/^[0-9a-f-]{36}$/);
    expect(header(1, 'idempotency-key')).not.toBe(header(0, 'idempotency-key'));
    expect(header(2, 'idempotency-key')).toBe('again');
  });

  it('sends the version a save builds on, and no key with it', async () => {
    const { header, sent } = server(() => json({ version: 8 }));
    await api.put('/draft', { airframe: {} }, { ifMatch: '"7"' });
    expect(header(0, 'if-match')).toBe('"7"');
    expect(header(0, 'idempotency-key')).toBeNull();
    expect(sent[0]?.init.body).toBe('{"airframe":{}}');
  });

  it('takes an answer without a body', async () => {
    server(() => new Response(null, { status: 204 }));
    expect((await api.delete('/api/workshops/w1/members/m1')).data).toBeNull();
  });

  it('throws a refusal with what the server said about it', async () => {
    const problem = {
      type: 'about:blank',
      title: 'Someone saved before you',
      status: 412,
      instance: '/draft',
      errors: [{ path: 'airframe.name', code: 'bad', message: 'too long' }],
    };
    server(() => json(problem, { status: 412, headers: { 'content-type': 'application/problem+json' } }));
    const error = await api.put('/draft', {}).catch((caught: unknown) => caught);
    expect(error).toBeInstanceOf(ApiProblem);
    expect(error).toMatchObject({ status: 412, problem });
  });

  it.each([
    ['text', () => new Response('upstream gone', { status: 502, statusText: 'Bad Gateway' }), 'Bad Gateway'],
    [
      'broken JSON',
      () => new Response('{"ti', { status: 500, headers: { 'content-type': 'application/json' } }),
      'HTTP 500',
    ],
    ['JSON of another kind', () => json({ error: 'no' }, { status: 403 }), 'HTTP 403'],
  ])('makes a problem of a refusal in %s', async (_, answer, title) => {
    server(answer);
    const error = await api.get('/api/health').catch((caught: unknown) => caught);
    expect(error).toMatchObject({ problem: { title, instance: '/api/health' } });
  });

  it('tells a dead line from a refusal, and lets a stopped request be stopped', async () => {
    server(() => Promise.reject(new TypeError('fetch failed')));
    await expect(api.get('/api/health')).rejects.toBeInstanceOf(Unreachable);
    server(() => Promise.reject(new DOMException('stopped', 'AbortError')));
    await expect(api.get('/api/health')).rejects.toMatchObject({ name: 'AbortError' });
  });
});
