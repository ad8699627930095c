import { mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { socketOf } from './database.mjs';
import { standsAlready } from './dependencies.mjs';
import { addressOf, assertFree, freePort, portOf } from './port.mjs';
import { ensureSecret } from './secret.mjs';
import { keepSignIns, signInsPath } from './signIns.mjs';
import { findProgram } from './system.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'foldspar-lib-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('installed packages', () => {
  const lock = (packages: object) => JSON.stringify({ packages });
  const wanted = lock({
    '': {},
    'node_modules/a': { version: '1.0.0' },
    'node_modules/b': { version: '2.0.0', optional: true },
  });

  it('stand when each has the version of the lock; one for another system may be missing', () => {
    expect(standsAlready(wanted, lock({ 'node_modules/a': { version: '1.0.0' } }))).toBe(true);
  });

  it('do not stand when one is missing, has another version, or nothing was installed', () => {
    expect(standsAlready(wanted, lock({}))).toBe(false);
    expect(standsAlready(wanted, lock({ 'node_modules/a': { version: '1.0.1' } }))).toBe(false);
    expect(standsAlready(wanted, null)).toBe(false);
  });
});

describe('addresses', () => {
  it('reads PORT and refuses what is none', () => {
    expect(portOf({})).toBe(3000);
    expect(portOf({ PORT: '8080' })).toBe(8080);
    for (const PORT of ['0', '65536', '1e3', ' 80', 'http']) expect(() => portOf({ PORT })).toThrow(`got "${PORT}"`);
  });

  it('names a taken port in a plain sentence', async () => {
    const server = createServer();
    const port = await freePort();
    await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
    await expect(assertFree(port, '127.0.0.1')).rejects.toThrow(
      `Port ${port} on 127.0.0.1 is taken by another program.`,
    );
    await new Promise((resolve) => server.close(resolve));
    await assertFree(port, '127.0.0.1');
  });

  it('leads a browser to a server that listens on every address', () => {
    expect(addressOf('0.0.0.0', 3000)).toBe('http://127.0.0.1:3000');
    expect(addressOf('::', 3000)).toBe('http://[::1]:3000');
    expect(addressOf('localhost', 81)).toBe('http://localhost:81');
  });
});

describe('the data folder', () => {
  it('keeps one secret, which only its owner reads, and prefers a configured one', () => {
    const secret = ensureSecret(folder, {});
    expect(secret.length).toBeGreaterThanOrEqual(32);
    expect(ensureSecret(folder, {})).toBe(secret);
    expect(statSync(join(folder, 'secret')).mode & 0o777).toBe(0o600);
    expect(ensureSecret(folder, { FOLDSPAR_SECRET: 'configured' })).toBe('configured');
  });

  it('keeps the sign-ins one a line, for its owner alone', () => {
    const people = [
      { name: 'A B', email: 'a@example.test', password: 'one', roles: ['owner', 'designer'] },
      { name: 'C D', email: 'c@example.test', password: 'two', roles: ['builder'] },
    ];
    keepSignIns(folder, people);
    expect(readFileSync(signInsPath(folder), 'utf8')).toBe(
      'A B\ta@example.test\tone\towner designer\nC D\tc@example.test\ttwo\tbuilder\n',
    );
    expect(statSync(signInsPath(folder)).mode & 0o777).toBe(0o600);
  });

  it('gives each folder a socket of its own, short enough for the system', () => {
    const long = join(folder, 'x'.repeat(300));
    expect(socketOf(long).length).toBeLessThan(100);
    expect(socketOf(long)).not.toBe(socketOf(folder));
  });
});

it('finds a program on the path and says when there is none', () => {
  expect(findProgram('sh')).toMatch(/\/sh$/);
  expect(findProgram('sh', folder)).toBeNull();
});
