import * as fc from 'fast-check'

import type { Point2 } from '@/lib/core/linear/point'
import { simplePolygon, type Polygon } from '@/lib/core/inductance/polygon'

export function polygon(corners: readonly Point2[]): Polygon {
  const taken = simplePolygon(corners)
  if (!taken.ok) throw new Error(taken.error.message)
  return taken.value
}

export const lShape: readonly Point2[] = [
  [0, 0],
  [0.04, 0],
  [0.04, 0.01],
  [0.015, 0.01],
  [0.015, 0.03],
  [0, 0.03],
]

export const circleOf = (sides: number, radius: number): readonly Point2[] =>
  Array.from({ length: sides }, (_, index) => {
    const angle = (2 * Math.PI * index) / sides
    return [radius * Math.cos(angle), radius * Math.sin(angle)] as const
  })

/** Star-shaped outlines about the origin, concave ones among them: simple by construction. Radii 4 to 20 mm. */
export const outlines: fc.Arbitrary<readonly Point2[]> = fc
  .array(fc.double({ min: 0.004, max: 0.02, noNaN: true }), { minLength: 3, maxLength: 9 })
  .map((radii) =>
    radii.map((radius, index) => {
      const angle = (2 * Math.PI * index) / radii.length
      return [radius * Math.cos(angle), radius * Math.sin(angle)] as const
    }),
  )
