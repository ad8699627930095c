import { type NextRequest, NextResponse } from 'next/server';
import { pagePolicy, TRANSPORT } from './server/policy';

/**
 * Gives each page a nonce of its own, which Next puts on every script that it writes. A page made in advance would carry
 * none, so the root layout keeps all pages dynamic. The other headers stand in next.config.mjs.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = btoa(crypto.randomUUID());
  const policy = pagePolicy(nonce, process.env.NODE_ENV === 'development');
  const headers = new Headers(request.headers);
  // Next reads the nonce from the request's copy.
  headers.set('content-security-policy', policy);
  headers.set('x-nonce', nonce);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  // Sent over plain http it would be ignored, and behind a proxy that ends TLS the request itself looks plain.
  if (process.env.FOLDSPAR_URL?.startsWith('https://')) response.headers.set('strict-transport-security', TRANSPORT);
  return response;
}

// Answers of the API and files carry the policies of next.config.mjs.
export const config = { matcher: ['/((?!api/|_next/static/|_next/image|fonts/|icon.svg|favicon.ico).*)'] };
