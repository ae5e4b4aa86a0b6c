import type { ResultValue, ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { levelOfRms, rmsOfLevel } from '../spectrum/level'
import { wavelengthOf } from './radiated-field'

/** A plane that reflects in phase doubles the field at most. */
const reflected = 2

/** The field in free space and over a ground plane, and the current that a limit allows. */
export function fieldResults(
  field: number,
  current: number,
  limit: number | undefined,
): readonly ResultValue[] {
  return [
    main('level', 'Field level in free space', 'E', 'dBµV/m', levelOfRms(field)),
    main(
      'levelOverGround',
      'Field level with full ground reflection',
      'E',
      'dBµV/m',
      levelOfRms(reflected * field),
    ),
    step('field', 'Field strength in free space', 'E', 'V/m', field),
    step('fieldOverGround', 'Field strength with full ground reflection', '2E', 'V/m', reflected * field),
    ...(limit === undefined ? [] : limitResults(field, current, limit)),
  ]
}

function limitResults(field: number, current: number, limit: number): readonly ResultValue[] {
  const allowed = (rmsOfLevel(limit) / field) * current
  return [
    main('allowedCurrent', 'Current that the limit allows in free space', 'I', 'A', allowed),
    main(
      'allowedOverGround',
      'Current that the limit allows with full reflection',
      'I',
      'A',
      allowed / reflected,
    ),
    main(
      'margin',
      'Margin with full ground reflection',
      'limit − E',
      'dB',
      limit - levelOfRms(reflected * field),
    ),
  ]
}

/** Whether a point is in the far field, r above λ/2π. */
export function farFieldCheck(frequency: number, distance: number): ValidityCheck {
  const isFar = distance > wavelengthOf(frequency) / (2 * Math.PI)
  return {
    passed: isFar,
    sentence: isFar
      ? 'The distance is beyond λ/2π: far field, as the formula needs.'
      : 'The distance is below λ/2π: in the near field the formula does not hold.',
  }
}

/** Whether a source is electrically short, below λ/4. */
export function shortSourceCheck(frequency: number, length: number, what: string): ValidityCheck {
  const isShort = length < wavelengthOf(frequency) / 4
  return {
    passed: isShort,
    sentence: isShort
      ? `${what} is below a quarter of the wavelength: the current is nearly the same all along.`
      : `${what} is above a quarter of the wavelength: the current is not the same all along, and the formula gives too much.`,
  }
}
