import { spawn } from 'node:child_process'
import { createServer } from 'node:net'

import { localSettings } from './local-settings.mjs'
import { runScript } from './run.mjs'
import { say, stop } from './say.mjs'

/**
 * Migrates and seeds the data folder, then starts the local fakes and the built portal. Ends all of them together.
 * @returns the addresses, once the portal answers.
 */
export async function serveLocally(place) {
  for (const port of [place.port, place.stripePort, place.resendPort]) await requireFree(port)
  const settings = localSettings(place)
  const env = { ...process.env, ...settings }
  say('Bringing the database up to date and filling in the demo scenario')
  await runScript('lib/commands/migrate.ts', [], { env })
  const children = [
    spawn('node_modules/.bin/tsx', ['tests/fakes/start.ts'], { env, stdio: ['ignore', 'ignore', 'inherit'] }),
    spawn('node_modules/.bin/next', ['start', '-p', String(place.port)], {
      env,
      stdio: ['ignore', place.log ?? 'ignore', 'inherit'],
    }),
  ]
  endTogether(children)
  await untilAnswering(`${settings.PUBLIC_URL}/sign-in`)
  await untilAnswering(settings.STRIPE_API_BASE)
  await runScript('lib/commands/seed-demo.ts', [], { env })
  return { portal: settings.PUBLIC_URL, payments: settings.STRIPE_API_BASE, mail: settings.RESEND_API_BASE }
}

function requireFree(port) {
  return new Promise((resolve) => {
    const probe = createServer()
    probe.once('error', () =>
      stop(`Port ${port} is in use. Stop what uses it, or choose another with PORT=….`),
    )
    probe.listen(port, () => probe.close(resolve))
  })
}

function endTogether(children) {
  const endAll = () => children.forEach((child) => child.kill('SIGTERM'))
  for (const signal of ['SIGINT', 'SIGTERM', 'exit']) process.on(signal, endAll)
  process.on('SIGINT', () => process.exit(0))
  process.on('SIGTERM', () => process.exit(0))
  for (const child of children) {
    child.once('exit', (code) => {
      endAll()
      process.exit(code ?? 0)
    })
  }
}

async function untilAnswering(address) {
  for (let attempt = 0; attempt < 120; attempt += 1) {
    const isUp = await fetch(address, { redirect: 'manual' }).then(
      () => true,
      () => false,
    )
    if (isUp) return
    await new Promise((resolve) => setTimeout(resolve, 250))
  }
  stop(`${address} did not answer within 30 s; the lines above say why.`)
}
