import { hash, verify } from '@node-rs/argon2'

import type { PasswordHasher } from '@/lib/ports/password-hasher'

/** The real algorithm at its lowest cost, so that tests that sign in do not wait for it. */
export function createQuickHasher(): PasswordHasher {
  return {
    hash: (password) => hash(password, { memoryCost: 8, timeCost: 1, parallelism: 1 }),
    verify: async (storedHash, password) => (storedHash === null ? false : verify(storedHash, password)),
  }
}
