import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { decrementOf, naturalFrequency } from './parasitics'

const peak = { unit: 'V', isRequired: true, above: 0, atMost: 1e9, usualTolerance: '2 %' } as const

/** Damping of a ring from two of its peaks. */
export const ringDecay = defineMethod({
  id: 'ring-decay',
  version: 1,
  title: 'Damping from two peaks',
  purpose: 'Finds the damping ratio and the quality factor of a ring from two peaks read off a trace.',
  inputs: {
    firstPeak: { label: 'First peak', symbol: 'x₀', help: 'From the level that it settles to', ...peak },
    laterPeak: {
      label: 'Later peak',
      symbol: 'x_n',
      help: 'On the same side, from the same level',
      ...peak,
    },
    cycles: {
      label: 'Cycles between them',
      symbol: 'n',
      unit: '',
      help: 'A whole number: 1 from one peak to the next',
      isRequired: true,
      atLeast: 1,
      atMost: 1e6,
    },
    frequency: {
      label: 'Ring frequency',
      symbol: 'f_d',
      unit: 'Hz',
      help: 'As measured; for the undamped one',
      isRequired: false,
      above: 0,
      atMost: 1e15,
    },
  },
  formulas: ['δ = (1/n) ln(x₀/x_n)', 'ζ = δ/√(4π² + δ²),   Q = 1/(2ζ)', 'f₀ = f_d/√(1 − ζ²)'],
  notes: [
    '“ζ = δ/2π” is good only below ζ = 0.2, where it is 2 % high.',
    'Peaks on both sides of the level count as half a cycle; take two of the same side.',
    'On a capture, “Measure the ring” fits every cycle at once and is the better estimate.',
  ],
  cautions: [],
  sources: [{ citation: 'Theory of the damped oscillator', standing: 'derived here, checked from outside' }],
  example: { firstPeak: '8.4 V', laterPeak: '3.1 V', cycles: '3', frequency: '98 MHz' },
  compute: ({ firstPeak, laterPeak, cycles, frequency }) => {
    if (!Number.isInteger(cycles)) {
      return err(noSolution('Peaks of the same side lie a whole number of cycles apart.', 'cycles'))
    }
    const found = decrementOf(firstPeak, laterPeak, cycles)
    if (!found.ok) {
      return err(
        noSolution('The later peak must be the smaller one: a ring that grows is not damped.', 'laterPeak'),
      )
    }
    const { logarithmicDecrement, dampingRatio, qualityFactor } = found.value
    const isSmall = dampingRatio < 0.3
    return ok({
      results: [
        main('dampingRatio', 'Damping ratio', 'ζ', '', dampingRatio),
        main('qualityFactor', 'Quality factor', 'Q', '', qualityFactor),
        step('logDecrement', 'Logarithmic decrement', 'δ', '', logarithmicDecrement),
        ...(frequency === undefined
          ? []
          : [step('natural', 'Undamped frequency', 'f₀', 'Hz', naturalFrequency(frequency, dampingRatio))]),
      ],
      choices: [],
      validity: [
        {
          passed: isSmall,
          sentence: isSmall
            ? 'Enough cycles ring for two peaks to be read.'
            : 'So strongly damped that the peaks also hold the edge itself: fit the trace instead.',
        },
      ],
      figures: [],
    })
  },
})
