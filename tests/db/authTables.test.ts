import { getAuthTables } from 'better-auth/db';
import { getTableColumns } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import * as auth from '@/db/schema/auth';
import { authOptions } from '@/server/auth/options';

const wanted = Object.entries(getAuthTables({ ...authOptions }));
const tables = new Map(Object.entries(auth));

describe('the identity tables', () => {
  it('are the five that the library asks for', () => {
    expect(wanted.map(([name]) => name).toSorted()).toEqual([...tables.keys()].toSorted());
  });

  it.each(wanted)('%s has every field', (name, { fields }) => {
    const table = tables.get(name);
    if (table === undefined) throw new RangeError(`no table ${name}`);
    const columns = getTableColumns(table);
    expect(Object.keys(columns)).toEqual(expect.arrayContaining(['id', ...Object.keys(fields)]));
    for (const [field, { required, unique }] of Object.entries(fields)) {
      const column = Object.entries(columns).find(([key]) => key === field)?.[1];
      expect({ field, notNull: column?.notNull }).toEqual({ field, notNull: required !== false });
      expect({ field, unique: column?.isUnique }).toEqual({ field, unique: unique === true });
    }
  });
});
