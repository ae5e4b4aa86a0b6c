import type { Unit } from '../units/unit'
import type { ResultValue } from './method'

/** A zero has no sign: stored as JSON it would come back without it. */
const resultOf =
  (role: ResultValue['role']) =>
  (key: string, label: string, symbol: string, unit: Unit, value: number): ResultValue => ({
    key,
    label,
    symbol,
    unit,
    value: value + 0,
    role,
  })

/** A result that answers the question of the method. */
export const main = resultOf('main')

/** A value on the way, kept so that every step can be followed. */
export const step = resultOf('intermediate')
