import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { currentOfLevel, levelOfCurrent, levelOfPeak, levelOfPower, levelOfRms } from './level'
import { peakOfLevel, powerOfLevel, rmsOfLevel } from './level'

const positive = { isRequired: false, atLeast: 1e-15, atMost: 1e9 } as const
const level = { isRequired: false, atLeast: -300, atMost: 300 } as const

/** One value of a sine in any of the units that reports and instruments use, in all the others. */
export const decibelConversion = defineMethod({
  id: 'decibel-conversion',
  version: 1,
  title: 'Levels in dB',
  purpose: 'Converts a voltage, current, power or field strength between its unit and its levels in dB.',
  inputs: {
    rms: { label: 'Voltage, rms', symbol: 'U', unit: 'V', help: 'Give one of these values', ...positive },
    peak: { label: 'Voltage, peak', symbol: 'Û', unit: 'V', help: 'Of a sine', ...positive },
    level: { label: 'Voltage level', symbol: 'L', unit: 'dBµV', help: 'As a receiver shows it', ...level },
    power: { label: 'Power level', symbol: 'P', unit: 'dBm', help: 'Into the resistance', ...level },
    current: { label: 'Current level', symbol: 'I', unit: 'dBµA', help: 'Of a current probe', ...level },
    field: {
      label: 'Field strength, rms',
      symbol: 'E',
      unit: 'V/m',
      help: 'Alone, without the others',
      ...positive,
    },
    fieldLevel: {
      label: 'Field level',
      symbol: 'E',
      unit: 'dBµV/m',
      help: 'Alone, without the others',
      ...level,
    },
    resistance: {
      label: 'Resistance',
      symbol: 'R',
      unit: 'Ω',
      help: 'Of the measuring system; empty for 50 Ω',
      isRequired: false,
      atLeast: 1e-3,
      atMost: 1e6,
    },
  },
  formulas: [
    'dBµV = 20 lg(U/1 µV) = 20 lg(Û/√2 / 1 µV)',
    'dBµV = dBm + 20 lg(√(R · 1 mW)/1 µV) = dBm + 106.99 in 50 Ω',
    'dBµV = dBµA + 20 lg(R/1 Ω) = dBµA + 33.98 in 50 Ω',
  ],
  notes: [
    'Spectrum analysers and receivers show the rms value of a sine whatever the detector: “peak” names how readings over time are taken, not Û.',
    'A scan in dBm taken for dBµV is 107 dB off in 50 Ω.',
    'Field strengths become voltages only through an antenna factor; this method does not know one.',
  ],
  cautions: [],
  sources: [{ citation: 'The definitions of the units', standing: 'derived here, checked from outside' }],
  example: { power: '-47 dBm' },
  compute: (values) => {
    const { resistance = 50, field, fieldLevel } = values
    const known = [
      values.rms === undefined ? [] : [levelOfRms(values.rms)],
      values.peak === undefined ? [] : [levelOfPeak(values.peak)],
      values.level === undefined ? [] : [values.level],
      values.power === undefined ? [] : [levelOfPower(values.power, resistance)],
      values.current === undefined ? [] : [levelOfCurrent(values.current, resistance)],
    ].flat()
    const fields = [
      field === undefined ? [] : [levelOfRms(field)],
      fieldLevel === undefined ? [] : [fieldLevel],
    ].flat()
    const [voltage] = known
    const [electric] = fields
    if (known.length + fields.length !== 1) {
      return err(noSolution('Give exactly one of the values; the others follow from it.', 'rms', 'level'))
    }
    const results = [
      ...(voltage === undefined
        ? []
        : [
            main('level', 'Voltage level', 'L', 'dBµV', voltage),
            main('power', 'Power level', 'P', 'dBm', powerOfLevel(voltage, resistance)),
            main('current', 'Current level', 'I', 'dBµA', currentOfLevel(voltage, resistance)),
            main('rms', 'Voltage, rms', 'U', 'V', rmsOfLevel(voltage)),
            main('peak', 'Voltage, peak', 'Û', 'V', peakOfLevel(voltage)),
            step('resistanceUsed', 'Resistance', 'R', 'Ω', resistance),
          ]),
      ...(electric === undefined
        ? []
        : [
            main('fieldLevel', 'Field level', 'E', 'dBµV/m', electric),
            main('field', 'Field strength, rms', 'E', 'V/m', rmsOfLevel(electric)),
          ]),
    ]
    return ok({ results, choices: [], validity: [], figures: [] })
  },
})
