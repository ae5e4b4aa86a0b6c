import { describe, expect, it } from 'vitest'

import type { SwitchNode } from '@/lib/core/snubber/network'
import { nodeVoltageAt, type Edge } from '@/lib/core/snubber/switched-edge'

import { ngspiceVersion, transientBy } from '../support/ngspice'

const bare = { inductance: 8e-9, capacitance: 300e-12, seriesResistance: 0.15 }
const edge: Edge = { from: 0, step: 12, duration: 1.5e-9 }
const networks = [
  { name: 'bare', node: bare },
  { name: 'snubbed', node: { ...bare, snubber: { resistance: 5.1, capacitance: 820e-12 } } },
] satisfies readonly { name: string; node: SwitchNode }[]

const transientOf = ({ inductance, capacitance, seriesResistance, snubber }: SwitchNode) =>
  transientBy({
    circuit: [
      'Switch node behind a straight edge',
      `V1 source 0 PWL(0 ${edge.from} ${edge.duration} ${edge.from + edge.step})`,
      `R1 source a ${seriesResistance}`,
      `L1 a node ${inductance}`,
      `C1 node 0 ${capacitance}`,
      ...(snubber ? [`R2 node b ${snubber.resistance}`, `C2 b 0 ${snubber.capacitance}`] : []),
    ],
    reltol: '1e-6',
    analysis: 'tran 10p 60n 0 10p',
    node: 'node',
  })

// Source: a transient analysis by ngspice, a circuit simulator of its own.
describe.skipIf(ngspiceVersion === undefined)(
  ngspiceVersion === undefined
    ? 'exact edge response against ngspice (skipped: ngspice is not installed)'
    : `exact edge response against ${ngspiceVersion}`,
  () => {
    it.each(networks)('agrees within 0.1 % of the step at every instant: $name', ({ node }) => {
      const transient = transientOf(node)
      const exact = nodeVoltageAt(
        node,
        edge,
        transient.map(([time]) => time),
      )
      expect(transient.length).toBeGreaterThan(5000)
      const differences = transient.map(([, voltage], index) => Math.abs(voltage - (exact[index] ?? NaN)))
      expect(Math.max(...differences)).toBeLessThan(0.001 * edge.step)
    })
  },
)
