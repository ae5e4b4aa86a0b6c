import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { naturalFrequency } from './parasitics'

/** Parasitic L of a switch node from one ring frequency and a capacitance that is known otherwise. */
export const ringInductance = defineMethod({
  id: 'ring-inductance',
  version: 1,
  title: 'Inductance from one ring frequency and a known capacitance',
  purpose:
    'Finds the inductance that rings with a capacitance known from a data sheet or another measurement.',
  inputs: {
    f0: {
      label: 'Ring frequency',
      symbol: 'f₀',
      unit: 'Hz',
      help: 'As measured, damped',
      isRequired: true,
      above: 0,
    },
    zeta0: {
      label: 'Damping ratio',
      symbol: 'ζ₀',
      unit: '',
      help: 'Of the same ring. Left empty, the measured frequency is taken as undamped; that matters above 0.1.',
      isRequired: false,
      atLeast: 0,
      atMost: 0.95,
    },
    cPar: {
      label: 'Capacitance of the node',
      symbol: 'C_par',
      unit: 'F',
      help: 'Transistor, diode, board and probe together, at the voltage of the ring',
      isRequired: true,
      above: 0,
      usualTolerance: '20 %',
    },
  },
  formulas: ['f = f_damped / √(1 − ζ²)', 'L_par = 1 / ((2π f)² C_par)', 'Z₀ = √(L_par / C_par)'],
  notes: [
    'The output capacitance in a data sheet holds for one voltage; a charge- or energy-related value for the swing is nearer to what rings.',
    'Where it can be done, measure the shift with an added capacitor instead: that needs no data sheet.',
  ],
  cautions: [
    'Probing a switch node can injure: isolated or differential probes, discharged capacitors, qualified people.',
  ],
  sources: [
    {
      citation: 'Resonance of one L and one C: elementary circuit theory',
      standing: 'derived here, checked from outside',
    },
    { citation: 'Designing RC snubbers, Nexperia AN11160, Rev. 3.0, 2023', standing: 'published' },
  ],
  example: { f0: '102.7 MHz', cPar: '300 pF' },
  compute: ({ f0, zeta0, cPar }) => {
    const frequency = naturalFrequency(f0, zeta0 ?? 0)
    const inductance = 1 / ((2 * Math.PI * frequency) ** 2 * cPar)
    return ok({
      results: [
        main('lPar', 'Parasitic inductance', 'L_par', 'H', inductance),
        main('z0', 'Characteristic impedance', 'Z₀', 'Ω', Math.sqrt(inductance / cPar)),
        step('f0Natural', 'Undamped ring frequency', 'f', 'Hz', frequency),
      ],
      choices: [],
      validity: [],
      figures: [],
    })
  },
})
