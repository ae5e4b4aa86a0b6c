import { err, ok, type Result } from '../result'
import { minutes, type Minutes } from './minutes'

/** A block of bought hours with what is left of it; valid from `validFrom` and before `validUntil`, UTC milliseconds. */
export type OpenBlock = {
  readonly id: string
  readonly remaining: Minutes
  readonly validFrom: number
  readonly validUntil: number
}

/** Minutes to take from a block; positive. */
export type Allocation = { readonly blockId: string; readonly minutes: Minutes }

export type InsufficientHours = {
  readonly code: 'insufficient_hours'
  readonly needed: Minutes
  readonly available: Minutes
}

const isValidAt = (block: OpenBlock, now: number): boolean =>
  block.remaining > 0 && block.validFrom <= now && now < block.validUntil

/** The oldest block first; of blocks equally old, the one that expires first. */
const byAge = (a: OpenBlock, b: OpenBlock): number =>
  a.validFrom - b.validFrom || a.validUntil - b.validUntil || (a.id < b.id ? -1 : 1)

/**
 * Divides a debit among the blocks that are valid now, the oldest first. All or nothing.
 * Error: `insufficient_hours` with what is needed and what is available. `needed` is more than 0.
 */
export function allocateDebit(
  blocks: readonly OpenBlock[],
  needed: Minutes,
  now: number,
): Result<readonly Allocation[], InsufficientHours> {
  if (needed <= 0) throw new RangeError('A debit is of at least one minute')
  const valid = blocks.filter((block) => isValidAt(block, now)).sort(byAge)
  const allocations: Allocation[] = []
  let open: number = needed
  for (const { id, remaining } of valid) {
    const taken = Math.min(open, remaining)
    if (taken > 0) allocations.push({ blockId: id, minutes: minutes(taken) })
    open -= taken
  }
  if (open === 0) return ok(allocations)
  return err({ code: 'insufficient_hours', needed, available: minutes(needed - open) })
}
