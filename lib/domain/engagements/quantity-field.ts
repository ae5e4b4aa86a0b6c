import { z } from 'zod'

import { parseQuantity } from '@/lib/core/units/parse-quantity'
import type { Unit } from '@/lib/core/units/unit'

type Bounds = {
  /** Zero and less are refused. */
  readonly positive?: boolean
}

const longestEntry = 60

/** A value in engineering notation ("420k", "4n7", "12 V") as a number in the SI unit. */
export const quantityField = (unit: Unit, bounds: Bounds = {}) =>
  z
    .string({ error: 'Enter a value.' })
    .max(longestEntry, 'Shorten this entry.')
    .transform((text, context) => {
      const parsed = parseQuantity(text, unit)
      const fault = parsed.ok ? faultOf(parsed.value, bounds) : parsed.error.message
      if (parsed.ok && fault === null) return parsed.value
      context.addIssue({ code: 'custom', message: fault ?? 'Enter a value.' })
      return z.NEVER
    })

/** As `quantityField`, but an empty entry is null: not known. */
export const optionalQuantity = (unit: Unit, bounds: Bounds = {}) =>
  z.preprocess(
    (value) => (value === undefined || (typeof value === 'string' && value.trim() === '') ? null : value),
    quantityField(unit, bounds).nullable(),
  )

const faultOf = (value: number, { positive }: Bounds): string | null =>
  positive && value <= 0 ? 'This has to be more than zero.' : null
