/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  images: { unoptimized: true },
  serverExternalPackages: ['better-sqlite3', 'manifold-3d', 'pino'],
};

export default config;
