import { fileURLToPath } from 'node:url'

import { say } from './say.mjs'
import { run, runQuietly } from './run.mjs'

/** Bundles the worker threads and builds the portal. */
export async function build() {
  say('Building the portal (about half a minute)')
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' }
  await run(process.execPath, ['lib/commands/build-workers.mjs'], { env })
  await runQuietly('node_modules/.bin/next', ['build'], { env })
}

if (process.argv[1] === fileURLToPath(import.meta.url)) await build()
