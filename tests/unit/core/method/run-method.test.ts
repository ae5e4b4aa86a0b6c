import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import type { InputDefinition, QuantityInput, RawInput } from '@/lib/core/method/input-definition'
import { findMethod, methods } from '@/lib/core/method/registry'
import type { MethodRun } from '@/lib/core/method/run-method'

type Raw = Readonly<Record<string, string | number>>

function refused(id: string, raw: Raw, tolerances: Readonly<Record<string, string>> = {}) {
  const result = findMethod(id)?.run(raw, tolerances)
  if (result === undefined || result.ok) throw new Error('A refusal was expected')
  return result.error
}

function ran(id: string, raw: Raw, tolerances: Readonly<Record<string, string>> = {}): MethodRun {
  const result = findMethod(id)?.run(raw, tolerances)
  if (!result?.ok) throw new Error(result?.error.message ?? 'No such method')
  return result.value
}

const shift = { f0: '102.72M', f1: '64.11 MHz', cAdd: '470p' }

describe('reading the inputs of a method', () => {
  it('takes engineering notation and numbers alike', () => {
    expect(ran('ring-parasitics', shift)).toEqual(
      ran('ring-parasitics', { f0: 102.72e6, f1: 64.11e6, cAdd: 470e-12 }),
    )
  })

  it('names every field that needs another look, with what is expected', () => {
    expect(refused('ring-parasitics', { f0: '5 nH', f1: '-1', cAdds: '1n' })).toEqual({
      code: 'invalid_input',
      message: 'Some inputs need another look.',
      fields: {
        f0: '“5 nH” is an inductance; a frequency in Hz is expected here, such as 420k or 102.7 MHz.',
        f1: 'Ring frequency, loaded must be more than 0\u00a0Hz.',
        cAdd: 'Added capacitance is needed.',
        cAdds: 'This method has no input “cAdds”.',
      },
    })
  })

  it.each([NaN, Infinity, -Infinity])('refuses %d', (value) => {
    expect(refused('ring-parasitics', { ...shift, f0: value }).fields).toHaveProperty('f0')
  })

  it('refuses what has no solution and names the field', () => {
    expect(refused('ring-parasitics', { ...shift, f1: '110M' })).toMatchObject({
      code: 'no_solution',
      fields: { f1: expect.stringContaining('must be below the bare one') },
    })
  })

  it.each(['__proto__', 'constructor', 'toString'])('does not mistake “%s” for an input', (key) => {
    expect(
      refused('ring-parasitics', Object.fromEntries([...Object.entries(shift), [key, 1]])).fields,
    ).toHaveProperty([key], `This method has no input “${key}”.`)
  })
})

describe('tolerances of the inputs', () => {
  it('give every result an interval around it and name the input that matters most', () => {
    const run = ran('ring-parasitics', shift, { f0: '1 %', f1: '1 %', cAdd: '1 %' })
    expect(run.uncertainty).toMatchObject({ coverage: 0.95, draws: 10_000 })
    for (const { key, value } of run.outcome.results) {
      const interval = run.uncertainty?.intervals.find((item) => item.key === key)
      expect(interval?.low).toBeLessThan(value)
      expect(interval?.high).toBeGreaterThan(value)
    }
    // dC/C grows by 2q/(q − 1) = 3.3 from a frequency, by 1 from the added capacitance.
    const cPar = run.uncertainty?.intervals.find((item) => item.key === 'cPar')
    expect(cPar?.dominant?.input).toMatch(/^f[01]$/u)
    expect(cPar?.dominant?.share).toBeGreaterThan(0.4)
  })

  it('may be of a value that the method proposes', () => {
    const raw = { lPar: '8n', cPar: '300p', vStep: '12', fSw: '500k' }
    const run = ran('rc-snubber', raw, { rSnub: '5 %' })
    const interval = run.uncertainty?.intervals.find(({ key }) => key === 'rSnub')
    const proposed = run.outcome.results.find(({ key }) => key === 'rSnub')?.value ?? 0
    expect(proposed / 1.05).toBeLessThan(interval?.low ?? 0)
    expect(interval?.low).toBeLessThan(proposed * 0.96)
  })

  it('are named where they cannot be read', () => {
    expect(refused('ring-parasitics', shift, { f0: 'much', zeta0: '5 %', nothing: '1 %' })).toEqual({
      code: 'invalid_input',
      message: 'Some tolerances need another look.',
      fields: {
        'tolerances.f0': expect.stringContaining('“much” is not a tolerance'),
        'tolerances.zeta0': 'Damping ratio, bare is left empty, so it has no tolerance.',
        'tolerances.nothing': 'This method has no input “nothing”.',
      },
    })
  })

  it('that reach where the method has no answer are refused', () => {
    expect(refused('ring-parasitics', { ...shift, f1: '100M' }, { f1: '5 %' })).toMatchObject({
      code: 'no_solution',
      message: expect.stringContaining('Narrow a tolerance.'),
      fields: { 'tolerances.f1': expect.any(String) },
    })
  })

  it('of 0 or left empty change nothing', () => {
    expect(ran('ring-parasitics', shift, { f0: '', cAdd: '0 %' })).toEqual(ran('ring-parasitics', shift))
  })
})

