import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { capturePoints } from '@/lib/domain/evidence/capture.service'
import { captureSpectrum } from '@/lib/domain/evidence/capture-spectrum.service'

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

const interval = 10e-9

/** 1 V at 1 MHz and 10 mV at 7.3 MHz on SW, a quarter of it on GATE, and a current. */
function text(samples = 4000): string {
  const rows = Array.from({ length: samples }, (_, index) => {
    const t = index * interval
    const sw = Math.sin(2 * Math.PI * 1e6 * t) + 0.01 * Math.sin(2 * Math.PI * 7.3e6 * t)
    return `${t.toExponential(6)},${sw},${sw / 4},${sw / 10}`
  })
  return ['Time (s),SW (V),GATE (V),I (A)', ...rows].join('\n')
}

describe('the spectrum of a part of a capture', () => {
  const ask = (evidenceId: string, input: object = {}) =>
    captureSpectrum.execute(portal.deps, osterby.engineer, {
      evidenceId,
      channel: '0',
      from: '0',
      to: '1',
      window: 'flat-top-5',
      ...input,
    })

  it('shows sines at their levels, and the bandwidth that they were seen with', async () => {
    const { evidenceId } = await sendCapture(portal, osterby, text())
    const { figure, remark } = valueOf(await ask(evidenceId))
    const [series] = figure.series
    const levelNear = (frequency: number) =>
      Math.max(
        ...(series?.y ?? []).filter((_, index) => Math.abs((series?.x[index] ?? 0) / frequency - 1) < 0.01),
      )
    // 20 lg(1 V/√2/1 µV) = 116.99 dBµV, and 40 dB less.
    expect(levelNear(1e6)).toBeCloseTo(116.99, 1)
    expect(levelNear(7.3e6)).toBeCloseTo(76.99, 1)
    expect(remark).toContain('4,000 samples')
    expect(remark).toContain('equivalent resolution bandwidth')
  })

  it('is refused with a sentence where there is none', async () => {
    const { evidenceId } = await sendCapture(portal, osterby, text(100))
    expect(await ask(evidenceId, { channel: '2' })).toMatchObject({ error: { code: 'not_a_voltage' } })
    expect(await ask(evidenceId, { channel: '9' })).toMatchObject({ error: { code: 'no_such_channel' } })
    expect(await ask(evidenceId, { to: '5e-9' })).toMatchObject({ error: { code: 'not_computable' } })
    expect(await ask(evidenceId, { window: 'round' })).toMatchObject({ error: { code: 'invalid_input' } })
  })

  it('AZ2: of a foreign capture answers as for an unknown one', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const { evidenceId } = await sendCapture(portal, osterby, text(100))
    for (const actor of [larkfield.purchaser, larkfield.engineer, larkfield.consultant]) {
      const answer = (id: string) =>
        captureSpectrum.execute(portal.deps, actor, { evidenceId: id, from: '0', to: '1', window: 'hann' })
      const foreign = await answer(evidenceId)
      expect(foreign).toEqual(await answer(portal.deps.ids.newId()))
      expect(foreign).toMatchObject({ ok: false, error: { code: 'not_found' } })
    }
  })
})

describe('the difference of two channels', () => {
  const ask = (evidenceId: string, minus: string) =>
    capturePoints.execute(portal.deps, osterby.engineer, { evidenceId, channel: '0', minus, buckets: '4000' })

  it('is taken sample by sample', async () => {
    const { evidenceId } = await sendCapture(portal, osterby, text(300))
    const { max } = valueOf(await ask(evidenceId, '1'))
    const { max: whole } = valueOf(
      await capturePoints.execute(portal.deps, osterby.engineer, { evidenceId, buckets: '4000' }),
    )
    expect(max).toHaveLength(300)
    for (const [index, value] of max.entries()) expect(value).toBeCloseTo(0.75 * (whole[index] ?? 0), 9)
  })

  it('is refused for different quantities', async () => {
    const { evidenceId } = await sendCapture(portal, osterby, text(100))
    expect(await ask(evidenceId, '2')).toMatchObject({ error: { code: 'units_differ' } })
  })
})
