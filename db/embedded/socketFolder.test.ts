import { chmodSync, mkdtempSync, rmSync, statSync, symlinkSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { ownSocketFolder } from './socketFolder';

let place: string;
beforeEach(() => {
  place = mkdtempSync(join(tmpdir(), 'foldspar-socket-'));
});
afterEach(() => rmSync(place, { recursive: true, force: true }));

it('makes a folder that nobody else can enter, and takes it again', () => {
  const socket = join(place, 'made', '.s.PGSQL.5432');
  ownSocketFolder(socket);
  ownSocketFolder(socket);
  expect(statSync(join(place, 'made')).mode & 0o777).toBe(0o700);
});

it('refuses a folder that others can enter, and a link', () => {
  chmodSync(place, 0o755);
  expect(() => ownSocketFolder(join(place, '.s.PGSQL.5432'))).toThrow('open to other users');
  const link = join(place, 'link');
  symlinkSync(place, link);
  expect(() => ownSocketFolder(join(link, '.s.PGSQL.5432'))).toThrow('is no folder');
});
