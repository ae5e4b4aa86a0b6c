import { describe, expect, it } from 'vitest'

import type { RawInput } from '@/lib/core/method/input-definition'
import { findMethod } from '@/lib/core/method/registry'
import type { MethodRun } from '@/lib/core/method/run-method'
import type { RawTolerance } from '@/lib/core/method/read-tolerances'
import { circularLoop } from '@/lib/core/inductance/loop'

import { circleOf } from './loops-for-tests'

type Raw = Readonly<Record<string, RawInput>>

const answerOf = (id: string, raw: Raw, tolerances?: Readonly<Record<string, RawTolerance>>) => {
  const method = findMethod(id)
  if (method === undefined) throw new Error(`There is no method ${id}`)
  return method.run({ ...method.example, ...raw }, tolerances)
}

const runOf = (id: string, raw: Raw = {}, tolerances?: Readonly<Record<string, RawTolerance>>): MethodRun => {
  const answer = answerOf(id, raw, tolerances)
  if (!answer.ok) throw new Error(answer.error.message)
  return answer.value
}

const result = (run: MethodRun, key: string): number =>
  run.outcome.results.find((candidate) => candidate.key === key)?.value ?? Number.NaN

const fieldsOf = (id: string, raw: Raw): readonly string[] => {
  const answer = answerOf(id, raw)
  return answer.ok ? [] : Object.keys(answer.error.fields)
}

const wire = { conductor: 'wireSurface', wireRadius: '0.2 mm', height: '' }

describe('a drawn loop', () => {
  it('of many corners is the circle', () => {
    const run = runOf('polygon-loop-inductance', { ...wire, corners: circleOf(300, 0.02) })
    expect(result(run, 'inductance') / circularLoop(0.02, 0.2e-3, 'surface')).toBeCloseTo(1, 3)
    expect(result(run, 'area') / (Math.PI * 0.02 ** 2)).toBeCloseTo(1, 3)
  })

  it('has less over a plane, and tells what the plane takes away', () => {
    const run = runOf('polygon-loop-inductance')
    expect(result(run, 'freeSpace') - result(run, 'image')).toBeCloseTo(result(run, 'inductance'), 18)
    expect(result(run, 'inductance')).toBeLessThan(result(run, 'freeSpace'))
  })

  it('is drawn closed, both axes to the same scale for a plot of 2 to 1', () => {
    const [figure] = runOf('polygon-loop-inductance').outcome.figures
    const outline = figure?.series[0]
    expect([outline?.x[0], outline?.y[0]]).toEqual([outline?.x.at(-1), outline?.y.at(-1)])
    const [x, y] = [figure?.x.range ?? [0, 0], figure?.y.range ?? [0, 1]]
    expect((x[1] - x[0]) / (y[1] - y[0])).toBeCloseTo(2, 10)
  })

  it('has an interval from the tolerance of the height that lies about its value', () => {
    const run = runOf('polygon-loop-inductance', {}, { height: '10 %' })
    const interval = run.uncertainty?.intervals.find(({ key }) => key === 'inductance')
    expect(interval?.low).toBeLessThan(result(run, 'inductance'))
    expect(interval?.high).toBeGreaterThan(result(run, 'inductance'))
  })

  it('names the field at fault', () => {
    const id = 'polygon-loop-inductance'
    expect(fieldsOf(id, { corners: '0, 0\n10 mm, 10 mm\n10 mm, 0\n0, 10 mm' })).toEqual(['corners'])
    expect(fieldsOf(id, { corners: '0, 0\n10 mm, 10 mm' })).toEqual(['corners'])
    expect(fieldsOf(id, { traceWidth: '' })).toEqual(['traceWidth'])
    expect(fieldsOf(id, { conductor: 'wireUniform' })).toEqual(['wireRadius'])
    expect(fieldsOf(id, { traceWidth: '100 mm' })).toContain('traceWidth')
    expect(fieldsOf(id, { ...wire, height: '0.1 mm' })).toEqual(['height'])
  })
})

describe('a straight conductor', () => {
  it('needs the sizes of its shape', () => {
    expect(fieldsOf('partial-inductance', { width: '' })).toEqual(['width'])
    expect(fieldsOf('partial-inductance', { shape: 'wire' })).toEqual(['radius'])
    const run = runOf('partial-inductance', { shape: 'wire', radius: '0.5 mm', length: '1 m' })
    expect(result(run, 'uniform') - result(run, 'surface')).toBeCloseTo(50e-9, 10)
  })
})

describe('vias in parallel', () => {
  it('are listed with their shares, which add up', () => {
    const run = runOf('via-array-inductance')
    const rows = run.outcome.choices[0]?.rows ?? []
    expect(rows).toHaveLength(6)
    expect(rows.reduce((sum, row) => sum + Number(row[3]), 0)).toBeCloseTo(100, 10)
    expect(fieldsOf('via-array-inductance', { positions: '0, 0\n0.2 mm, 0' })).toContain('positions')
  })
})

describe('planes and pairs', () => {
  it('refuse what touches', () => {
    expect(fieldsOf('plane-spreading-inductance', { outerRadius: '0.2 mm' })).toEqual(['outerRadius'])
    expect(result(runOf('plane-spreading-inductance'), 'ring') * 1e12).toBeCloseTo(83.994, 3)
  })

  it('of unlike widths are found, and of like widths where one is left out', () => {
    const like = runOf('coplanar-pair-inductance', { width1: '1 mm', gap: '0.5 mm', length: '' })
    expect(result(like, 'edges') * 1e9).toBeCloseTo(661.1547, 4)
    const unlike = runOf('coplanar-pair-inductance', { width1: '0.3 mm', width2: '2 mm', gap: '0.2 mm' })
    expect(result(unlike, 'edges') * 1e9).toBeCloseTo(602.6969, 4)
  })

  it('carry thickness for a trace over a plane', () => {
    const raw = { width: '0.5 mm', height: '0.2 mm', length: '' }
    const thick = runOf('trace-over-plane-inductance', { ...raw, thickness: '35 µm' })
    expect(result(thick, 'perLength') * 1e9).toBeCloseTo(246.911, 3)
    expect(result(thick, 'thin')).toBeGreaterThan(result(thick, 'perLength'))
  })
})
