import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { smallLoopField } from '@/lib/core/emission/radiated-field'
import { findMethod } from '@/lib/core/method/registry'
import type { Point3 } from '@/lib/core/linear/point'
import { polygonField } from '@/lib/core/near-field/biot-savart'
import { loopAxisField } from '@/lib/core/near-field/loop-axis'
import { magneticDipole } from '@/lib/core/near-field/magnetic-dipole'

function fieldOf(points: readonly Point3[], current: number, at: Point3): Point3 {
  const field = polygonField(points, current, at)
  if (!field.ok) throw new Error(field.error.message)
  return field.value
}

const circle = (sides: number, radius: number): Point3[] =>
  Array.from({ length: sides }, (_, index) => {
    const angle = (2 * Math.PI * index) / sides
    return [radius * Math.cos(angle), radius * Math.sin(angle), 0]
  })

const square: readonly Point3[] = [
  [-1, -1, 0],
  [1, -1, 0],
  [1, 1, 0],
  [-1, 1, 0],
]

describe('the field of a polygon', () => {
  it('in the middle of a square of side s is 2√2 I/(πs)', () => {
    const [x, y, z] = fieldOf(square, 1, [0, 0, 0])
    expect(z).toBeCloseTo((2 * Math.SQRT2) / (2 * Math.PI), 12)
    expect([x, y]).toEqual([0, 0])
  })

  it('tends to that on the axis of a circle', () => {
    for (const z of [0, 0.004, 0.05]) {
      const [, , axial] = fieldOf(circle(2000, 0.01), 0.4, [0, 0, z])
      expect(axial / loopAxisField(0.4, 0.01, z)).toBeCloseTo(1, 5)
    }
  })

  it('scales with the current and inversely with the size, and turns with the direction of the current', () => {
    const coordinate = fc.double({ min: -3, max: 3, noNaN: true })
    const factor = fc.double({ min: 0.01, max: 100, noNaN: true })
    fc.assert(
      fc.property(
        fc.tuple(coordinate, coordinate, fc.double({ min: 0.1, max: 3, noNaN: true })),
        factor,
        (at, k) => {
          const field = fieldOf(square, 2, at)
          const larger = square.map(([x, y, z]): Point3 => [k * x, k * y, k * z])
          const scaled = fieldOf(larger, 2 * k, [k * at[0], k * at[1], k * at[2]])
          const turned = fieldOf([...square].reverse(), 2, at)
          for (const axis of [0, 1, 2] as const) {
            expect(scaled[axis]).toBeCloseTo(field[axis], 9)
            expect(turned[axis]).toBeCloseTo(-field[axis], 12)
          }
        },
      ),
    )
  })

  it('far away is that of a magnetic dipole of the same area', () => {
    const at: Point3 = [30, 20, 50]
    const r = Math.hypot(...at)
    const angle = Math.acos(at[2] / r)
    const { radial, transverse } = magneticDipole(4, 1, r, angle)
    expect(Math.hypot(...fieldOf(square, 1, at)) / Math.hypot(radial, transverse)).toBeCloseTo(1, 2)
  })

  it.each([
    ['two corners', square.slice(0, 2), [0, 0, 1], 'too_few_points'],
    ['a doubled corner', [...square, square[0]], [0, 0, 1], 'side_without_length'],
    ['a point on a side', square, [1, 0.3, 0], 'on_the_wire'],
    ['a point at a corner', square, [1, 1, 0], 'on_the_wire'],
  ] as const)('is refused for %s', (_, points, at, code) => {
    expect(polygonField(points as readonly Point3[], 1, at as Point3)).toMatchObject({ error: { code } })
  })

  it('in line with a side takes nothing from it', () => {
    const [x, y, z] = fieldOf(square, 1, [3, 1, 0])
    expect([x, y, z].every(Number.isFinite)).toBe(true)
  })
})

describe('the field of a small loop', () => {
  it('far away is the far field of the emission estimate', () => {
    const { electric, transverse } = magneticDipole(4e-4 * 0.02, 300e6, 1000, Math.PI / 2)
    expect(electric / smallLoopField(300e6, 4e-4, 0.02, 1000)).toBeCloseTo(1, 6)
    expect(electric / transverse).toBeCloseTo(376.73, 2)
  })

  it('near by, on the axis, is that of the loop', () => {
    const radius = 1e-4
    const { radial } = magneticDipole(Math.PI * radius ** 2, 1, 0.05, 0)
    expect(radial / loopAxisField(1, radius, 0.05)).toBeCloseTo(1, 4)
  })

  it('falls by 60 dB a decade near by and by 20 dB far away', () => {
    const at = (r: number) => magneticDipole(1e-6, 1e6, r, Math.PI / 2).transverse
    expect(20 * Math.log10(at(0.01) / at(0.1))).toBeCloseTo(60, 1)
    expect(20 * Math.log10(at(1e4) / at(1e5))).toBeCloseTo(20, 1)
  })

  it('has no radial part in the plane of the loop and no other one on its axis', () => {
    expect(magneticDipole(1e-6, 1e6, 1, Math.PI / 2).radial).toBe(0)
    expect(magneticDipole(1e-6, 1e6, 1, Math.PI)).toMatchObject({ transverse: 0, electric: 0 })
  })
})

describe('the near field of a drawn loop as a method', () => {
  const method = findMethod('polygon-near-field')
  const runAt = (frequency: string) => {
    const run = method?.run({ ...method.example, frequency })
    if (!run?.ok) throw new Error('The worked example was expected to run')
    return run.value.outcome
  }

  // Source: quadrature of the law of Biot and Savart by 200 points a side, outside the project.
  it('gives in its worked example, a loop of 20 mm by 10 mm, 6.8089 A/m', () => {
    const [magnetic] = runAt('').results
    expect(magnetic?.value).toBeCloseTo(6.80892473695, 8)
  })

  // The perimeter of 60 mm is a quarter of the wavelength at 1.25 GHz; 21.5 mm are λ/2π at 2.2 GHz.
  it('checks the loop and the distance against the wavelength', () => {
    const checksAt = (frequency: string) => runAt(frequency).validity.map(({ passed }) => passed)
    expect(checksAt('')).toEqual([])
    expect(checksAt('1.2 GHz')).toEqual([true, true])
    expect(checksAt('1.3 GHz')).toEqual([false, true])
    expect(checksAt('3 GHz')).toEqual([false, false])
  })
})
