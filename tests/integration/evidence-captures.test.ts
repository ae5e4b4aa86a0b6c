import { readFileSync } from 'node:fs'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { capturePoints } from '@/lib/domain/evidence/capture.service'
import { finishInterruptedChecks } from '@/lib/domain/evidence/check-capture'
import { getEvidence, stateFacts } from '@/lib/domain/evidence/evidence.service'
import { receiveEvidence } from '@/lib/domain/evidence/upload.service'

import { openTestEngagement, type TestEngagement } from '../support/engagement'
import { sendCapture, sendEvidence } from '../support/evidence'
import { bytesOf, captureText, pdfBytes, streamOf } from '../support/sample-files'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const read = async (evidenceId: string) =>
  valueOf(await getEvidence.execute(portal.deps, osterby.engineer, { evidenceId }))

const sendPdf = async () => valueOf(await sendEvidence(portal, osterby, { name: 'a.pdf', bytes: pdfBytes() }))

describe('a capture', () => {
  it('is read at once: its time base, its channels in SI, and its samples to the last digit', async () => {
    const { evidenceId, status } = await sendCapture(
      portal,
      osterby,
      'Time (ns),SW (mV),I (A)\n0,1,0.5\n2,-2.5,1\n4,3,1.5\n6,0,2\n',
    )
    expect(status).toBe('ready')
    const { capture } = await read(evidenceId)
    expect(capture).toMatchObject({ samples: 4, startSeconds: 0 })
    expect(capture?.intervalSeconds).toBeCloseTo(2e-9, 20)
    expect(capture?.channels).toMatchObject([
      { name: 'SW', unit: 'V', minimum: -0.0025, maximum: 0.003 },
      { name: 'I', unit: 'A', minimum: 0.5, maximum: 2 },
    ])
    const samples = readFileSync(portal.deps.files.pathOf(`${evidenceId}.ch0.f64`))
    expect([...new Float64Array(new Uint8Array(samples).buffer)]).toEqual([0.001, -0.0025, 0.003, 0])
  })

  it('gives its points decimated without losing a spike, and the samples themselves when zoomed in', async () => {
    const { evidenceId } = await sendCapture(
      portal,
      osterby,
      captureText({ samples: 200_000, spikeAt: 123_456 }),
    )
    const points = async (view: object) =>
      valueOf(
        await capturePoints.execute(portal.deps, osterby.engineer, {
          evidenceId,
          channel: '0',
          buckets: '500',
          ...view,
        }),
      )
    const whole = await points({})
    expect(whole.x).toHaveLength(500)
    expect(Math.max(...whole.max)).toBe(99)
    expect(whole.x.every((x, index) => index === 0 || x > (whole.x[index - 1] ?? 0))).toBe(true)
    const near = await points({ from: '123.450e-6', to: '123.460e-6' })
    expect(near.x.length).toBeLessThan(20)
    expect(near.min).toEqual(near.max)
    const spike = near.max.indexOf(99)
    expect(near.x[spike]).toBeCloseTo(123.456e-6, 12)
  })

  it('is asked only for channels that it has and a window that makes sense', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    const ask = (input: object) =>
      capturePoints.execute(portal.deps, osterby.engineer, { evidenceId, ...input })
    expect(await ask({ channel: '7' })).toMatchObject({ error: { code: 'no_such_channel' } })
    expect(await ask({ from: 'x' })).toMatchObject({ error: { code: 'invalid_input' } })
    expect((await ask({ from: '5', to: '-5' })).ok).toBe(true)
    const { evidenceId: pdf } = await sendPdf()
    const none = await capturePoints.execute(portal.deps, osterby.engineer, { evidenceId: pdf })
    expect(none).toMatchObject({ error: { code: 'not_a_capture' } })
  })

  describe('whose check was cut off', () => {
    const stopping = () => ({
      ...portal.deps,
      captures: { analyse: () => Promise.reject(new Error('stopped')) },
    })

    async function sendAndStop(): Promise<string> {
      const bytes = bytesOf(captureText())
      const sent = receiveEvidence.execute(stopping(), osterby.engineer, {
        engagementId: osterby.engagementId,
        name: 'sw.csv',
        contentLength: bytes.byteLength,
        body: streamOf(bytes),
      })
      await expect(sent).rejects.toThrow('stopped')
      const [row] = await portal.db.selectFrom('evidence').selectAll().execute()
      expect(row?.status).toBe('checking')
      return row?.id ?? ''
    }

    it('is checked at the next start', async () => {
      const evidenceId = await sendAndStop()
      expect(await finishInterruptedChecks(portal.deps)).toBe(1)
      expect(await read(evidenceId)).toMatchObject({ status: 'ready', capture: { samples: 100 } })
    })

    it('and cut off again is marked as not readable and does not stop the start', async () => {
      const evidenceId = await sendAndStop()
      await finishInterruptedChecks(stopping())
      expect(await read(evidenceId)).toMatchObject({
        status: 'refused',
        refusal: expect.stringContaining('cut off twice'),
      })
      expect(await finishInterruptedChecks(portal.deps)).toBe(0)
    })
  })
})

