/** @type {import('next').NextConfig} */
const config = {
  reactStrictMode: true,
  poweredByHeader: false,
  images: { unoptimized: true },
  serverExternalPackages: ['@node-rs/argon2', 'better-sqlite3', 'manifold-3d', 'pino', 'sharp'],
};

export default config;
