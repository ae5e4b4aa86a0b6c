import { readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

import { parseCaseFile } from '@/lib/reference/case-file'
import { runCase } from '@/lib/reference/run-case'
import { topics } from '@/lib/reference/topics'

import { captureBytes } from './capture-bytes'

const cases = parseCaseFile(readFileSync(new URL('./open-cases.json', import.meta.url), 'utf8'))

// Every case was computed by two means outside the project; `how_computed` and `second_means` name them.
describe.each([...new Set(cases.map(({ topic }) => topic))].sort())('reference cases: %s', (topic) => {
  it.each(cases.filter((item) => item.topic === topic).map((item) => [item.id, item] as const))(
    '%s',
    (_id, item) => {
      const report = runCase(item, captureBytes)
      const misses = report.verdicts.filter(({ outcome }) => outcome === 'miss')
      expect({ outcome: report.outcome, remark: report.remark, misses }).toMatchObject({
        outcome: 'pass',
        misses: [],
      })
    },
  )
})

describe('the topics', () => {
  it('are all covered by cases', () => {
    expect([...new Set(cases.map(({ topic }) => topic))].sort()).toEqual(Object.keys(topics).sort())
  })

  it.each(Object.keys(topics))('%s refuses inputs of another kind with a sentence', (topic) => {
    const answered = topics[topic]?.({ nonsense: true }, captureBytes)
    expect(answered).toMatchObject({ ok: false, error: expect.stringMatching(/\S/u) })
  })
})
