/** @type {import('next').NextConfig} */
const nextConfig = {
  reactStrictMode: true,
  poweredByHeader: false,
  typedRoutes: true,
  agentRules: false,
  cacheComponents: false,
  serverExternalPackages: ['better-sqlite3', '@node-rs/argon2', 'pino'],
  // The network of a workshop is not ours to use: the build asks nobody for advice.
  experimental: { agentUpgrade: false },
  images: { unoptimized: true },
}
export default nextConfig
