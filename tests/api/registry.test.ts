import { readdirSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { MAY } from '@/lib/contract/roles';
import { ROUTES } from '@/server/routes';
import { handlersOnDisk } from '../support/routes';

const registered = ROUTES.map((route) => `${route.method} ${route.path}`).toSorted();

describe('the registry of routes', () => {
  it('lists each route once', () => {
    expect(new Set(registered).size).toBe(registered.length);
  });

  it('holds exactly the methods that app/api exports', async () => {
    const onDisk = await handlersOnDisk();
    expect(onDisk.size).toBeGreaterThan(20);
    expect([...onDisk.keys()].toSorted()).toEqual(registered);
  });

  it('leaves no act of the table of roles without a route', () => {
    const needed = new Set<string>(ROUTES.map((route) => route.needs));
    // Opening a thread again goes through the route that closes it; the body says which.
    expect(Object.keys(MAY).filter((act) => !needed.has(act))).toEqual(['thread.reopen']);
  });

  it('lets no page below app answer requests by itself', () => {
    const files = readdirSync(path.resolve(import.meta.dirname, '../../app'), { recursive: true, encoding: 'utf8' });
    const outside = files.filter((file) => /(^|\/)route\.tsx?$/.test(file) && !file.startsWith('api/'));
    expect(outside).toEqual([]);
  });
});
