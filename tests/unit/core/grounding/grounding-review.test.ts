import { describe, expect, it } from 'vitest'

import { findMethod } from '@/lib/core/method/registry'

const answers = {
  onePoint: 'yes',
  switchCurrents: 'no',
  hotLoop: 'unseen',
  layerChanges: 'yes',
  uncutPlane: 'yes',
  connectors: 'no',
  quietSense: 'yes',
}

function reviewOf(given: Readonly<Record<string, string>>) {
  const run = findMethod('grounding-review')?.run(given)
  if (!run?.ok) throw new Error('A review was expected')
  return run.value.outcome
}

describe('the grounding review', () => {
  it('counts, and says of each item why it matters and what to do', () => {
    const { results, choices, validity } = reviewOf(answers)
    expect(Object.fromEntries(results.map(({ key, value }) => [key, value]))).toEqual({
      toChange: 2,
      unseen: 1,
      asItShould: 4,
    })
    const rows = choices[0]?.rows ?? []
    expect(rows).toHaveLength(7)
    expect(rows.find(([, answer]) => answer === 'No')?.[3]).toMatch(/^Close the pulsed loop/u)
    expect(rows.filter(([, answer]) => answer === 'Yes').every(([, , , todo]) => todo === 'Nothing')).toBe(
      true,
    )
    expect(validity[0]?.passed).toBe(false)
  })

  it('is common practice and says so', () => {
    expect(findMethod('grounding-review')?.sources).toEqual([
      { citation: 'Items of the review', standing: 'common practice, no source' },
    ])
  })

  it('takes no answer but the three', () => {
    expect(findMethod('grounding-review')?.run({ ...answers, hotLoop: 'perhaps' })).toMatchObject({
      ok: false,
      error: { fields: { hotLoop: expect.stringContaining('yes, no, unseen') } },
    })
  })
})
