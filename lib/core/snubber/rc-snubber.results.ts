import type { ResultValue, ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { polesOf } from './modes'
import { angularFrequency, characteristicImpedance, type SwitchNode } from './network'
import { leastOvershootResistance, mostDampingResistance } from './optimum'
import { squareWaveLoss } from './rc-loss'
import type { EdgeOutcome } from './switched-edge'

/** What to fit, and what it does to the waveform. */
export const chosenParts = (node: SwitchNode, overshootBefore: number, after: EdgeOutcome): ResultValue[] => [
  main('cSnub', 'Snubber capacitance', 'C_s', 'F', node.snubber?.capacitance ?? 0),
  main('rSnub', 'Snubber resistance', 'R_s', 'Ω', node.snubber?.resistance ?? 0),
  main('overshootBefore', 'Overshoot without snubber', 'OS₀', '%', 100 * overshootBefore),
  main('overshootAfter', 'Overshoot with snubber', 'OS', '%', 100 * after.overshoot),
  main('dampingAfter', 'Least damping ratio with snubber', 'ζ_min', '', after.dampingRatio),
]

/** Two fully settled equal edges a period. */
export function losses(
  node: SwitchNode,
  after: EdgeOutcome,
  voltage: number,
  frequency: number,
): ResultValue[] {
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
      (cs + node.capacitance) * voltage ** 2 * frequency,
    ),
    main('peakCurrent', 'Peak current in R_s', 'I_pk', 'A', after.snubberPeakCurrent),
    main('rmsCurrent', 'Rms current in R_s', 'I_rms', 'A', Math.sqrt(inResistor / rs)),
    step('lossInSeries', 'Loss in the series resistance', 'P_R', 'W', 2 * frequency * after.seriesEnergy),
    step(
      'squareWaveLoss',
      'Loss of R_s and C_s alone on a square wave, settled or not',
      'P_RC',
      'W',
      squareWaveLoss(rs, cs, voltage, frequency).power,
    ),
    step('popularLoss', 'Popular estimate of the loss', 'C_s V² f', 'W', cs * voltage ** 2 * frequency),
  ]
}

export const steps = (
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

export function validityOf(node: SwitchNode, frequency: number, after: EdgeOutcome): ValidityCheck[] {
  const slowest = Math.min(...polesOf(node).map((pole) => -pole.re)) * angularFrequency(node)
  const settled = slowest > 10 * frequency
  const calm = after.dampingRatio >= 0.3
  return [
    {
      passed: settled,
      sentence: settled
        ? 'The snubber settles within half a period (five time constants), as the loss formula needs.'
        : 'The snubber does not settle within half a period; the loss is over-estimated, and the one of R_s and C_s alone on a square wave is nearer.',
    },
    {
      passed: calm,
      sentence: calm
        ? 'The least damping ratio is at least 0.3: the ring is gone within about two cycles.'
        : 'The least damping ratio is below 0.3: the node still rings. Take a larger C_s.',
    },
  ]
}
