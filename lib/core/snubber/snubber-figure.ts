import type { Figure } from '../figure/figure'
import { quantityText } from '../units/format-quantity'
import { angularFrequency, type SwitchNode } from './network'
import { nodeVoltageAt, type Edge } from './switched-edge'

const points = 600

/** The node's voltage without and with the snubber over the first cycles of the ring. */
export function beforeAndAfter(bare: SwitchNode, snubbed: SwitchNode, edge: Edge): Figure {
  const period = (2 * Math.PI) / angularFrequency(bare)
  const span = edge.duration + 8 * period
  const x = Array.from({ length: points }, (_, index) => (index * span) / (points - 1))
  const before = nodeVoltageAt(bare, edge, x)
  const after = nodeVoltageAt(snubbed, edge, x)
  const peakBefore = quantityText(Math.max(...before), 'V', 3)
  const peakAfter = quantityText(Math.max(...after), 'V', 3)
  return {
    id: 'before-and-after',
    title: 'Switch node without and with the snubber',
    description: `Computed node voltage after one edge: the peak falls from ${peakBefore} to ${peakAfter}.`,
    x: { label: 'Time from the beginning of the edge', unit: 's', scale: 'linear' },
    y: { label: 'Node voltage', unit: 'V', scale: 'linear' },
    series: [
      { id: 'before', label: 'Without snubber', role: 'reference', x, y: before },
      { id: 'after', label: 'With snubber', role: 'computed', x, y: after },
    ],
    marks: [{ kind: 'level', y: edge.from + edge.step, label: 'Settled' }],
  }
}
