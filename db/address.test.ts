import { expect, it } from 'vitest';
import { databaseConfig, socketConfig } from './address';

it('goes to the server that DATABASE_URL names, before the embedded one', () => {
  const env = { DATABASE_URL: 'postgresql://db.example/foldspar', FOLDSPAR_DB_SOCKET: '/run/foldspar/.s.PGSQL.5432' };
  expect(databaseConfig(env)).toEqual({ connectionString: 'postgresql://db.example/foldspar' });
  expect(databaseConfig({ ...env, DATABASE_URL: '' })).toMatchObject({ host: '/run/foldspar', port: 5432 });
});

it('says what to do when nothing is configured', () => {
  expect(() => databaseConfig({})).toThrow('start the application with npm start');
});

it('refuses a socket whose name no client would find', () => {
  expect(() => socketConfig('/run/foldspar/database.sock')).toThrow(RangeError);
});