/** Mostly within the bounds of an input, at every order of magnitude; sometimes left empty or out of all bounds. */
function anyValueFor(definition: InputDefinition): fc.Arbitrary<RawInput> {
  switch (definition.kind) {
    case 'choice':
      return fc.constantFrom(...Object.keys(definition.options), ...(definition.isRequired ? [] : ['']))
    case 'table': {
      const cells = Object.entries(definition.columns).map(([key, { unit, ...column }]) => [
        key,
        unit === 'text'
          ? fc.constantFrom('one', 'two', 'three')
          : anyQuantityFor({ ...definition, kind: 'quantity', unit, ...column, isRequired: true }),
      ])
      const row = fc.record(Object.fromEntries(cells) as Record<string, fc.Arbitrary<string | number>>)
      const { leastRows, mostRows } = definition
      const rows = fc.array(row, { minLength: leastRows, maxLength: Math.min(mostRows, leastRows + 6) })
      return definition.isRequired ? rows : fc.oneof(rows, fc.constant(''))
    }
    default:
      return anyQuantityFor(definition)
  }
}

function anyQuantityFor({
  atLeast,
  above,
  atMost,
  isRequired,
}: QuantityInput): fc.Arbitrary<string | number> {
  const low = Math.max(atLeast ?? above ?? 1e-15, 1e-15)
  const high = atMost ?? 1e12
  const within = fc
    .double({ noNaN: true, min: Math.log(low), max: Math.log(high) })
    .map((power) => Math.min(high, Math.max(low, Math.exp(power))))
  const least = Math.ceil(low)
  return fc.oneof(
    { weight: 40, arbitrary: within },
    { weight: 4, arbitrary: fc.integer({ min: least, max: Math.max(least, 50) }) },
    { weight: isRequired ? 0 : 20, arbitrary: fc.constant('') },
    fc.constantFrom(low, high, 0, -1, 1e300, 5e-324),
    fc.double(),
  )
}

/** JSON writes −0 as 0. */
function withoutSignOfZero(value: unknown): unknown {
  if (typeof value === 'number') return value + 0
  if (Array.isArray(value)) return value.map(withoutSignOfZero)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(Object.entries(value).map(([key, part]) => [key, withoutSignOfZero(part)]))
}

describe('every registered method', () => {
  it('has its own id', () => {
    expect(new Set(methods.map(({ id }) => id)).size).toBe(methods.length)
  })

  it.each(methods)('$id names a source, a formula, and helps with every input', (method) => {
    expect(method.sources.length).toBeGreaterThan(0)
    expect(method.formulas.length).toBeGreaterThan(0)
    for (const { help, label, symbol } of Object.values(method.inputs)) {
      expect(help && label && symbol).toBeTruthy()
    }
  })

  it.each(methods)('$id answers its worked example', (method) => {
    expect(method.run(method.example)).toMatchObject({ ok: true })
  })

  it.each(methods)(
    '$id answers any values with finite numbers or a refusal, and the same ones again',
    (method) => {
      const entries = Object.entries(method.inputs).map(([key, definition]) => [key, anyValueFor(definition)])
      const raw = fc.record(Object.fromEntries(entries) as Record<string, fc.Arbitrary<RawInput>>)
      fc.assert(
        fc.property(raw, (values) => {
          const run = method.run(values)
          if (!run.ok) {
            expect(run.error.message).toMatch(/\.$/u)
            return
          }
          // JSON has no NaN and no Infinity: a run that comes back unchanged holds neither.
          const stored = JSON.parse(JSON.stringify(run.value)) as MethodRun
          expect(stored).toEqual(withoutSignOfZero(run.value))
          const again = method.run(stored.values, stored.tolerances)
          expect(withoutSignOfZero(again)).toEqual({ ok: true, value: stored })
        }),
        { numRuns: 40 },
      )
    },
  )
})
