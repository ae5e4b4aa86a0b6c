import type { Fact } from '@/lib/core/report/report-document'
import { quantityText } from '@/lib/core/units/format-quantity'

import type { CaptureFacts, GroundMethod } from '../evidence/capture-facts'

const groundWords: Record<GroundMethod, string> = {
  spring: 'Spring at the tip',
  lead: 'Ground lead',
  coaxial: 'Coaxial connection',
  differential: 'Differential probe',
}

/** The stated measurement facts as they are printed; what nobody stated is left out. */
export function factTexts(facts: CaptureFacts): Fact[] {
  const lead = facts.groundLeadMetres === null ? '' : `, ${quantityText(facts.groundLeadMetres, 'm', 3)} long`
  const texts: readonly (readonly [string, string | null])[] = [
    ['Bandwidth', facts.bandwidthHertz === null ? null : quantityText(facts.bandwidthHertz, 'Hz', 3)],
    ['Probe attenuation', facts.probeAttenuation === null ? null : `${facts.probeAttenuation} : 1`],
    [
      'Probe capacitance',
      facts.probeCapacitanceFarads === null ? null : quantityText(facts.probeCapacitanceFarads, 'F', 3),
    ],
    ['Ground method', facts.groundMethod === null ? null : `${groundWords[facts.groundMethod]}${lead}`],
    ['Probed at', facts.probedAt],
    ['Operating condition', facts.operatingCondition],
  ]
  return texts.flatMap(([label, value]) => (value ? [{ label, value }] : []))
}