describe('the facts of a measurement', () => {
  const facts = {
    bandwidthHertz: '500 MHz',
    probeAttenuation: '10x',
    probeCapacitanceFarads: '9.5p',
    groundMethod: 'lead',
    groundLeadMetres: '150 mm',
    probedAt: 'SW to source of Q2',
    operatingCondition: '48 V, 2.5 A',
  }
  const state = (evidenceId: string, stated: object) =>
    stateFacts.execute(portal.deps, osterby.engineer, { evidenceId, ...stated })

  it('say what each missing one rules out, and cap the usable frequency at 20 MHz until a bandwidth is stated', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    const { capture } = await read(evidenceId)
    expect(capture?.consequences.highestUsableHertz).toBe(20e6)
    expect(capture?.consequences.missing.map((missing) => missing.fact)).toEqual([
      'bandwidthHertz',
      'probeAttenuation',
      'probeCapacitanceFarads',
      'groundMethod',
      'probedAt',
      'operatingCondition',
    ])
    expect(capture?.consequences.missing[0]?.rulesOut).toContain(
      'cannot support a finding above 20.0\u00a0MHz',
    )
  })

  it('are kept in SI; the usable frequency is the lower of bandwidth and a fifth of the sample rate', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    valueOf(await state(evidenceId, facts))
    const { capture } = await read(evidenceId)
    expect(capture?.facts).toEqual({
      bandwidthHertz: 500e6,
      probeAttenuation: 10,
      probeCapacitanceFarads: 9.5e-12,
      groundMethod: 'lead',
      groundLeadMetres: 0.15,
      probedAt: 'SW to source of Q2',
      operatingCondition: '48 V, 2.5 A',
    })
    expect(capture?.consequences.missing).toEqual([])
    expect(capture?.consequences.highestUsableHertz).toBeCloseTo(200e6, 0)
    expect(capture?.lastStated).toEqual({ by: osterby.engineer.name, at: portal.clock.now() })
  })

  it('name the ring of the ground lead: 150 nH and 10 pF ring at 130 MHz', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    const { remarks } = valueOf(await state(evidenceId, { ...facts, probeCapacitanceFarads: '10p' }))
    expect(remarks.some((remark) => remark.includes('130\u00a0MHz'))).toBe(true)
  })

  it('are taken back by an empty entry, and a lead length is dropped with the lead', async () => {
    const { evidenceId } = await sendCapture(portal, osterby)
    valueOf(await state(evidenceId, facts))
    valueOf(await state(evidenceId, { ...facts, bandwidthHertz: '', groundMethod: 'spring' }))
    const { capture } = await read(evidenceId)
    expect(capture?.facts).toMatchObject({
      bandwidthHertz: null,
      groundMethod: 'spring',
      groundLeadMetres: null,
    })
  })

  it.each([
    ['bandwidthHertz', '-1M'],
    ['bandwidthHertz', '500 V'],
    ['probeAttenuation', 'ten'],
    ['groundMethod', 'glue'],
    ['status', 'ready'],
  ])('AZ6: %s = %j is refused', async (field, value) => {
    const { evidenceId } = await sendCapture(portal, osterby)
    const refused = await state(evidenceId, { ...facts, [field]: value })
    expect(refused).toMatchObject({ error: { code: 'invalid_input' } })
  })

  it('belong to captures only', async () => {
    const { evidenceId } = await sendPdf()
    expect(await state(evidenceId, facts)).toMatchObject({ error: { code: 'not_a_capture' } })
  })
})
