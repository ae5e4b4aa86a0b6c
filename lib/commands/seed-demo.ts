import { withTx } from '@/db/tx'
import { container } from '@/lib/server/container'

import { seedCatalogue } from './demo-scenario/catalogue'
import { playLarkfield } from './demo-scenario/larkfield'
import { playOsterby } from './demo-scenario/osterby'
import { demoPassword, demoPeople, seedPeople } from './demo-scenario/people'
import { DemoScene } from './demo-scenario/scene'

/**
 * Fills an empty portal with the invented scenario: its people by rows, everything else by the operations that the
 * pages use. The portal and the local stand-ins must be running. A portal that has people is left alone.
 */
async function run(): Promise<void> {
  const deps = {
    ...container().deps,
    request: { id: 'demo-seed', address: '127.0.0.1', browserSecret: '' },
  }
  const hasPeople = await deps.db.selectFrom('person').select('id').limit(1).executeTakeFirst()
  if (!hasPeople) {
    const ids = await withTx(deps.db, async (tx) => {
      await seedCatalogue(tx, deps)
      return seedPeople(tx, deps)
    })
    const scene = new DemoScene(deps, ids)
    await playOsterby(scene)
    await playLarkfield(scene)
  }
  await deps.db.destroy()
  const width = Math.max(...demoPeople.map((person) => person.email.length))
  const lines = demoPeople.map((person) => `  ${person.email.padEnd(width)}  ${person.name}`)
  process.stdout.write(`Demo sign-ins, all with the password “${demoPassword}”:\n${lines.join('\n')}\n`)
}

await run()
// The worker threads of the capture reader would keep the process alive.
process.exit(0)
