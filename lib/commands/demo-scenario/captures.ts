import { nodeVoltageAt, type Edge } from '@/lib/core/snubber/switched-edge'
import type { SwitchNode } from '@/lib/core/snubber/network'

import { seededNoise } from './noise'

/** The invented switch node of the pump controller: it rings near 180 MHz. */
const pumpController: SwitchNode = { inductance: 3.9e-9, capacitance: 200e-12, seriesResistance: 0.12 }

const edge: Edge = { from: 0, step: 48, duration: 1.8e-9 }

const sampleInterval = 0.1e-9
const samplesBefore = 2_000
const samples = 16_000
const lsb = 100 / 256

const withAdded = (node: SwitchNode, farads: number): SwitchNode => ({
  ...node,
  capacitance: node.capacitance + farads,
})

/** Captures of the demo engagement, simulated with a fixed seed: the same bytes every time. */
export const demoCaptures = [
  {
    name: 'pump-controller-sw-bare.csv',
    facts: 'Nothing added to the node',
    bytes: () => captureOf(pumpController, 11),
  },
  {
    name: 'pump-controller-sw-with-220pF.csv',
    facts: '220 pF C0G across the low-side switch',
    bytes: () => captureOf(withAdded(pumpController, 220e-12), 12),
  },
] as const

/** One rising edge as an eight-bit oscilloscope would export it, with its noise. */
function captureOf(node: SwitchNode, seed: number): Uint8Array {
  const noise = seededNoise(seed)
  const times = Array.from({ length: samples }, (_, index) => (index - samplesBefore) * sampleInterval)
  const voltages = nodeVoltageAt(node, edge, times)
  const rows = times.map((time, index) => {
    const value = (voltages[index] ?? 0) + 0.15 * noise()
    const quantised = Math.round(value / lsb) * lsb
    return `${time.toExponential(6)},${quantised.toFixed(4)}`
  })
  const head = ['demo data,simulated for Tarn Hollow EMC', 'channel,SW', 'time [s],voltage [V]']
  return new TextEncoder().encode(`${[...head, ...rows].join('\n')}\n`)
}
