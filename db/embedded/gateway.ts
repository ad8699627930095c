import { chmodSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { ClientSession, type Shared } from './session';

export interface Gateway {
  /** Ends every client after the query in hand, then the socket. */
  close(): Promise<void>;
}

/**
 * Listens on a unix socket and lets many clients of the PostgreSQL protocol share one backend.
 * A socket file left by a process that was killed is replaced: call this only under the data folder's lock.
 */
export async function openGateway(path: string, shared: Shared, onFault: (error: unknown) => void): Promise<Gateway> {
  const sessions = new Set<ClientSession>();
  const server = createServer((socket) => {
    const session = new ClientSession(socket, shared, onFault);
    sessions.add(session);
    socket.on('close', () => sessions.delete(session));
  });
  rmSync(path, { force: true });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(path, resolve);
  });
  chmodSync(path, 0o600);
  return {
    close: async () => {
      const closed = new Promise<void>((resolve) => {
        server.close(() => resolve());
      });
      await Promise.all([...sessions].map((session) => session.end()));
      await closed;
    },
  };
}
