import { basename, dirname } from 'node:path';
import type { PoolConfig } from 'pg';

const SOCKET_NAME = /^\.s\.PGSQL\.(\d+)$/;

/** How to reach the embedded database at its unix socket, as `pg` wants it. */
export function socketConfig(socket: string): PoolConfig {
  const port = SOCKET_NAME.exec(basename(socket))?.[1];
  if (port === undefined) throw new RangeError(`a database socket is named ".s.PGSQL.<port>", got ${basename(socket)}`);
  return { host: dirname(socket), port: Number(port), user: 'postgres', database: 'postgres' };
}

/** Where the database is: DATABASE_URL names a PostgreSQL server, otherwise the start script names the embedded one's socket. */
export function databaseConfig(env: Readonly<Record<string, string | undefined>> = process.env): PoolConfig {
  if (env.DATABASE_URL !== undefined && env.DATABASE_URL !== '') return { connectionString: env.DATABASE_URL };
  if (env.FOLDSPAR_DB_SOCKET !== undefined && env.FOLDSPAR_DB_SOCKET !== '')
    return socketConfig(env.FOLDSPAR_DB_SOCKET);
  throw new RangeError('neither DATABASE_URL nor FOLDSPAR_DB_SOCKET is set; start the application with npm start');
}
