import type { FactRow, StatedFact } from '@/db/repositories/evidence-facts.repo'

export const groundMethods = ['spring', 'lead', 'coaxial', 'differential'] as const
export type GroundMethod = (typeof groundMethods)[number]

/** How a capture was measured, in SI; null where nobody has said. */
export type CaptureFacts = {
  /** The −3 dB bandwidth of oscilloscope and probe together, with any limit that was switched on. */
  readonly bandwidthHertz: number | null
  readonly probeAttenuation: number | null
  readonly probeCapacitanceFarads: number | null
  readonly groundMethod: GroundMethod | null
  readonly groundLeadMetres: number | null
  readonly probedAt: string | null
  readonly operatingCondition: string | null
}

const numberOf = (text: string | undefined): number | null => (text === undefined ? null : Number(text))

/** Reads the stored key and value pairs. */
export function factsOf(rows: readonly Pick<FactRow, 'key' | 'value'>[]): CaptureFacts {
  const values = new Map(rows.map((row) => [row.key, row.value]))
  return {
    bandwidthHertz: numberOf(values.get('bandwidth_hertz')),
    probeAttenuation: numberOf(values.get('probe_attenuation')),
    probeCapacitanceFarads: numberOf(values.get('probe_capacitance_farads')),
    groundMethod: groundMethods.find((method) => method === values.get('ground_method')) ?? null,
    groundLeadMetres: numberOf(values.get('ground_lead_metres')),
    probedAt: values.get('probed_at') ?? null,
    operatingCondition: values.get('operating_condition') ?? null,
  }
}

/** The pairs under which the facts are stored; numbers are written so that they read back to the same digits. */
export function pairsOf(facts: CaptureFacts): StatedFact[] {
  const pairs: readonly (readonly [string, string | number | null])[] = [
    ['bandwidth_hertz', facts.bandwidthHertz],
    ['probe_attenuation', facts.probeAttenuation],
    ['probe_capacitance_farads', facts.probeCapacitanceFarads],
    ['ground_method', facts.groundMethod],
    ['ground_lead_metres', facts.groundLeadMetres],
    ['probed_at', facts.probedAt],
    ['operating_condition', facts.operatingCondition],
  ]
  return pairs.map(([key, value]) => ({ key, value: value === null ? null : String(value) }))
}
