import { withTx } from '@/db/tx'
import { container } from '@/lib/server/container'

import { seedCatalogue } from './demo-scenario/catalogue'
import { demoPassword, demoPeople, seedPeople } from './demo-scenario/people'

/** Fills an empty database with the invented demo scenario; a database that has people is left alone. */
async function run(): Promise<void> {
  const deps = {
    ...container().deps,
    request: { id: 'demo-seed', address: '127.0.0.1', browserSecret: '' },
  }
  const hasPeople = await deps.db.selectFrom('person').select('id').limit(1).executeTakeFirst()
  if (!hasPeople) {
    await withTx(deps.db, async (tx) => {
      await seedPeople(tx, deps)
      await seedCatalogue(tx, deps)
    })
  }
  await deps.db.destroy()
  const width = Math.max(...demoPeople.map((person) => person.email.length))
  const lines = demoPeople.map((person) => `  ${person.email.padEnd(width)}  ${person.name}`)
  process.stdout.write(`Demo sign-ins, all with the password “${demoPassword}”:\n${lines.join('\n')}\n`)
}

await run()
