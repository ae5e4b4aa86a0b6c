import { createHash, randomBytes } from 'node:crypto'

export type NewId = (prefix: string) => string

/** Identifiers such as `cs_test_…`; the same ones in the same order for the same seed, else unique for ever. */
export function createIds(seed?: number): NewId {
  let count = 0
  return (prefix) => {
    count += 1
    const digits =
      seed === undefined
        ? randomBytes(12).toString('hex')
        : createHash('sha256').update(`${seed}:${count}`).digest('hex').slice(0, 24)
    return `${prefix}_${digits}`
  }
}
