import { insertPerson } from '@/db/repositories/person.repo'
import { withTx } from '@/db/tx'
import { normaliseEmail } from '@/lib/domain/identity/email-address'
import { container } from '@/lib/server/container'

/** Makes the first administrator of a new portal, who then sets a password through "Set a new password". */
async function run(): Promise<void> {
  const [address = '', name = ''] = process.argv.slice(2)
  const email = normaliseEmail(address)
  if (email === null || name.trim() === '') {
    process.stderr.write('Usage: npm run create-administrator -- name@practice.example "Full Name"\n')
    process.exitCode = 1
    return
  }
  const { deps, env } = container()
  await withTx(deps.db, (tx) =>
    insertPerson(tx, {
      id: deps.ids.newId(),
      email,
      name: name.trim(),
      password_hash: null,
      is_consultant: 0,
      is_administrator: 1,
      created_at: deps.clock.now(),
      disabled_at: null,
    }),
  )
  await deps.db.destroy()
  process.stdout.write(`${name} can now set a password at ${env.publicUrl}/forgot-password\n`)
}

await run()
