import { hash, verify } from '@node-rs/argon2'

import type { PasswordHasher } from '@/lib/ports/password-hasher'

/** argon2id with the first choice of the OWASP password storage sheet: 19 MiB, two passes, one lane. */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

export function createArgon2Hasher(): PasswordHasher {
  const standIn = hash('no account has this password', parameters)
  return {
    hash: (password) => hash(password, parameters),
    verify: async (storedHash, password) => {
      const isRight = await verify(storedHash ?? (await standIn), password)
      return isRight && storedHash !== null
    },
  }
}
