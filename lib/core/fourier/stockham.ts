import { passFive } from './pass-five'
import { passFour } from './pass-four'
import { passThree } from './pass-three'
import { passTwo } from './pass-two'
import { radicesOf, type Radix } from './radices'
import { rootOfUnity } from './twiddles'

type Stage = { readonly radix: Radix; readonly groups: number; readonly at: number }

/** Stages and twiddle factors for one length made of the factors 2, 3 and 5. */
export type StockhamPlan = {
  readonly length: number
  readonly stages: readonly Stage[]
  readonly twiddles: Float64Array
}

const passes = { 2: passTwo, 3: passThree, 4: passFour, 5: passFive } as const

/** Null where the length has a prime factor above 5. */
export function planStockham(length: number): StockhamPlan | null {
  const radices = radicesOf(length)
  if (radices === null) return null
  const stages: Stage[] = []
  const twiddles: number[] = []
  let left = length
  for (const radix of radices) {
    const groups = left / radix
    stages.push({ radix, groups, at: twiddles.length })
    for (let p = 0; p < groups; p += 1) {
      for (let power = 1; power < radix; power += 1) twiddles.push(...rootOfUnity(p * power, left))
    }
    left = groups
  }
  return { length, stages, twiddles: Float64Array.from(twiddles) }
}

/**
 * Transforms `count` interleaved series at once: value n of series q is at n·count + q in `x`, its frequency k at
 * k·count + q in the array that is returned, which is `x` or `y`; both are overwritten. Self-sorting (Stockham), forward.
 *
 * Source: C. Van Loan, Computational Frameworks for the Fast Fourier Transform, 1992, section 1.7 (from memory).
 */
export function runStockham(
  plan: StockhamPlan,
  x: Float64Array,
  y: Float64Array,
  count: number,
): Float64Array {
  let from = x
  let to = y
  let together = count
  for (const { radix, groups, at } of plan.stages) {
    passes[radix](from, to, groups, together, plan.twiddles, at)
    together *= radix
    const spare = from
    from = to
    to = spare
  }
  return from
}
