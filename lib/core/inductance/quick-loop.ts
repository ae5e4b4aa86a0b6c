import { noSolution, type MethodError, type ResultValue } from '../method/method'
import { main } from '../method/result-value'
import { err, ok, type Result } from '../result'
import { copyCurve } from './copy-curve'
import { takenLoop, type DrawnLoop } from './drawn-loop'

type Curve = (distance: number) => number

/** By the rows of corners, which stay the same object while tolerances of the conductor are drawn. */
const curves = new WeakMap<DrawnLoop['corners'], Curve>()

/**
 * The inductance of a drawn loop through the curve over the distance of its copy, for the many draws of an interval:
 * within 1e-6 of the sum over all pairs.
 */
export function quickLoopResults(values: DrawnLoop): Result<readonly ResultValue[], MethodError> {
  const taken = takenLoop(values)
  if (!taken.ok) return taken
  const { polygon, meanDistance, imageDistance } = taken.value
  const curve = curves.get(values.corners) ?? copyCurve(polygon)
  curves.set(values.corners, curve)
  const inductance = curve(meanDistance) - (imageDistance === undefined ? 0 : curve(imageDistance))
  return inductance > 0
    ? ok([main('inductance', 'Inductance', 'L', 'H', inductance)])
    : err(noSolution('The conductor is too thick for this loop.', 'conductor'))
}
