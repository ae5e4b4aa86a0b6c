const securityHeaders = [
  { key: 'strict-transport-security', value: 'max-age=63072000; includeSubDomains' },
  { key: 'referrer-policy', value: 'same-origin' },
  { key: 'x-content-type-options', value: 'nosniff' },
  { key: 'x-frame-options', value: 'DENY' },
  { key: 'permissions-policy', value: 'camera=(), microphone=(), geolocation=()' },
  { key: 'cross-origin-opener-policy', value: 'same-origin' },
]

/** @type {import('next').NextConfig} */
const config = {
  // A second build folder lets a test server and a development server run side by side.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  // Native and worker packages, and the certificate library: bundled, it would run before its reflection polyfill.
  serverExternalPackages: [
    'piscina',
    'better-sqlite3',
    '@node-rs/argon2',
    'pino',
    '@peculiar/x509',
    'reflect-metadata',
  ],
  images: { unoptimized: true },
  poweredByHeader: false,
  productionBrowserSourceMaps: false,
  agentRules: false,
  headers: async () => [{ source: '/:path*', headers: securityHeaders }],
  // `npm test` checks the types once, in a step of its own.
  typescript: { ignoreBuildErrors: true },
  experimental: { agentUpgrade: false },
}

export default config
