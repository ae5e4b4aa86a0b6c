/** @type {import('next').NextConfig} */
const config = {
  // A second build folder lets a test server and a development server run side by side.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  serverExternalPackages: ['piscina', 'better-sqlite3', '@node-rs/argon2'],
  images: { unoptimized: true },
  poweredByHeader: false,
  productionBrowserSourceMaps: false,
  agentRules: false,
  experimental: { agentUpgrade: false },
}

export default config
