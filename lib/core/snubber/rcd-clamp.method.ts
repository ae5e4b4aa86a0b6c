import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { nearestByRatio, neighboursOf } from '../parts/preferred-values'
import { err, ok } from '../result'
import { clampCapacitance, clampDuty } from './rcd-clamp'

const needed = { isRequired: true, atLeast: 1e-12, atMost: 1e9 } as const

/** An RCD clamp over the leakage inductance of a flyback transformer. */
export const rcdClamp = defineMethod({
  id: 'rcd-clamp',
  version: 1,
  title: 'RCD clamp of a flyback',
  purpose:
    'Finds the heat, the resistor and the capacitor of a clamp that holds the leakage spike of a flyback.',
  inputs: {
    lLeak: {
      label: 'Leakage inductance',
      symbol: 'L_lk',
      unit: 'H',
      help: 'At the primary, secondary short-circuited',
      usualTolerance: '20 %',
      ...needed,
    },
    iPeak: { label: 'Peak primary current', symbol: 'I_pk', unit: 'A', help: 'At turn-off', ...needed },
    fSw: { label: 'Switching frequency', symbol: 'f', unit: 'Hz', help: 'Turn-offs per second', ...needed },
    vClamp: {
      label: 'Clamp voltage',
      symbol: 'V_c',
      unit: 'V',
      help: 'Of the clamp capacitor, above the input rail',
      ...needed,
    },
    turnsRatio: { label: 'Turns ratio', symbol: 'n', unit: '', help: 'Primary to secondary', ...needed },
    vOut: {
      label: 'Output voltage',
      symbol: 'V_o',
      unit: 'V',
      help: 'With the drop of the rectifier',
      ...needed,
    },
    ripple: { label: 'Clamp ripple', symbol: 'ΔV', unit: 'V', help: 'Allowed, peak to peak', ...needed },
  },
  formulas: [
    't_s = L_lk I_pk / (V_c − n V_o)',
    'P = ½ L_lk I_pk² f · V_c / (V_c − n V_o)',
    'R = V_c² / P',
    'C = V_c / (ΔV R f)',
  ],
  notes: [
    'The heat is more than the energy of the leakage inductance, ½ L I² f: while the current falls the output’s reflected voltage drives it further. The nearer V_c is to n V_o, the more.',
    'Charging of the switch’s output capacitance lowers the current that reaches the clamp, and the recovery of the diode gives charge back: the real heat is somewhat less.',
  ],
  cautions: [
    'Clamp parts run hot and are at the mains’ potential in an off-line supply: isolate, discharge, keep distances, qualified people only.',
    'The switch sees the input voltage plus V_c plus half the ripple plus what the loop of the clamp adds; keep its rating above, with margin.',
  ],
  sources: [
    {
      citation: 'Energy into the clamp from the linear fall of the leakage current',
      standing: 'derived here, checked from outside',
    },
    {
      citation:
        'Verification methods of snubber circuits in flyback converters, Rohde & Schwarz application note 1SL363, 2021 (title seen, formula not read)',
      standing: 'published',
    },
  ],
  example: {
    lLeak: '3 µH',
    iPeak: '1.8 A',
    fSw: '100 kHz',
    vClamp: '180 V',
    turnsRatio: '8',
    vOut: '12.5 V',
    ripple: '15 V',
  },
  compute: ({ lLeak, iPeak, fSw, vClamp, turnsRatio, vOut, ripple }) => {
    const reflected = turnsRatio * vOut
    const duty = clampDuty({
      leakage: lLeak,
      peakCurrent: iPeak,
      frequency: fSw,
      clampVoltage: vClamp,
      reflectedVoltage: reflected,
    })
    if (!duty.ok) {
      const message = `The clamp voltage must be above the reflected output voltage n V_o = ${reflected.toPrecision(4)} V, or the leakage current never ends.`
      return err(noSolution(message, 'vClamp'))
    }
    const { resetTime, power, resistance } = duty.value
    const capacitance = clampCapacitance(vClamp, ripple, resistance, fSw)
    const excess = vClamp / (vClamp - reflected)
    const isQuick = resetTime * fSw < 0.2
    return ok({
      results: [
        main('power', 'Heat in the clamp', 'P', 'W', power),
        main('rClamp', 'Clamp resistor', 'R', 'Ω', resistance),
        main('cClamp', 'Clamp capacitor, at least', 'C', 'F', capacitance),
        step('reflected', 'Reflected output voltage', 'n V_o', 'V', reflected),
        step('resetTime', 'Reset time of the leakage current', 't_s', 's', resetTime),
        step('leakagePower', 'Power from the leakage energy alone', '½ L_lk I² f', 'W', power / excess),
        step('excess', 'Growth by the reflected voltage', 'V_c/(V_c − n V_o)', '', excess),
        step('rStandard', 'Nearest E24 resistor', 'R', 'Ω', nearestByRatio(resistance, 'E24')),
        step('cStandard', 'Next larger E12 capacitor', 'C', 'F', neighboursOf(capacitance, 'E12').above),
      ],
      choices: [],
      validity: [
        {
          passed: isQuick,
          sentence: isQuick
            ? 'The leakage current ends within a fifth of the period.'
            : 'The leakage current takes more than a fifth of the period to end: the clamp takes energy that was meant for the output. Raise V_c or lower the leakage.',
        },
        {
          passed: excess <= 4,
          sentence:
            excess <= 4
              ? 'The clamp voltage is well above the reflected voltage.'
              : 'The clamp voltage is so near to the reflected voltage that most of the heat comes from the output’s energy.',
        },
        {
          passed: ripple <= 0.2 * vClamp,
          sentence:
            ripple <= 0.2 * vClamp
              ? 'The ripple is small against the clamp voltage, as the formula needs.'
              : 'The ripple is above a fifth of the clamp voltage: the formula for C takes V_c as constant.',
        },
      ],
      figures: [],
    })
  },
})
