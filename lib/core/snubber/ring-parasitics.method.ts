import { defineMethod, noSolution, type ResultValue, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { naturalFrequency, parasiticsFromShift } from './parasitics'

const dampedFrequency = (label: string, symbol: string, help: string) =>
  ({ label, symbol, unit: 'Hz', help, isRequired: true, above: 0 }) as const

const dampingRatio = (label: string, symbol: string) =>
  ({
    label,
    symbol,
    unit: '',
    help: 'Of the same ring. Left empty, the measured frequency is taken as undamped; that matters above 0.1.',
    isRequired: false,
    atLeast: 0,
    atMost: 0.95,
  }) as const

/** Parasitic L and C of a switch node from two ring frequencies. */
export const ringParasitics = defineMethod({
  id: 'ring-parasitics',
  version: 1,
  title: 'Parasitics from two ring frequencies',
  purpose:
    'Finds the capacitance and inductance that ring at a switch node from the ring alone and with a known capacitor across the node.',
  inputs: {
    f0: dampedFrequency('Ring frequency, bare', 'f₀', 'With nothing added to the node'),
    zeta0: dampingRatio('Damping ratio, bare', 'ζ₀'),
    f1: dampedFrequency('Ring frequency, loaded', 'f₁', 'With the known capacitor across the node'),
    zeta1: dampingRatio('Damping ratio, loaded', 'ζ₁'),
    cAdd: {
      label: 'Added capacitance',
      symbol: 'C_add',
      unit: 'F',
      help: 'A C0G part soldered directly across the node; its value at the bias, not the printed one if they differ',
      isRequired: true,
      above: 0,
    },
  },
  formulas: [
    'f = f_damped / √(1 − ζ²)   for both rings',
    'C_par = C_add / ((f₀/f₁)² − 1)',
    'L_par = 1 / ((2π f₀)² C_par)',
    'Z₀ = √(L_par / C_par)',
    'dC_par/C_par = dC_add/C_add − 2q/(q − 1) · (df₀/f₀ − df₁/f₁),   q = (f₀/f₁)²',
  ],
  notes: [
    'Halving the frequency takes three times C_par, so that the total is four times as large. “Squaring the capacitance” is a slip that is sometimes printed.',
    'The capacitance of a transistor depends on its voltage: C_par is an effective value for this swing and bias.',
    'The probe’s own capacitance is part of what is measured. Take it off, or measure with a low-capacitance probe.',
  ],
  cautions: [
    'Adding a part to a live switch node can injure and destroys parts when it slips: switch off, discharge, solder, then measure with an isolated or differential probe. Qualified people only.',
  ],
  sources: [
    {
      citation:
        'J. Falin, Minimizing Ringing at the Switch Node of a Boost Converter, Texas Instruments SLVA255, 2006',
      standing: 'published',
    },
    { citation: 'Designing RC snubbers, Nexperia AN11160, Rev. 3.0, 2023', standing: 'published' },
    {
      citation: 'Resonance of one L and C with and without an added C: elementary circuit theory',
      standing: 'derived here, checked from outside',
    },
  ],
  example: { f0: '102.7 MHz', f1: '64.1 MHz', cAdd: '470 pF' },
  compute: (values) => {
    const f0 = naturalFrequency(values.f0, values.zeta0 ?? 0)
    const f1 = naturalFrequency(values.f1, values.zeta1 ?? 0)
    const found = parasiticsFromShift(f0, f1, values.cAdd)
    if (!found.ok) {
      return err(
        noSolution(
          'An added capacitance lowers the ring: the loaded frequency must be below the bare one.',
          'f1',
        ),
      )
    }
    const { capacitance, inductance, characteristicImpedance } = found.value
    const ratio = f1 / f0
    const q = ratio ** -2
    const results: readonly ResultValue[] = [
      main('cPar', 'Parasitic capacitance', 'C_par', 'F', capacitance),
      main('lPar', 'Parasitic inductance', 'L_par', 'H', inductance),
      main('z0', 'Characteristic impedance', 'Z₀', 'Ω', characteristicImpedance),
      step('f0Natural', 'Undamped ring frequency, bare', 'f₀', 'Hz', f0),
      step('f1Natural', 'Undamped ring frequency, loaded', 'f₁', 'Hz', f1),
      step('ratio', 'Frequency ratio', 'f₁/f₀', '', ratio),
      step(
        'errorGrowth',
        'Growth of a relative frequency error into C_par',
        '2q/(q − 1)',
        '',
        (2 * q) / (q - 1),
      ),
    ]
    return ok({ results, choices: [], validity: validityOf(ratio, capacitance, values.cAdd), figures: [] })
  },
})

function validityOf(ratio: number, cPar: number, cAdd: number): readonly ValidityCheck[] {
  const isWellShifted = ratio >= 0.45 && ratio <= 0.8
  return [
    {
      passed: isWellShifted,
      sentence: isWellShifted
        ? 'The shift is large enough for a small error and small enough for the same mode: f₁/f₀ is between 0.45 and 0.8.'
        : `f₁/f₀ is ${ratio.toFixed(3)}; between 0.45 and 0.8 the error stays small. Choose another added capacitor.`,
    },
    {
      passed: cAdd >= 20e-12,
      sentence:
        cAdd >= 20e-12
          ? 'The added capacitance is well above what a probe or a pad adds (about 1 pF to 10 pF).'
          : 'The added capacitance is of the size of a probe’s own; its uncertainty dominates.',
    },
    {
      passed: cPar >= 5e-12,
      sentence:
        cPar >= 5e-12
          ? 'The node’s capacitance is well above a probe’s.'
          : 'The node’s capacitance is of the size of a probe’s: what was measured is mostly the probe.',
    },
  ]
}
