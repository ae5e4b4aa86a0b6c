import { randomBytes } from 'node:crypto'

import type { Ids } from '@/lib/ports/ids'

/** Crockford's base 32: no letter is mistaken for a digit when read aloud. */
const alphabet = '0123456789abcdefghjkmnpqrstvwxyz'

function newId(): string {
  let value = BigInt(`0x${randomBytes(16).toString('hex')}`)
  let id = ''
  for (let position = 0; position < 26; position += 1) {
    id = alphabet.charAt(Number(value & 31n)) + id
    value >>= 5n
  }
  return id
}

export const randomIds: Ids = { newId, newSecret: () => randomBytes(32).toString('base64url') }
