import { expect, it } from 'vitest';
import { mayWrite } from './writes';

it.each([
  'select 1',
  '  SELECT "updated_at" from draft',
  'select "deletedAt", created_at from t',
  'begin',
  'commit',
  'show fsync',
])('"%s" only reads', (sql) => expect(mayWrite(sql)).toBe(false));

it.each([
  'insert into t values (1)',
  'with gone as (delete from t returning *) select * from gone',
  'select * from t for update',
  "select nextval('s')",
  'select 1; drop table t',
  'create table t ()',
  '/* first */ select 1',
  'vacuum',
])('"%s" may write', (sql) => expect(mayWrite(sql)).toBe(true));
