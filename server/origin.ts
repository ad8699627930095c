import { env } from './env';

const LOOPBACK = /^(localhost|127(\.\d{1,3}){3}|\[::1\])(:\d{1,5})?$/;

/** True for "localhost:3000", "127.0.0.1" and the like. */
export const isLoopbackHost = (host: string): boolean => LOOPBACK.test(host);

/**
 * Where this server is reached, without a path: the configured address, or this machine's own as the request names it.
 * Any other Host header is somebody's invention and must not get into a mail; it answers null.
 */
export function originOf(headers: Headers): string | null {
  const { url } = env();
  if (url !== null) return url;
  const host = headers.get('host');
  return host !== null && isLoopbackHost(host) ? `http://${host}` : null;
}

/** False when a browser says that the request was made by a page of another site. Programs that send neither header carry no cookies by accident. */
export function isSameOrigin(headers: Headers): boolean {
  const site = headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin') return false;
  const origin = headers.get('origin');
  if (origin === null) return true;
  const { url } = env();
  if (url !== null) return origin === url;
  const host = headers.get('host');
  return host !== null && (origin === `http://${host}` || origin === `https://${host}`);
}
