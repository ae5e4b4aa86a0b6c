import { say } from './say.mjs'
import { run, runBin } from './run.mjs'

/** Bundles the worker threads and builds the portal. */
export async function build() {
  say('Building the portal (about half a minute)')
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' }
  await run(process.execPath, ['lib/commands/build-workers.mjs'], { env })
  await runBin('next', ['build'], { env, stdio: ['ignore', 'ignore', 'inherit'] })
}
