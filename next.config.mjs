/** @type {import('next').NextConfig} */
const config = {
  typedRoutes: true,
  poweredByHeader: false,
  reactStrictMode: true,
  typescript: { tsconfigPath: 'tsconfig.build.json' },
  serverExternalPackages: ['pg', 'nodemailer'],
};

export default config;
