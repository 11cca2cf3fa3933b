/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  images: { unoptimized: true },
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'manifold-3d', 'sharp', 'pino'],
};

export default config;
