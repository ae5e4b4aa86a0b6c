import { readFileSync } from 'node:fs'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { compareCaptures, listComparable } from '@/lib/domain/evidence/compare-captures.service'

import { openTestEngagement, type TestEngagement } from '../support/engagement'
import { sendCapture } from '../support/evidence'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const reference = (name: string) =>
  readFileSync(new URL(`../reference/captures/${name}`, import.meta.url), 'latin1')

const compare = (first: string, second: string, input: object = {}) =>
  compareCaptures.execute(portal.deps, osterby.engineer, { first, second, ...input })

/** A step of 5 V after `before` samples of 1 ns, on a ramp of ten samples. */
function step(before: number): string {
  const rows = Array.from({ length: 2000 }, (_, index) => {
    const progress = Math.min(1, Math.max(0, (index - before) / 10))
    return `${index}e-9,${5 * progress + 0.01 * Math.sin(index)}`
  })
  return ['Time (s),SW (V)', ...rows].join('\n')
}

describe('two captures', () => {
  it('are aligned by the middle of their edges', async () => {
    const { evidenceId: first } = await sendCapture(portal, osterby, step(400))
    const { evidenceId: second } = await sendCapture(portal, osterby, step(700))
    const compared = valueOf(await compare(first, second))
    expect(compared.isAligned).toBe(true)
    expect(compared.shiftSeconds).toBeCloseTo(300e-9, 10)
    expect(compared.first.edgeSeconds).toBeCloseTo(405e-9, 10)
  })

  it('of the reference set, before and after added capacitance, lie at the same edge', async () => {
    const { evidenceId: bare } = await sendCapture(portal, osterby, reference('o01_bare.csv'))
    const { evidenceId: loaded } = await sendCapture(portal, osterby, reference('o02_with_cadd_470pF.csv'))
    const { shiftSeconds } = valueOf(await compare(bare, loaded))
    // Both were triggered at the same source edge; the loaded node is slower by less than its rise time.
    expect(Math.abs(shiftSeconds)).toBeLessThan(2.7e-9)
  })

  it('without an edge stand at the times of their files', async () => {
    const { evidenceId: first } = await sendCapture(portal, osterby, step(400))
    const flat = ['Time (s),SW (V)', ...Array.from({ length: 500 }, (_, i) => `${i}e-9,${i % 7}`)].join('\n')
    const { evidenceId: second } = await sendCapture(portal, osterby, flat)
    expect(valueOf(await compare(first, second)).second.edgeSeconds).toBeNull()
  })

  it('AZ2: of somebody else answer as unknown ones, and one of each engagement likewise', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const { evidenceId: own } = await sendCapture(portal, osterby)
    const { evidenceId: foreign } = await sendCapture(portal, larkfield)
    const unknown = portal.deps.ids.newId()
    expect(await compare(own, foreign)).toEqual(await compare(own, unknown))
    expect(await compare(own, foreign)).toMatchObject({ error: { code: 'not_found' } })
    const listed = valueOf(
      await listComparable.execute(portal.deps, osterby.engineer, { engagementId: osterby.engagementId }),
    )
    expect(listed.map(({ evidenceId }) => evidenceId)).toEqual([own])
  })

  it('are refused where a channel is not there', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    expect(await compare(evidenceId, evidenceId, { secondChannel: '5' })).toMatchObject({
      error: { code: 'no_such_channel' },
    })
  })
})
