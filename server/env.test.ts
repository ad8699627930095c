import { describe, expect, it } from 'vitest';
import { env } from './env';

const SECRET = 'a secret for tests that protects nothing at all';

describe('env', () => {
  it('needs only the secret', () => {
    expect(env({ FOLDSPAR_SECRET: SECRET })).toMatchObject({
      url: null,
      secret: SECRET,
      smtpUrl: null,
      trustedProxies: [],
      host: '127.0.0.1',
    });
  });

  it('takes the origin of the public address, and lists of proxies', () => {
    const read = env({
      FOLDSPAR_SECRET: SECRET,
      FOLDSPAR_URL: 'https://plans.example/somewhere',
      FOLDSPAR_TRUSTED_PROXIES: '10.0.0.0/8, 192.0.2.1,',
      SMTP_URL: '',
    });
    expect([read.url, read.trustedProxies, read.smtpUrl]).toEqual([
      'https://plans.example',
      ['10.0.0.0/8', '192.0.2.1'],
      null,
    ]);
  });

  it.each([
    [{}, 'FOLDSPAR_SECRET'],
    [{ FOLDSPAR_SECRET: 'short' }, 'FOLDSPAR_SECRET'],
    [{ FOLDSPAR_SECRET: SECRET, FOLDSPAR_URL: 'plans.example' }, 'FOLDSPAR_URL'],
    [{ FOLDSPAR_SECRET: SECRET, SMTP_URL: 'mail.example:25' }, 'SMTP_URL'],
  ])('names what is wrong in %o', (source, name) => {
    expect(() => env(source)).toThrow(name);
    expect(() => env(source)).not.toThrow(SECRET);
  });
});
