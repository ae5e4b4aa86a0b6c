import { openEngagement } from '@/lib/domain/engagements/engagement.service'
import { assignConsultant } from '@/lib/domain/engagements/people.service'
import { approveScope, proposeScope, saveScope } from '@/lib/domain/engagements/scope.service'
import { createFinding, publishFinding } from '@/lib/domain/findings/finding.service'
import { addTime } from '@/lib/domain/hours/time-draft.service'
import { postTime } from '@/lib/domain/hours/posting.service'

import { measureOsterby } from './osterby-measurement'
import { buyHours } from './purchase'
import type { DemoScene } from './scene'

const minute = 60_000

/** The pump controller's story up to a published finding; the report is left for you to compose. */
export async function playOsterby(scene: DemoScene): Promise<void> {
  await buyHours(scene, 'purchaser', scene.ids.companies.osterby)
  const { engagementId } = await scene.as('engineer', openEngagement, {
    companyId: scene.ids.companies.osterby,
    title: '48 V to 12 V buck rings near 180 MHz',
    product: 'Pump controller OP-12, main board revision C (demo)',
    symptom: 'The switch node rings near 180 MHz; radiated class B fails by 4 dB at 181 MHz.',
    alreadyTried: 'A gate resistor of 4.7 Ω: 1.5 dB less, and 2 % less efficiency.',
    goalStandard: 'CISPR 32',
    goalClass: 'B',
    goalTestDate: '2027-01-18',
    vin: '48',
    vout: '12',
    iout: '5',
    switchingFrequency: '420k',
    spreadSpectrum: 'Off',
    oscillators: [
      { name: 'Buck converter', frequency: '420k', tolerancePpm: '50000' },
      { name: 'Controller crystal', frequency: '16M', tolerancePpm: '30' },
    ],
  })
  await agreeScope(scene, engagementId)
  const runIds = await measureOsterby(scene, engagementId)
  const { findingId } = await scene.as('consultant', createFinding, {
    engagementId,
    claim: 'The hot loop of 3.9 nH rings at 180 MHz with 200 pF of node capacitance',
    severity: 'major',
    confidence: 'high',
    reasoning:
      'With 220 pF across the node the ring falls from 180 MHz to 124 MHz, so the node holds 200 pF and the loop 3.9 nH. The failing line at 181 MHz lies on this ring.',
    alternativeCauses:
      'The ground lead of the probe: excluded, a spring was used and its ring lies above 500 MHz.',
    disprovingExperiment:
      'If the line at 181 MHz stays when the snubber is fitted, the ring is not its source.',
    runIds,
    actions: [
      {
        instruction: 'Fit an RC snubber across the low-side switch, as close as the layout allows',
        partValues: 'R_s and C_s as chosen in the snubber run; 1206 with a rating of at least 1 W; C0G 100 V',
        sideEffects: 'Nearly 1 W of heat at 48 V and 420 kHz',
      },
      {
        instruction: 'At the next board revision, move the input ceramics next to the switches',
        partValues: '',
        sideEffects: 'A new layout; less inductance lowers the ring at its root',
      },
    ],
  })
  await scene.as('consultant', publishFinding, { findingId })
  await postHours(scene, engagementId)
}

async function agreeScope(scene: DemoScene, engagementId: string): Promise<void> {
  const { consultant, reviewer } = scene.ids.people
  for (const personId of [consultant, reviewer]) {
    await scene.as('administrator', assignConsultant, { engagementId, personId })
  }
  const body =
    'Find what rings near 180 MHz and whether it explains the failing line; size a change that lowers it, and say how to verify it on the bench.'
  const { scopeId } = await scene.as('consultant', saveScope, { engagementId, body, capHours: '8' })
  await scene.as('consultant', proposeScope, { scopeId })
  await scene.as('purchaser', approveScope, { scopeId })
}

async function postHours(scene: DemoScene, engagementId: string): Promise<void> {
  const begun = scene.deps.clock.now() - 200 * minute
  const { timeEntryId } = await scene.as('consultant', addTime, {
    engagementId,
    workKind: 'analysis',
    text: 'Measured both captures, computed the parasitics and sized a snubber',
    startedAt: new Date(begun).toISOString().slice(0, 16),
    workedMinutes: '94',
  })
  await scene.as('consultant', postTime, { timeEntryId })
}
