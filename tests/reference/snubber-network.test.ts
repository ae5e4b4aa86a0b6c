import { describe, expect, it } from 'vitest'

import { leastDamping } from '@/lib/core/snubber/modes'
import { characteristicImpedance } from '@/lib/core/snubber/network'
import {
  leastOvershootResistance,
  mostDampingResistance,
  overshootOf,
  withSnubber,
} from '@/lib/core/snubber/optimum'
import { settledEdgeLoss, squareWaveLoss, type RcLoss } from '@/lib/core/snubber/rc-loss'
import { nodeRiseTime, switchEdge } from '@/lib/core/snubber/switched-edge'

import { expectWithin, input, referenceCases } from './reference-cases'

// Source: the exact third-order network, evaluated outside the project by matrix-exponential recursion and by numeric
// search over its poles (each case names its means).
describe('optimum snubber resistance', () => {
  it.each(referenceCases('snubber.optimum'))('$id: $how_computed', (item) => {
    const node = {
      inductance: input(item, 'l_par'),
      capacitance: input(item, 'c_par'),
      seriesResistance: input(item, 'r_series'),
    }
    const cs = input(item, 'k') * node.capacitance
    const z0 = characteristicImpedance(node)
    const least = leastOvershootResistance(node, cs)
    const most = mostDampingResistance(node, cs)
    expectWithin(item, {
      z0,
      cs,
      rs_min_overshoot: least,
      overshoot_min: overshootOf(withSnubber(node, least, cs), 0),
      zeta_at_min_overshoot: leastDamping(withSnubber(node, least, cs)),
      overshoot_at_rs_equal_z0: overshootOf(withSnubber(node, z0, cs), 0),
      zeta_at_rs_equal_z0: leastDamping(withSnubber(node, z0, cs)),
      zeta_max: leastDamping(withSnubber(node, most, cs)),
      ...('rs_max_damping' in item.expected ? { rs_max_damping: most } : {}),
    })
    if ('rs_all_real_low' in item.expected) {
      expect(most).toBeGreaterThan(Number(item.expected['rs_all_real_low']))
      expect(most).toBeLessThan(Number(item.expected['rs_all_real_high']))
    }
  })
})

// Source: the exact response to a ramp source, energies by Gauss-Legendre quadrature; second means: an ngspice transient.
describe('one switched edge', () => {
  it.each(referenceCases('snubber.edge_response'))('$id: $how_computed', (item) => {
    const hasSnubber = 'rs' in item.inputs
    const node = {
      inductance: input(item, 'l'),
      capacitance: input(item, 'c_par'),
      seriesResistance: input(item, 'r_series'),
      ...(hasSnubber ? { snubber: { resistance: input(item, 'rs'), capacitance: input(item, 'cs') } } : {}),
    }
    const edge = {
      from: input(item, 'v_initial'),
      step: input(item, 'v_step'),
      duration: input(item, 'edge_time_0_100'),
    }
    const outcome = switchEdge(node, edge)
    const perSecond = 2 * input(item, 'f_rep')
    expectWithin(item, {
      peak: outcome.peak,
      overshoot_fraction: outcome.overshoot,
      rise_time_10_90: nodeRiseTime(node, edge),
      damping_ratio_min: outcome.dampingRatio,
      ring_frequency_damped: outcome.ringFrequency ?? 0,
      E_R: outcome.seriesEnergy,
      energy_total_per_edge: outcome.seriesEnergy + outcome.snubberEnergy,
      power_total: (outcome.seriesEnergy + outcome.snubberEnergy) * perSecond,
      ...(hasSnubber
        ? {
            i_snub_peak: outcome.snubberPeakCurrent,
            E_Rs: outcome.snubberEnergy,
            power_rs: outcome.snubberEnergy * perSecond,
            i_snub_rms: Math.sqrt((outcome.snubberEnergy * perSecond) / input(item, 'rs')),
          }
        : {}),
    })
  })
})

// Source: the steady state of R and C alone, by Parseval's sum over the harmonics and by quadrature.
describe('loss of a resistor and a capacitor in series', () => {
  const outputs = ({ power, rmsCurrent, peakCurrent }: RcLoss) => ({
    power,
    i_rms: rmsCurrent,
    i_peak: peakCurrent,
  })

  it.each(referenceCases('snubber.rc_dissipation_square'))('$id: $how_computed', (item) => {
    const [rs, cs, v, f] = ['rs', 'cs', 'v', 'f'].map((key) => input(item, key)) as [
      number,
      number,
      number,
      number,
    ]
    expectWithin(item, outputs(squareWaveLoss(rs, cs, v, f, input(item, 'duty'))))
  })

  it.each(referenceCases('snubber.rc_dissipation_ramp'))('$id: $how_computed', (item) => {
    const [rs, cs, v, f] = ['rs', 'cs', 'v', 'f'].map((key) => input(item, key)) as [
      number,
      number,
      number,
      number,
    ]
    expectWithin(item, outputs(settledEdgeLoss(rs, cs, v, f, input(item, 'edge_time_0_100'))))
  })
})
