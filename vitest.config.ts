import { fileURLToPath } from 'node:url'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('.', import.meta.url))

export default defineConfig({
  resolve: {
    alias: [
      { find: 'server-only', replacement: `${root}tests/support/server-only.ts` },
      { find: /^@\//, replacement: root },
    ],
  },
  test: {
    include: ['tests/{unit,reference,integration,security}/**/*.test.{ts,tsx}'],
    setupFiles: ['tests/support/fail-on-console-error.ts', 'tests/support/property-seed.ts'],
    server: { deps: { inline: ['kysely'] } },
    testTimeout: 60_000,
    hookTimeout: 60_000,
    maxWorkers: 2,
  },
})
