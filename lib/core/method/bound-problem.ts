import { quantityText } from '../units/format-quantity'
import type { Unit } from '../units/unit'

type Bounded = {
  readonly label: string
  readonly unit: Unit
  readonly above?: number
  readonly atLeast?: number
  readonly atMost?: number
}

/** What is wrong with a value, as a sentence; null where it is within the bounds of its input. */
export function boundProblem({ label, unit, above, atLeast, atMost }: Bounded, value: number): string | null {
  if (!Number.isFinite(value)) return `${label} must be a finite number.`
  if (above !== undefined && value <= above) return `${label} must be more than ${quantityText(above, unit)}.`
  if (atLeast !== undefined && value < atLeast)
    return `${label} must be at least ${quantityText(atLeast, unit)}.`
  if (atMost !== undefined && value > atMost) return `${label} can be at most ${quantityText(atMost, unit)}.`
  return null
}
