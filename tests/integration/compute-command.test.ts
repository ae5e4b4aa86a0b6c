import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'

import { methods } from '@/lib/core/method/registry'

let folder: string

beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'quellbench-compute-'))
})

afterAll(() => rmSync(folder, { recursive: true, force: true }))

function run(command: 'compute' | 'reference', args: readonly string[], input = '') {
  const { status, stdout } = spawnSync('node_modules/.bin/tsx', [`lib/commands/${command}.ts`, ...args], {
    input,
    encoding: 'utf8',
  })
  return { status, stdout }
}

const written = (name: string, content: unknown): string => {
  const file = path.join(folder, name)
  writeFileSync(file, JSON.stringify(content))
  return file
}

const shift = { f0: '102.7 MHz', f1: 64.1e6, cAdd: '470p' }
const runSchema = z.object({
  values: z.record(z.string(), z.number()),
  outcome: z.object({ results: z.array(z.object({ key: z.string(), value: z.number() })) }),
  uncertainty: z.object({ intervals: z.array(z.object({ key: z.string(), low: z.number() })) }).nullable(),
})
const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  code: z.string(),
  fields: z.record(z.string(), z.string()).optional(),
})

describe('npm run compute', () => {
  it('runs a method on a file of inputs', () => {
    const { status, stdout } = run('compute', ['ring-parasitics', written('shift.json', shift)])
    const result = runSchema.parse(JSON.parse(stdout))
    expect(status).toBe(0)
    // 470 pF / ((102.7/64.1)² − 1).
    expect(result.outcome.results.find(({ key }) => key === 'cPar')?.value).toBeCloseTo(299.94e-12, 14)
    expect(result.uncertainty).toBeNull()
  })

  it('reads inputs with tolerances from standard input', () => {
    const given = JSON.stringify({ inputs: shift, tolerances: { cAdd: '5 %' } })
    const { status, stdout } = run('compute', ['ring-parasitics', '-'], given)
    expect(status).toBe(0)
    expect(runSchema.parse(JSON.parse(stdout)).uncertainty?.intervals.length).toBeGreaterThan(0)
  })

  it.each([
    [
      'what has no solution',
      ['ring-parasitics', '-'],
      JSON.stringify({ ...shift, f1: '110M' }),
      'no_solution',
    ],
    ['an unknown field', ['ring-parasitics', '-'], JSON.stringify({ ...shift, f9: 1 }), 'invalid_input'],
    ['text that is no JSON', ['ring-parasitics', '-'], '{', 'invalid_input'],
    ['a list', ['ring-parasitics', '-'], '[1]', 'invalid_input'],
    ['an unknown method', ['perpetual-motion', '-'], '{}', 'unknown_method'],
    ['an unknown option', ['--loud'], '', 'usage'],
    ['nothing', [], '', 'usage'],
    ['a missing capture', ['capture', 'not-there.csv'], '', 'unreadable_file'],
  ])('answers %s with a problem object and ends with 1', (_, args, input, code) => {
    const { status, stdout } = run('compute', args, input)
    expect(status).toBe(1)
    const problem = problemSchema.parse(JSON.parse(stdout))
    expect(problem.code).toBe(code)
    expect(problem.type).toBe(`about:blank#${code}`)
  })

  it('names the fields of refused inputs', () => {
    const { stdout } = run('compute', ['ring-parasitics', '-'], JSON.stringify({ ...shift, f0: '5 nH' }))
    expect(problemSchema.parse(JSON.parse(stdout)).fields?.['f0']).toContain('“5 nH” is an inductance')
  })

  it('lists every method with the schema of its inputs', () => {
    const { status, stdout } = run('compute', ['--list'])
    const listed = z
      .array(z.object({ id: z.string(), inputs: z.object({ required: z.array(z.string()) }) }))
      .parse(JSON.parse(stdout))
    expect(status).toBe(0)
    expect(listed.map(({ id }) => id)).toEqual(methods.map(({ id }) => id))
  })

  it('analyses a capture, one channel of it where one is named', () => {
    const file = 'tests/reference/captures/o05_four_channels.csv'
    const { status, stdout } = run('compute', ['capture', file, '--channel', 'SW'])
    const answer = z
      .object({ channels: z.array(z.object({ name: z.string() })), intervalSeconds: z.number() })
      .parse(JSON.parse(stdout))
    expect(status).toBe(0)
    expect(answer.channels.map(({ name }) => name)).toEqual(['SW'])
  })
})

describe('npm run reference', () => {
  const item = (id: string, expected: object, f1 = 61e6) => ({
    id,
    topic: 'loop.voltage',
    inputs: { l: 8e-9, di: 12, dt: f1 === 61e6 ? 6e-9 : 0 },
    expected,
    tolerance_rel: 1e-9,
    ...(f1 === 61e6 ? {} : { expect_error: true }),
  })

  it('ends with 0 where every case passes, a refusal among them', () => {
    const file = written('good.json', { cases: [item('right', { v: 16 }), item('refused', {}, 0)] })
    const { status, stdout } = run('reference', [file])
    expect(stdout).toMatch(/^PASS +right +loop\.voltage/mu)
    expect(stdout).toMatch(/^PASS +refused .*refused: /mu)
    expect(stdout).toMatch(/^all +2 pass, 0 miss$/mu)
    expect(status).toBe(0)
  })

  it('ends with 1 where one misses, and shows expected, got and difference', () => {
    const file = written('bad.json', { cases: [item('right', { v: 16 }), item('wrong', { v: 17 })] })
    const { status, stdout } = run('reference', [file])
    expect(stdout).toContain('v: expected 17, got 16  rel 5.9e-2  miss')
    expect(stdout).toMatch(/^all +1 pass, 1 miss$/mu)
    expect(status).toBe(1)
  })

  it('judges every described capture of a folder', () => {
    const { status, stdout } = run('reference', ['--captures', 'tests/reference/captures'])
    expect(stdout).toMatch(/^PASS +o01_bare\.csv/mu)
    expect(stdout).toMatch(/^capture\.analysis +\d+ pass, 0 miss/mu)
    expect(status).toBe(0)
  })
})
