import { createServer } from 'node:net';
import { Failure } from './failure.mjs';

function listen(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(port, host, () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });
}

/** A port that was free a moment ago. */
export const freePort = (host = '127.0.0.1') => listen(0, host);

/**
 * Reads PORT; throws a Failure on what is no port.
 * @param {Record<string, string | undefined>} env
 */
export function portOf(env = process.env) {
  const text = env.PORT || '3000';
  const port = Number(text);
  if (!/^\d+$/.test(text) || port < 1 || port > 65_535)
    throw new Failure(`PORT must be a number from 1 to 65535, got "${text}".`);
  return port;
}

/** Throws a Failure with a plain sentence when the address can't be listened on. */
export async function assertFree(port, host) {
  try {
    await listen(port, host);
  } catch (error) {
    if (error.code === 'EADDRINUSE')
      throw new Failure(`Port ${port} on ${host} is taken by another program. Stop it, or set PORT to another number.`);
    if (error.code === 'EACCES')
      throw new Failure(`Port ${port} may not be used without more rights. Set PORT to another number.`);
    if (error.code === 'EADDRNOTAVAIL' || error.code === 'ENOTFOUND')
      throw new Failure(`HOST "${host}" is no address of this machine.`);
    throw error;
  }
}

/** Where a browser on this machine finds a server that listens on `host`. */
export function addressOf(host, port) {
  const name = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '::1' : host;
  return `http://${name.includes(':') ? `[${name}]` : name}:${port}`;
}
