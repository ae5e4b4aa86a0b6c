import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { settledEdgeLoss, squareWaveLoss } from './rc-loss'

const needed = { isRequired: true, atLeast: 1e-15, atMost: 1e12 } as const

/** Heat in the resistor of an RC snubber driven by a stiff source. */
export const rcSnubberLoss = defineMethod({
  id: 'rc-snubber-loss',
  version: 2,
  title: 'Loss of R and C in series',
  purpose:
    'Finds the heat and the currents of a resistor and a capacitor across a stiff square wave, however incomplete the charging or slow the edges.',
  inputs: {
    rSnub: {
      label: 'Resistor',
      symbol: 'R_s',
      unit: 'Ω',
      help: 'In series',
      usualTolerance: '5 %',
      ...needed,
    },
    cSnub: {
      label: 'Capacitor',
      symbol: 'C_s',
      unit: 'F',
      help: 'In series',
      usualTolerance: '10 %',
      ...needed,
    },
    vStep: { label: 'Swing', symbol: 'V', unit: 'V', help: 'From low to high', ...needed },
    fSw: { label: 'Switching frequency', symbol: 'f', unit: 'Hz', help: 'Periods per second', ...needed },
    duty: {
      label: 'Duty cycle',
      symbol: 'D',
      unit: '',
      help: 'Part of the period at the high level; left empty, one half',
      isRequired: false,
      above: 0,
      atMost: 0.999999,
    },
    edge: {
      label: 'Edge',
      symbol: 't',
      unit: 's',
      help: '0 to 100 %; left empty, edges of no duration',
      isRequired: false,
      above: 0,
      atMost: 1,
    },
  },
  formulas: [
    'P = C V² f (1 − x₁)(1 − x₂)/(1 − x₁x₂),   x₁ = exp(−D T/τ),   x₂ = exp(−(1 − D) T/τ),   τ = R C',
    'Edges of duration t, settled: E = C V² (τ/t)[1 − (τ/t)(1 − exp(−t/τ))] an edge,   P = 2 E f',
    'I_peak = (V/R) max(1 − x₁, 1 − x₂)/(1 − x₁x₂), or (C V/t)(1 − exp(−t/τ));   I_rms = √(P/R)',
  ],
  notes: [
    '“C V² f” holds where both halves of the period settle and the edge is short against R C; this method says how far from it the case is.',
    'Behind an inductance the capacitance of the node is burnt in R as well: use the method of the exact network there.',
  ],
  cautions: [
    'Size the resistor for its surroundings: half of its rating is common practice, and pulses need their own rating.',
  ],
  sources: [{ citation: 'Steady state of R and C', standing: 'derived here, checked from outside' }],
  example: { rSnub: '10 Ω', cSnub: '2.2 nF', vStep: '24 V', fSw: '400 kHz', edge: '15 ns' },
  compute: ({ rSnub, cSnub, vStep, fSw, duty, edge }) => {
    if (edge !== undefined && duty !== undefined) {
      const message =
        'Give either a duty cycle, for edges of no duration, or an edge, which must settle before the next.'
      return err(noSolution(message, 'duty', 'edge'))
    }
    const tau = rSnub * cSnub
    const loss =
      edge === undefined
        ? squareWaveLoss(rSnub, cSnub, vStep, fSw, duty)
        : settledEdgeLoss(rSnub, cSnub, vStep, fSw, edge)
    const rule = cSnub * vStep ** 2 * fSw
    const isSettled = edge === undefined || edge + 5 * tau <= 0.5 / fSw
    return ok({
      results: [
        main('power', 'Heat in the resistor', 'P', 'W', loss.power),
        main('rmsCurrent', 'Current, rms', 'I_rms', 'A', loss.rmsCurrent),
        main('peakCurrent', 'Peak current', 'I_peak', 'A', loss.peakCurrent),
        step('tau', 'Time constant', 'R C', 's', tau),
        step('rule', 'By the rule C V² f', 'C V² f', 'W', rule),
        step('share', 'Part of that rule', 'P/(C V² f)', '', loss.power / rule),
      ],
      choices: [],
      validity: [
        {
          passed: isSettled,
          sentence: isSettled
            ? 'The charging is accounted for, complete or not.'
            : 'An edge does not settle before the next one: the formula for slow edges overstates the loss.',
        },
      ],
      figures: [],
    })
  },
})
