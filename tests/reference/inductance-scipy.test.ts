import { execFileSync } from 'node:child_process'
import { fileURLToPath } from 'node:url'

import { describe, expect, it } from 'vitest'
import { z } from 'zod'

import { pythonWithScipy } from '@/lib/commands/python'
import { completeE, completeK } from '@/lib/core/elliptic/complete-integrals'
import { barSelf } from '@/lib/core/inductance/bar'
import { coaxialCircles } from '@/lib/core/inductance/coaxial-circles'
import { filamentMutual } from '@/lib/core/inductance/filament-mutual'
import type { Point2, Point3 } from '@/lib/core/linear/point'
import { simplePolygon } from '@/lib/core/inductance/polygon'
import { contourOffsetLoop } from '@/lib/core/inductance/polygon-loop'
import { tubeSelf } from '@/lib/core/inductance/round-conductor'

import { valueOf } from '../support/value-of'

const python = pythonWithScipy()

const script = fileURLToPath(new URL('./inductance-scipy.py', import.meta.url))

const segments: readonly (readonly [readonly [Point3, Point3], readonly [Point3, Point3]])[] = [
  [
    [
      [0, 0, 0],
      [0.02, 0.005, 0.001],
    ],
    [
      [0.01, -0.004, 0.008],
      [0.025, 0.012, 0.015],
    ],
  ],
  [
    [
      [0, 0, 0],
      [0.03, 0, 0],
    ],
    [
      [0.031, 0.001, 0],
      [-0.004, 0.0013, 0.0002],
    ],
  ],
  [
    [
      [0, 0, 0],
      [0.01, 0, 0],
    ],
    [
      [0.002, -0.006, 0.0005],
      [0.009, 0.007, 0.0005],
    ],
  ],
  [
    [
      [0, 0, 0],
      [0.01, 0, 0],
    ],
    [
      [0.1, 0.2, 0.3],
      [0.12, 0.19, 0.31],
    ],
  ],
]

const corners: readonly Point2[] = [
  [0, 0],
  [0.03, 0],
  [0.012, 0.02],
  [0.01, 0.008],
]

const wanted = {
  moduli: [0, 1e-6, 0.1, 0.5, 0.9, 0.999, 0.9999999],
  segments,
  polygon: { corners, apart: 1e-3 },
  circles: [
    [0.25, 0.2, 0.1],
    [0.01, 0.0099, 0],
    [0.02, 0.001, 0.3],
  ],
  tubes: [
    [1.6e-3, 0.15e-3],
    [0.2e-3, 0.125e-3],
    [0.1, 0.1e-3],
  ],
  bar: [1e-3, 0.2e-3, 5e-3],
} as const

const answerSchema = z.object({
  elliptic: z.array(z.tuple([z.number(), z.number()])),
  segments: z.array(z.number()),
  polygon: z.number(),
  circles: z.array(z.number()),
  tubes: z.array(z.number()),
  bar: z.number(),
})

const askScipy = (executable: string): z.infer<typeof answerSchema> =>
  answerSchema.parse(
    JSON.parse(execFileSync(executable, [script], { input: JSON.stringify(wanted), encoding: 'utf8' })),
  )

const expectNear = (got: number, expected: number | undefined, within: number): void => {
  expect(Math.abs(got / (expected ?? Number.NaN) - 1)).toBeLessThan(within)
}

// Source: scipy.special and scipy.integrate, general-purpose libraries, run in the same test.
describe.skipIf(python === null)('beside scipy (skipped without numpy and scipy)', () => {
  const answer = python === null ? null : askScipy(python)

  it.each(wanted.moduli.map((modulus, index) => [modulus, index] as const))(
    'K and E of the modulus %d',
    (modulus, index) => {
      expectNear(completeK(modulus), answer?.elliptic[index]?.[0], 1e-9)
      expectNear(completeE(modulus), answer?.elliptic[index]?.[1], 1e-14)
    },
  )

  it('segments in space: skew, nearly antiparallel, nearly crossing, far apart', () => {
    for (const [index, [[a0, a1], [b0, b1]]] of segments.entries()) {
      const mutual = valueOf(filamentMutual({ start: a0, end: a1 }, { start: b0, end: b1 }))
      expectNear(mutual, answer?.segments[index], 1e-8)
    }
  })

  it('a concave polygon of four sides', () => {
    const polygon = valueOf(simplePolygon(corners))
    expectNear(contourOffsetLoop(polygon, { meanDistance: wanted.polygon.apart }), answer?.polygon, 1e-8)
  })

  it('coaxial circles', () => {
    for (const [index, [a, b, apart]] of wanted.circles.entries()) {
      expectNear(coaxialCircles(a, b, apart), answer?.circles[index], 1e-9)
    }
  })

  it('a tube, long and short, and a bar', () => {
    for (const [index, [length, radius]] of wanted.tubes.entries()) {
      expectNear(tubeSelf(length, radius), answer?.tubes[index], 1e-8)
    }
    const [width, thickness, length] = wanted.bar
    expectNear(barSelf({ width, thickness, length }), answer?.bar, 1e-7)
  })
})
