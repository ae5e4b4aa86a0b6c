import { existsSync, mkdtempSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { installPackages } from './install.mjs'
import { build } from './build.mjs'
import { say } from './say.mjs'
import { serveLocally } from './serve-locally.mjs'

// `--fresh-data` serves the build that is there from an empty folder: the browser tests start like this.
const isFresh = process.argv.includes('--fresh-data')
const port = Number(process.env.PORT ?? 3000)

await installPackages()
if (!isFresh || !existsSync('.next/BUILD_ID')) await build()

const addresses = await serveLocally({
  dataFolder: isFresh ? mkdtempSync(path.join(tmpdir(), 'quellbench-')) : path.resolve('.data/demo'),
  port,
  stripePort: port + 1010,
  resendPort: port + 1020,
})

say(`Portal            ${addresses.portal}`)
say(`Test payments     ${addresses.payments}/panel`)
say(`Mail sent so far  ${addresses.mail}`)
say('Stop with Ctrl+C. Demo data; no mail leaves this machine and no money moves.')
