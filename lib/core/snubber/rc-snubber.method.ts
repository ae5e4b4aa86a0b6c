import { defineMethod } from '../method/method'
import { ok } from '../result'
import type { SwitchNode } from './network'
import { overshootOf, withSnubber } from './optimum'
import { rcSnubberInputs } from './rc-snubber.inputs'
import { chosenParts, losses, steps, validityOf } from './rc-snubber.results'
import { rcSnubberTexts } from './rc-snubber.texts'
import { beforeAndAfter } from './snubber-figure'
import { bestStandardResistance, standardSnubbers, usualCapacitance } from './standard-parts'
import { switchEdge, type Edge } from './switched-edge'

/** An RC snubber across a ringing switch node, by the exact third-order network. */
export const rcSnubber = defineMethod({
  id: 'rc-snubber',
  version: 2,
  ...rcSnubberTexts,
  inputs: rcSnubberInputs,
  example: { lPar: '8 nH', cPar: '300 pF', vStep: '12 V', fSw: '500 kHz', cSnub: '1 nF' },
  compute: (values) => {
    const { bare, edge } = circuitOf(values)
    const cs = values.cSnub ?? usualCapacitance(bare)
    const rs = values.rSnub ?? bestStandardResistance(bare, cs, edge.duration).resistance
    const snubbed = withSnubber(bare, rs, cs)
    const before = switchEdge(bare, edge)
    const after = switchEdge(snubbed, edge)
    const choices = standardSnubbers(bare, edge.duration).map((choice) => {
      const outcome = switchEdge(withSnubber(bare, choice.resistance, choice.capacitance), edge)
      const loss = 2 * values.fSw * outcome.snubberEnergy
      return [choice.capacitance, choice.resistance, 100 * choice.overshoot, outcome.dampingRatio, loss]
    })
    return ok({
      results: [
        ...chosenParts(snubbed, before.overshoot, after),
        ...losses(snubbed, after, edge.step, values.fSw),
        ...steps(bare, cs, rs, edge.duration, before, after),
      ],
      choices: [{ title: 'Standard parts, least overshoot first', columns: choiceColumns, rows: choices }],
      validity: validityOf(snubbed, values.fSw, after),
      figures: [beforeAndAfter(bare, snubbed, edge)],
    })
  },
  computeResults: (values) => {
    const { bare, edge } = circuitOf(values)
    const snubbed = withSnubber(bare, values.rSnub ?? 0, values.cSnub ?? 0)
    const after = switchEdge(snubbed, edge)
    return ok([
      ...chosenParts(snubbed, overshootOf(bare, edge.duration), after),
      ...losses(snubbed, after, edge.step, values.fSw),
    ])
  },
})

type Circuit = {
  readonly lPar: number
  readonly cPar: number
  readonly rSeries: number | undefined
  readonly vStep: number
  readonly edge: number | undefined
}

const circuitOf = ({
  lPar,
  cPar,
  rSeries = 0,
  vStep,
  edge = 0,
}: Circuit): { bare: SwitchNode; edge: Edge } => ({
  bare: { inductance: lPar, capacitance: cPar, seriesResistance: rSeries },
  edge: { from: 0, step: vStep, duration: edge },
})

const choiceColumns = [
  { label: 'C_s', unit: 'F' },
  { label: 'R_s', unit: 'Ω' },
  { label: 'Overshoot', unit: '%' },
  { label: 'Damping ratio', unit: '' },
  { label: 'Loss in R_s', unit: 'W' },
] as const
