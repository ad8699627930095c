/** One year, as ASVS 5.0.0, 3.4.1 asks. */
export const TRANSPORT = 'max-age=31536000; includeSubDomains';

/**
 * The content security policy of a page. Scripts run only with the page's nonce or when such a script loads them; styles may
 * stand in attributes, where the canvas and the slider handles put their places. A development server evaluates code and
 * talks to the page over a web socket.
 */
export function pagePolicy(nonce: string, development: boolean): string {
  const rules = [
    `default-src 'self'`,
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? ` 'unsafe-eval'` : ''}`,
    `style-src 'self' 'unsafe-inline'`,
    `img-src 'self' blob: data:`,
    `font-src 'self'`,
    `connect-src 'self'${development ? ' ws:' : ''}`,
    `worker-src 'self' blob:`,
    `object-src 'none'`,
    `frame-src 'none'`,
    `base-uri 'none'`,
    `form-action 'self'`,
    `frame-ancestors 'none'`,
  ];
  return rules.join('; ');
}
