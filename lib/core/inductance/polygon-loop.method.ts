import { defineMethod, noSolution, type ResultValue, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { takenLoop, type TakenLoop } from './drawn-loop'
import { widthOf, type LoopConductor } from './loop-conductor'
import { outlineFigure } from './outline-figure'
import type { Polygon } from './polygon'
import { contourOffsetLoop, mutualWithCopy, partialSumLoop } from './polygon-loop'
import { polygonLoopInputs } from './polygon-loop.inputs'
import { polygonLoopTexts } from './polygon-loop.texts'
import { quickLoopResults } from './quick-loop'

/** Inductance of any drawn loop. */
export const polygonLoopInductance = defineMethod({
  id: 'polygon-loop-inductance',
  version: 1,
  ...polygonLoopTexts,
  inputs: polygonLoopInputs,
  example: {
    corners: '0, 0\n40 mm, 0\n40 mm, 10 mm\n15 mm, 10 mm\n15 mm, 30 mm\n0, 30 mm',
    conductor: 'trace',
    traceWidth: '1 mm',
    thickness: '35 µm',
    height: '1.6 mm',
  },
  compute: (values) => {
    const taken = takenLoop(values)
    if (!taken.ok) return taken
    const { polygon, conductor, meanDistance, imageDistance } = taken.value
    const inductance = contourOffsetLoop(polygon, taken.value)
    if (!(inductance > 0)) return err(noSolution('The conductor is too thick for this loop.', 'conductor'))
    return ok({
      results: [
        main('inductance', 'Inductance', 'L', 'H', inductance),
        ...(imageDistance === undefined ? [] : planeResults(polygon, meanDistance, inductance)),
        step('partialSum', 'Sum of partial inductances', 'ΣL_p', 'H', partialSum(taken.value)),
        step('area', 'Area', 'A', 'm²', polygon.area),
        step('perimeter', 'Length of the outline', 'l', 'm', polygon.perimeter),
        step('meanDistance', 'Geometric mean distance of the conductor', 'g', 'm', meanDistance),
      ],
      choices: [],
      validity: checks(polygon, conductor, values.height),
      figures: [outlineFigure(polygon)],
    })
  },
  computeResults: quickLoopResults,
})

function planeResults(polygon: Polygon, meanDistance: number, inductance: number): readonly ResultValue[] {
  const free = mutualWithCopy(polygon, meanDistance)
  return [
    step('freeSpace', 'Without the plane', 'M(g)', 'H', free),
    step('image', 'Taken away by the plane', 'M(2h)', 'H', free - inductance),
  ]
}

function partialSum({ polygon, meanDistance, imageDistance }: TakenLoop): number {
  const free = partialSumLoop(polygon, meanDistance)
  return imageDistance === undefined ? free : free - mutualWithCopy(polygon, imageDistance)
}

function checks(
  polygon: Polygon,
  conductor: LoopConductor,
  height: number | undefined,
): readonly ValidityCheck[] {
  const across = widthOf(conductor)
  const isNarrow = across <= (0.2 * polygon.area) / polygon.perimeter
  const isHigh = height === undefined || across <= height
  return [
    {
      passed: isNarrow,
      sentence: isNarrow
        ? 'The conductor is narrow against the loop: good to about 1 %.'
        : 'The conductor is wide against the loop, more than a fifth of area over length: the corners and the crowding of the current leave several per cent open.',
    },
    ...(height === undefined
      ? []
      : [
          {
            passed: isHigh,
            sentence: isHigh
              ? 'The conductor is no wider than its height over the plane.'
              : 'The conductor is wider than its height over the plane: at high frequency the current crowds to the face over the plane. Compare with the form for a trace over a plane.',
          },
        ]),
  ]
}
