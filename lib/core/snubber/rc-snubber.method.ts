import { defineMethod, type ResultValue, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { angularFrequency, characteristicImpedance, type SwitchNode } from './network'
import { polesOf } from './modes'
import { leastOvershootResistance, mostDampingResistance, withSnubber } from './optimum'
import { rcSnubberTexts } from './rc-snubber.texts'
import { beforeAndAfter } from './snubber-figure'
import { bestStandardResistance, standardSnubbers, usualCapacitance } from './standard-parts'
import { switchEdge, type Edge, type EdgeOutcome } from './switched-edge'

const positive = { isRequired: true, above: 0 } as const

/** An RC snubber across a ringing switch node, by the exact third-order network. */
export const rcSnubber = defineMethod({
  id: 'rc-snubber',
  version: 1,
  ...rcSnubberTexts,
  inputs: {
    lPar: { label: 'Parasitic inductance', symbol: 'L_par', unit: 'H', help: 'Of the hot loop', ...positive },
    cPar: { label: 'Parasitic capacitance', symbol: 'C_par', unit: 'F', help: 'Of the node', ...positive },
    rSeries: {
      label: 'Series resistance',
      symbol: 'R',
      unit: 'Ω',
      help: 'Of the loop at the ring frequency; left empty, none: the cautious choice',
      isRequired: false,
      atLeast: 0,
    },
    vStep: { label: 'Voltage step', symbol: 'V', unit: 'V', help: 'From low to high', ...positive },
    edge: {
      label: 'Edge of the source',
      symbol: 't_r',
      unit: 's',
      help: '0 to 100 %, without the ring; left empty, an ideal step: the cautious choice',
      isRequired: false,
      atLeast: 0,
    },
    fSw: { label: 'Switching frequency', symbol: 'f', unit: 'Hz', help: 'Two edges a period', ...positive },
    cSnub: {
      label: 'Snubber capacitance',
      symbol: 'C_s',
      unit: 'F',
      help: 'Left empty, the E12 value nearest to 3 C_par is taken',
      isRequired: false,
      above: 0,
    },
    rSnub: {
      label: 'Snubber resistance',
      symbol: 'R_s',
      unit: 'Ω',
      help: 'Left empty, the E24 value with the least overshoot is taken',
      isRequired: false,
      above: 0,
    },
  },
  compute: (values) => {
    const bare: SwitchNode = {
      inductance: values.lPar,
      capacitance: values.cPar,
      seriesResistance: values.rSeries ?? 0,
    }
    const edge: Edge = { from: 0, step: values.vStep, duration: values.edge ?? 0 }
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
        ...chosenParts(snubbed, before, after),
        ...losses(snubbed, after, edge.step, values.fSw),
        ...steps(bare, cs, rs, edge.duration, before, after),
      ],
      choices: [{ title: 'Standard parts, least overshoot first', columns: choiceColumns, rows: choices }],
      validity: validityOf(snubbed, values.fSw, after),
      figures: [beforeAndAfter(bare, snubbed, edge)],
    })
  },
})

const choiceColumns = [
  { label: 'C_s', unit: 'F' },
  { label: 'R_s', unit: 'Ω' },
  { label: 'Overshoot', unit: '%' },
  { label: 'Damping ratio', unit: '' },
  { label: 'Loss in R_s', unit: 'W' },
] as const

const chosenParts = (node: SwitchNode, before: EdgeOutcome, after: EdgeOutcome): ResultValue[] => [
  main('cSnub', 'Snubber capacitance', 'C_s', 'F', node.snubber?.capacitance ?? 0),
  main('rSnub', 'Snubber resistance', 'R_s', 'Ω', node.snubber?.resistance ?? 0),
  main('overshootBefore', 'Overshoot without snubber', 'OS₀', '%', 100 * before.overshoot),
  main('overshootAfter', 'Overshoot with snubber', 'OS', '%', 100 * after.overshoot),
  main('dampingAfter', 'Least damping ratio with snubber', 'ζ_min', '', after.dampingRatio),
]

/** Two fully settled equal edges a period. */
function losses(node: SwitchNode, after: EdgeOutcome, step_: number, frequency: number): ResultValue[] {
  const rs = node.snubber?.resistance ?? 0
  const cs = node.snubber?.capacitance ?? 0
  const inResistor = 2 * frequency * after.snubberEnergy
  return [
    main('lossInSnubber', 'Loss in R_s', 'P_Rs', 'W', inResistor),
    main(
      'sizingLoss',
      'Loss to size R_s for',
      '(C_s + C_par) V² f',
      'W',
      (cs + node.capacitance) * step_ ** 2 * frequency,
    ),
    main('peakCurrent', 'Peak current in R_s', 'I_pk', 'A', after.snubberPeakCurrent),
    main('rmsCurrent', 'Rms current in R_s', 'I_rms', 'A', Math.sqrt(inResistor / rs)),
    step('lossInSeries', 'Loss in the series resistance', 'P_R', 'W', 2 * frequency * after.seriesEnergy),
    step('popularLoss', 'Popular estimate of the loss', 'C_s V² f', 'W', cs * step_ ** 2 * frequency),
  ]
}

const steps = (
  bare: SwitchNode,
  cs: number,
  rs: number,
  edge: number,
  before: EdgeOutcome,
  after: EdgeOutcome,
): ResultValue[] => [
  step('z0', 'Characteristic impedance', 'Z₀', 'Ω', characteristicImpedance(bare)),
  step('k', 'Capacitance ratio', 'k = C_s/C_par', '', cs / bare.capacitance),
  step('rho', 'Resistance ratio', 'ρ = R_s/Z₀', '', rs / characteristicImpedance(bare)),
  step(
    'rLeastOvershoot',
    'R_s of least overshoot for this C_s',
    'R_OS',
    'Ω',
    leastOvershootResistance(bare, cs, edge),
  ),
  step('rMostDamping', 'R_s of most damping for this C_s', 'R_ζ', 'Ω', mostDampingResistance(bare, cs)),
  step('dampingBefore', 'Damping ratio without snubber', 'ζ₀', '', before.dampingRatio),
  step('ringBefore', 'Ring frequency without snubber', 'f_d', 'Hz', before.ringFrequency ?? 0),
  step('ringAfter', 'Ring frequency with snubber (0: nothing rings)', 'f_d', 'Hz', after.ringFrequency ?? 0),
  step('peakBefore', 'Peak without snubber', 'V_pk', 'V', before.peak),
  step('peakAfter', 'Peak with snubber', 'V_pk', 'V', after.peak),
]

function validityOf(node: SwitchNode, frequency: number, after: EdgeOutcome): ValidityCheck[] {
  const slowest = Math.min(...polesOf(node).map((pole) => -pole.re)) * angularFrequency(node)
  const settled = slowest > 10 * frequency
  const calm = after.dampingRatio >= 0.3
  return [
    {
      passed: settled,
      sentence: settled
        ? 'The snubber settles within half a period (five time constants), as the loss formula needs.'
        : 'The snubber does not settle within half a period; the loss is over-estimated and the next edge starts from a charged C_s.',
    },
    {
      passed: calm,
      sentence: calm
        ? 'The least damping ratio is at least 0.3: the ring is gone within about two cycles.'
        : 'The least damping ratio is below 0.3: the node still rings. Take a larger C_s.',
    },
  ]
}
