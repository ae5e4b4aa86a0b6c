/** The extreme of one half cycle about a level. */
export type Swing = { readonly index: number; readonly deviation: number }

/** A swing that fails to come for so many half cycles ends the ring. */
const patience = 2.2

/**
 * The extremes of the half cycles about `level` from `from` on, as long as they go beyond `floor` on alternating sides
 * and follow each other at the pace of the first two.
 */
export function findSwings(
  values: Float64Array,
  from: number,
  to: number,
  level: number,
  floor: number,
): readonly Swing[] {
  const swings: Swing[] = []
  let current: Swing | null = null
  for (let index = from; index < to; index += 1) {
    const deviation = (values[index] ?? 0) - level
    if (current !== null && index - current.index > patience * paceOf(swings, current)) break
    if (current !== null && Math.sign(deviation) === Math.sign(current.deviation)) {
      if (Math.abs(deviation) > Math.abs(current.deviation)) current = { index, deviation }
    } else if (Math.abs(deviation) > floor) {
      if (current !== null) swings.push(current)
      current = { index, deviation }
    }
  }
  return current === null ? swings : [...swings, current]
}

function paceOf(swings: readonly Swing[], current: Swing): number {
  const [first, second = current] = swings
  return first === undefined ? Infinity : second.index - first.index
}
