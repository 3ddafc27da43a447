/** @type {import('next').NextConfig} */
const nextConfig = {
  // A second server beside the first one (tests, a contributor's own port) must not share its build folder.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  // Extending another file stops Next from writing each build folder's types into tsconfig.json. Types are checked by
  // `npm test`; checking them again would double the first start on a small machine.
  typescript: { tsconfigPath: 'tsconfig.build.json', ignoreBuildErrors: true },
  poweredByHeader: false,
  reactStrictMode: true,
  allowedDevOrigins: ['127.0.0.1'],
  turbopack: { root: import.meta.dirname },
};

export default nextConfig;
