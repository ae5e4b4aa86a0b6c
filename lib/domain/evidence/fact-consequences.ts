import { quantityText } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'

import type { CaptureFacts } from './capture-facts'

/** The bandwidth limit that most oscilloscopes can switch on. Common practice, no source. */
const usualLimitHertz = 20e6

/** Samples that one period of a ring needs to be measured. Common practice, no source. */
const samplesPerPeriod = 5

/** Inductance of a ground lead by its length: 10 nH a centimetre. Common practice, no source. */
const leadHenriesPerMetre = 1e-6

export type FactConsequences = {
  /** min(bandwidth, sample rate / 5); with no bandwidth stated a 20 MHz limit is assumed to have been on. */
  readonly highestUsableHertz: number
  /** What the capture cannot support while a fact is missing. */
  readonly missing: readonly { readonly fact: keyof CaptureFacts; readonly rulesOut: string }[]
  /** What follows from the facts that are known. */
  readonly remarks: readonly string[]
}

const written = (value: number, unit: Unit): string => quantityText(value, unit, 3)

/** What a capture with these facts can and cannot support. */
export function consequencesOf(facts: CaptureFacts, intervalSeconds: number): FactConsequences {
  const bySampling = 1 / intervalSeconds / samplesPerPeriod
  const highestUsableHertz = Math.min(facts.bandwidthHertz ?? usualLimitHertz, bySampling)
  return {
    highestUsableHertz,
    missing: missingOf(facts, highestUsableHertz),
    remarks: remarksOf(facts, bySampling),
  }
}

function missingOf(facts: CaptureFacts, highestUsableHertz: number): FactConsequences['missing'] {
  const sentences: Partial<Record<keyof CaptureFacts, string>> = {
    bandwidthHertz: `Bandwidth not stated: a 20 MHz limit may have been on, so this capture cannot support a finding above ${written(highestUsableHertz, 'Hz')}.`,
    probeAttenuation:
      'Probe attenuation not stated: volts may be wrong by a factor of 10 (20 dB), so this capture cannot support a finding on overshoot, ratings or loss.',
    probeCapacitanceFarads:
      'Probe capacitance not stated: the probe may have lowered the ring, so this capture cannot support a value of ring capacitance or inductance.',
    groundMethod:
      'Ground method not stated: the ring may be that of a ground lead, so this capture cannot support a finding about ringing.',
    probedAt: 'Probing point not stated: this capture cannot support a finding about a named node.',
    operatingCondition:
      'Operating condition not stated: this capture cannot stand in a comparison before and after a change.',
  }
  if (facts.groundMethod === 'lead') {
    sentences.groundLeadMetres =
      'Length of the ground lead not stated: its own ring cannot be told from that of the circuit.'
  }
  const keys = Object.keys(sentences) as (keyof CaptureFacts)[]
  return keys
    .filter((fact) => facts[fact] === null)
    .map((fact) => ({ fact, rulesOut: sentences[fact] ?? '' }))
}

function remarksOf(facts: CaptureFacts, bySampling: number): string[] {
  const remarks: string[] = []
  if (facts.bandwidthHertz !== null) {
    remarks.push(edgeRemark(facts.bandwidthHertz))
    if (bySampling < facts.bandwidthHertz) {
      remarks.push(
        `The sample rate, not the bandwidth, sets the highest usable frequency: five samples a period reach ${written(bySampling, 'Hz')}.`,
      )
    }
  }
  const leadRing = groundLeadRing(facts)
  if (leadRing !== null) {
    remarks.push(
      `The ground lead (about 10 nH a centimetre, common practice) and the probe’s capacitance ring near ${written(leadRing, 'Hz')}: a ring there may be the probe’s own.`,
    )
  }
  return remarks
}

/** t = 0.35/B for a single-pole response: ln(9)/(2π·B), 10 % to 90 %. */
const edgeRemark = (bandwidthHertz: number): string =>
  `Edges faster than ${written(0.35 / bandwidthHertz, 's')} are shown as slow as that (0.35 / bandwidth).`

/** f = 1/(2π·√(L·C)) in hertz, L from the lead's length; null unless lead, length and capacitance are known. */
export function groundLeadRing(facts: CaptureFacts): number | null {
  const { groundMethod, groundLeadMetres, probeCapacitanceFarads } = facts
  if (groundMethod !== 'lead' || !groundLeadMetres || !probeCapacitanceFarads) return null
  return 1 / (2 * Math.PI * Math.sqrt(groundLeadMetres * leadHenriesPerMetre * probeCapacitanceFarads))
}
