import type { ValidityCheck } from '@/lib/core/method/method'
import type { RingMeasurement } from '@/lib/core/ring/ring-measurement'
import { quantityText } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'

import type { CaptureFacts } from '../evidence/capture-facts'
import { consequencesOf, groundLeadRing } from '../evidence/fact-consequences'

/** A ring within this part of the ground lead's own is not told from it: the lead's length gives no better estimate. Common practice, no source. */
const leadNearness = 0.3

/** An edge within this factor of the instrument's own is the instrument's. Common practice, no source. */
const edgeNearness = 1.4

const written = (value: number, unit: Unit): string => quantityText(value, unit, 3)

/** The facts that bear on a ring, in the order in which they rule it out. */
const ringFacts = ['bandwidthHertz', 'groundMethod', 'groundLeadMetres', 'probeCapacitanceFarads'] as const

/** What the sample rate and the stated facts allow to be said about this very ring and edge. */
export function measurementChecks(
  measurement: RingMeasurement,
  facts: CaptureFacts,
  intervalSeconds: number,
): readonly ValidityCheck[] {
  const { missing } = consequencesOf(facts, intervalSeconds)
  const unstated = ringFacts.flatMap((fact) => missing.filter((gap) => gap.fact === fact))
  return [
    ...ringChecks(measurement, facts, intervalSeconds),
    ...edgeChecks(measurement, facts, intervalSeconds),
    ...unstated.map(({ rulesOut }) => ({ passed: false, sentence: rulesOut })),
  ]
}

/** What the other facts that nobody stated rule out, and what the measurement itself warns of. */
export function measurementWarnings(
  measurement: RingMeasurement,
  facts: CaptureFacts,
  intervalSeconds: number,
): readonly string[] {
  const { missing } = consequencesOf(facts, intervalSeconds)
  const others = missing.filter(({ fact }) => ringFacts.every((ringFact) => ringFact !== fact))
  return [...measurement.warnings, ...others.map(({ rulesOut }) => rulesOut)]
}

function ringChecks(
  { ring }: RingMeasurement,
  facts: CaptureFacts,
  intervalSeconds: number,
): readonly ValidityCheck[] {
  if (ring === null) return []
  const frequency = ring.dampedFrequency
  const { highestUsableHertz } = consequencesOf(facts, intervalSeconds)
  const seen = frequency <= highestUsableHertz
  const sure = ring.confidence === 'high'
  return [
    {
      passed: seen,
      sentence: seen
        ? `The ring is below ${written(highestUsableHertz, 'Hz')}, the highest frequency that this capture supports.`
        : `The ring, at ${written(frequency, 'Hz')}, is above ${written(highestUsableHertz, 'Hz')}, the highest frequency that this capture supports: it may be lower or smaller here than it is.`,
    },
    {
      passed: sure,
      sentence: sure
        ? `The fit explains the ring well over ${ring.cyclesUsed} cycles.`
        : `The fit rests on ${ring.cyclesUsed} cycles with ${ring.confidence} confidence: few cycles, or more than one mode.`,
    },
    ...groundChecks(frequency, facts),
    ...capacitanceChecks(facts),
  ]
}

function groundChecks(frequency: number, facts: CaptureFacts): readonly ValidityCheck[] {
  if (facts.groundMethod === null) return []
  if (facts.groundMethod !== 'lead') {
    return [
      { passed: true, sentence: 'The probe had no ground lead whose own ring could be taken for this one.' },
    ]
  }
  const lead = groundLeadRing(facts)
  if (lead === null) return []
  const apart = Math.abs(frequency / lead - 1) > leadNearness
  return [
    {
      passed: apart,
      sentence: apart
        ? `The ground lead with the probe rings near ${written(lead, 'Hz')} (10 nH a centimetre, common practice), away from this ring.`
        : `The ground lead with the probe rings near ${written(lead, 'Hz')} (10 nH a centimetre, common practice): this ring may be the probe’s own. Measure again with a spring.`,
    },
  ]
}

const capacitanceChecks = ({ probeCapacitanceFarads }: CaptureFacts): readonly ValidityCheck[] =>
  probeCapacitanceFarads === null
    ? []
    : [
        {
          passed: true,
          sentence: `The probe’s ${written(probeCapacitanceFarads, 'F')} is known; it is part of the capacitance that rings here.`,
        },
      ]

function edgeChecks(
  { edge }: RingMeasurement,
  { bandwidthHertz }: CaptureFacts,
  intervalSeconds: number,
): readonly ValidityCheck[] {
  if (bandwidthHertz === null) return []
  const own = Math.max(0.35 / bandwidthHertz, intervalSeconds)
  const slower = edge.transitionSeconds > edgeNearness * own
  return [
    {
      passed: slower,
      sentence: slower
        ? `The edge is slower than the instrument’s own ${written(own, 's')} (0.35 / bandwidth).`
        : `The edge is about as fast as the instrument’s own ${written(own, 's')} (0.35 / bandwidth): the real one may be faster.`,
    },
  ]
}
