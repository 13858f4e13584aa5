/** @type {import('next').NextConfig} */
const nextConfig = {
  // knex requires its optional drivers dynamically; bundling it fails on those that are not installed.
  serverExternalPackages: ['knex', 'pg', 'bullmq', 'ioredis', '@node-rs/argon2', 'nodemailer', 'pino'],
  reactStrictMode: true,
  poweredByHeader: false,
  distDir: process.env.SPINSTEAD_DIST ?? '.next',
  outputFileTracingRoot: import.meta.dirname,
  // forbidden() answers 403 with app/forbidden.tsx.
  experimental: { authInterrupts: true },
  turbopack: { root: import.meta.dirname },
};
export default nextConfig;
