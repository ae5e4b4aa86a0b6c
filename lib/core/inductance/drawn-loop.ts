import type { InputValues } from '../method/input-definition'
import { noSolution, type MethodError } from '../method/method'
import { err, ok, type Result } from '../result'
import { imageDistanceOf, meanDistanceOf, widthOf, type LoopConductor } from './loop-conductor'
import { simplePolygon, type Polygon } from './polygon'
import { conductorFits } from './polygon-loop'
import type { polygonLoopInputs } from './polygon-loop.inputs'

export type DrawnLoop = InputValues<typeof polygonLoopInputs>

/** A drawn loop whose outline, conductor and height belong together. Metres. */
export type TakenLoop = {
  readonly polygon: Polygon
  readonly conductor: LoopConductor
  readonly meanDistance: number
  readonly imageDistance?: number
}

/** Checks what was drawn: the outline is simple, the conductor has its sizes, fits the loop and clears the plane. */
export function takenLoop(values: DrawnLoop, polygon = outlineOf(values)): Result<TakenLoop, MethodError> {
  if (!polygon.ok) return err(noSolution(polygon.error.message, 'corners'))
  const conductor = conductorOf(values)
  if (!conductor.ok) return conductor
  const meanDistance = meanDistanceOf(conductor.value)
  const fits = conductorFits(polygon.value, Math.max(meanDistance, widthOf(conductor.value) / 4))
  if (!fits.ok) return err(noSolution(fits.error.message, 'wireRadius', 'traceWidth'))
  const taken = { polygon: polygon.value, conductor: conductor.value, meanDistance }
  if (values.height === undefined) return ok(taken)
  const image = imageDistanceOf(conductor.value, values.height)
  return image.ok
    ? ok({ ...taken, imageDistance: image.value })
    : err(noSolution(image.error.message, 'height'))
}

function conductorOf(values: DrawnLoop): Result<LoopConductor, MethodError> {
  const { conductor: kind, wireRadius, traceWidth, thickness = 35e-6 } = values
  if (kind === 'trace') {
    return traceWidth === undefined
      ? err(noSolution('A trace needs its width.', 'traceWidth'))
      : ok({ kind, width: traceWidth, thickness })
  }
  return wireRadius === undefined
    ? err(noSolution('A wire needs its radius.', 'wireRadius'))
    : ok({ kind, radius: wireRadius })
}

export const outlineOf = ({ corners }: DrawnLoop): ReturnType<typeof simplePolygon> =>
  simplePolygon(corners.map(({ x, y }) => [x, y] as const))
