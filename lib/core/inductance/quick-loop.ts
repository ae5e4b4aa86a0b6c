import { noSolution, type MethodError, type ResultValue } from '../method/method'
import { main } from '../method/result-value'
import { err, ok, type Result } from '../result'
import { copyCurve } from './copy-curve'
import { outlineOf, takenLoop, type DrawnLoop } from './drawn-loop'

type KnownOutline = {
  readonly outline: ReturnType<typeof outlineOf>
  readonly curve: (distance: number) => number
}

/** By the rows of corners, which stay the same object while tolerances of the conductor are drawn. */
const known = new WeakMap<DrawnLoop['corners'], KnownOutline>()

/**
 * The inductance of a drawn loop through the curve over the distance of its copy, for the many draws of an interval:
 * within 1e-6 of the sum over all pairs.
 */
export function quickLoopResults(values: DrawnLoop): Result<readonly ResultValue[], MethodError> {
  const { outline, curve } = knownOutline(values)
  const taken = takenLoop(values, outline)
  if (!taken.ok) return taken
  const { meanDistance, imageDistance } = taken.value
  const inductance = curve(meanDistance) - (imageDistance === undefined ? 0 : curve(imageDistance))
  return inductance > 0
    ? ok([main('inductance', 'Inductance', 'L', 'H', inductance)])
    : err(noSolution('The conductor is too thick for this loop.', 'conductor'))
}

function knownOutline(values: DrawnLoop): KnownOutline {
  const before = known.get(values.corners)
  if (before !== undefined) return before
  const outline = outlineOf(values)
  const found = { outline, curve: outline.ok ? copyCurve(outline.value) : () => Number.NaN }
  known.set(values.corners, found)
  return found
}
