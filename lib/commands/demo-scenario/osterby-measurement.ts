import { getEvidence, stateFacts } from '@/lib/domain/evidence/evidence.service'
import { receiveEvidence } from '@/lib/domain/evidence/upload.service'
import { measureRing } from '@/lib/domain/findings/measure.service'
import { runMethod } from '@/lib/domain/findings/run.service'

import { demoCaptures } from './captures'
import type { DemoScene } from './scene'

/** Sends both captures, measures their rings and computes on them. @returns the runs in the order of the argument. */
export async function measureOsterby(scene: DemoScene, engagementId: string): Promise<string[]> {
  const rings: string[] = []
  for (const capture of demoCaptures) {
    const evidenceId = await sendCapture(scene, engagementId, capture)
    const { runId } = await scene.as('consultant', measureRing, { evidenceId, channel: 0 })
    rings.push(runId)
  }
  const [bare = '', loaded = ''] = rings
  const parasitics = await scene.as('consultant', runMethod, {
    engagementId,
    methodId: 'ring-parasitics',
    inputs: {
      f0: { fromRun: bare, key: 'dampedFrequency', tolerance: '0.5 %' },
      f1: { fromRun: loaded, key: 'dampedFrequency', tolerance: '0.5 %' },
      cAdd: { text: '220p', tolerance: '5 %' },
    },
  })
  const snubber = await scene.as('consultant', runMethod, {
    engagementId,
    methodId: 'rc-snubber',
    inputs: {
      lPar: { fromRun: parasitics.runId, key: 'lPar' },
      cPar: { fromRun: parasitics.runId, key: 'cPar' },
      vStep: { text: '48' },
      edge: { text: '1.8n' },
      fSw: { text: '420k' },
    },
  })
  return [...rings, parasitics.runId, snubber.runId]
}

async function sendCapture(
  scene: DemoScene,
  engagementId: string,
  capture: (typeof demoCaptures)[number],
): Promise<string> {
  const bytes = capture.bytes()
  const { evidenceId } = await scene.as('engineer', receiveEvidence, {
    engagementId,
    name: capture.name,
    contentLength: bytes.byteLength,
    body: new Blob([Uint8Array.from(bytes)]).stream(),
  })
  await untilRead(scene, evidenceId)
  await scene.as('engineer', stateFacts, {
    evidenceId,
    bandwidthHertz: '1G',
    probeAttenuation: '10',
    probeCapacitanceFarads: '0.9p',
    groundMethod: 'spring',
    probedAt: 'Switch node, at the drain of the low-side switch',
    operatingCondition: `48 V in, 5 A out. ${capture.facts}`,
  })
  return evidenceId
}

async function untilRead(scene: DemoScene, evidenceId: string): Promise<void> {
  for (let attempt = 0; attempt < 120; attempt += 1) {
    const { status } = await scene.as('engineer', getEvidence, { evidenceId })
    if (status === 'ready') return
    await new Promise((resolve) => setTimeout(resolve, 250))
  }
  throw new Error('A demo capture was not read within 30 s')
}
