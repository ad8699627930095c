const everywhere = [
  { key: 'x-content-type-options', value: 'nosniff' },
  { key: 'referrer-policy', value: 'same-origin' },
  { key: 'cross-origin-opener-policy', value: 'same-origin' },
  { key: 'cross-origin-resource-policy', value: 'same-origin' },
  {
    key: 'permissions-policy',
    value:
      'accelerometer=(), camera=(), display-capture=(), geolocation=(), gyroscope=(), microphone=(), payment=(), usb=()',
  },
];

// An answer of the API is no page: nothing in it may run, whatever a browser takes it for.
const answers = [{ key: 'content-security-policy', value: "default-src 'none'; frame-ancestors 'none'" }];

/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  poweredByHeader: false,
  reactStrictMode: true,
  typescript: { tsconfigPath: 'tsconfig.build.json' },
  serverExternalPackages: ['pg', 'nodemailer'],
  headers: async () => [
    { source: '/:path*', headers: everywhere },
    { source: '/api/:path*', headers: answers },
    // Fonts carry no version in their names, so not for ever.
    { source: '/fonts/:path*', headers: [{ key: 'cache-control', value: 'public, max-age=604800' }] },
  ],
};

export default config;
