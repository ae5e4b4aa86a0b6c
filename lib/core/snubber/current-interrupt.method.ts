import type { Figure } from '../figure/figure'
import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { nearestByRatio } from '../parts/preferred-values'
import { ok } from '../result'
import { interruptOptimum, interruptPeak } from './current-interrupt'

const needed = { isRequired: true, atLeast: 1e-15, atMost: 1e9 } as const

/** RC snubber of a switch that interrupts an inductive current. */
export const currentInterruptSnubber = defineMethod({
  id: 'current-interrupt-snubber',
  version: 2,
  title: 'Snubber for an interrupted current',
  purpose:
    'Finds the resistor with the least peak voltage when a switch, such as a relay contact or a thyristor, interrupts the current in an inductance.',
  inputs: {
    source: {
      label: 'Source voltage',
      symbol: 'E',
      unit: 'V',
      help: 'That drives on after the interruption',
      ...needed,
    },
    inductance: {
      label: 'Inductance',
      symbol: 'L',
      unit: 'H',
      help: 'In series',
      usualTolerance: '10 %',
      ...needed,
    },
    current: { label: 'Current', symbol: 'I', unit: 'A', help: 'At the moment of interruption', ...needed },
    cSnub: {
      label: 'Snubber capacitor',
      symbol: 'C',
      unit: 'F',
      help: 'Across the switch',
      usualTolerance: '10 %',
      ...needed,
    },
  },
  formulas: [
    'χ = (I/E) √(L/C),   ζ = (R/2) √(C/L)',
    'e/E = 1 + y,   y″ + 2ζy′ + y = 0,   y(0) = 2ζχ − 1,   y′(0) = χ(1 − 4ζ²) + 2ζ;   time in √(LC)',
    'R of the least peak: by search over the exact peak',
  ],
  notes: [
    'Another problem than a ringing switch node: there the node has a capacitance of its own and no current flows at the start. Neither resistor does for the other.',
    'At χ = 1 the optimum is ζ = 0.645 with a peak of 1.51 E; a larger capacitor lowers χ and the peak.',
  ],
  cautions: [
    'Interrupted inductive currents make voltages that injure and destroy: rate every part for the peak, and measure with a probe rated for it.',
  ],
  sources: [
    {
      citation:
        'W. McMurray, Optimum Snubbers for Power Semiconductors, IEEE Trans. Industry Applications IA-8, 1972, 593–600 (bibliographic data seen, text not read)',
      standing: 'published',
    },
    { citation: 'Exact peak of the network', standing: 'derived here, checked from outside' },
  ],
  example: { source: '48 V', inductance: '60 nH', current: '10 A', cSnub: '2.2 nF' },
  compute: ({ source, inductance, current, cSnub }) => {
    const optimum = interruptOptimum({ source, inductance, current, snubberCapacitance: cSnub })
    const { currentFactor, dampingRatio, resistance, peakVoltage } = optimum
    const standard = nearestByRatio(resistance, 'E24')
    const peakWith = (r: number) => source * interruptPeak(currentFactor, (dampingRatio * r) / resistance)
    const isInRange = currentFactor >= 1e-5 && currentFactor <= 1e5
    return ok({
      results: [
        main('resistance', 'Resistor of the least peak', 'R', 'Ω', resistance),
        main('peakVoltage', 'Least peak voltage', 'V_pk', 'V', peakVoltage),
        step('currentFactor', 'Current factor', 'χ', '', currentFactor),
        step('dampingRatio', 'Damping ratio', 'ζ', '', dampingRatio),
        step('standard', 'Nearest E24 resistor', 'R', 'Ω', standard),
        step('standardPeak', 'Peak with that resistor', 'V_pk', 'V', peakWith(standard)),
        step('firstVoltage', 'Voltage right after the interruption', 'R I', 'V', resistance * current),
      ],
      choices: [],
      validity: [
        {
          passed: isInRange,
          sentence: isInRange
            ? 'The current suits the capacitor: the optimum is well determined.'
            : 'The current is far too small or too large for this capacitor: the least peak hardly depends on the resistor, and the optimum is not well determined.',
        },
      ],
      figures: [peakFigure(source, currentFactor, dampingRatio, resistance)],
    })
  },
})

/** How flat the optimum is: the peak against the resistor. */
function peakFigure(source: number, factor: number, damping: number, resistance: number): Figure {
  const ratios = Array.from({ length: 81 }, (_, index) => 10 ** (index / 40 - 1))
  const peak = source * interruptPeak(factor, damping)
  return {
    id: 'interrupt-peak',
    title: 'Peak voltage against the resistor',
    description: `The least peak, ${peak.toPrecision(4)} V, is at ${resistance.toPrecision(4)} Ω; a smaller resistor rings, a larger one starts high.`,
    x: { label: 'Resistor', unit: 'Ω', scale: 'log' },
    y: { label: 'Peak voltage', unit: 'V', scale: 'linear' },
    series: [
      {
        id: 'peak',
        label: 'peak',
        role: 'computed',
        x: ratios.map((ratio) => ratio * resistance),
        y: ratios.map((ratio) => source * interruptPeak(factor, ratio * damping)),
      },
    ],
    marks: [{ kind: 'point', x: resistance, y: peak, label: 'least' }],
  }
}
