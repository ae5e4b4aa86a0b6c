import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { speedOfLight } from '../physics/constants'
import { ok } from '../result'
import { distanceRuleAt, levelAtDistance } from './distance'

const distance = { unit: 'm', isRequired: true, atLeast: 0.01, atMost: 1e4 } as const

/** A field level measured at one distance, at another. */
export const distanceConversion = defineMethod({
  id: 'distance-conversion',
  version: 1,
  title: 'Field level at another distance',
  purpose: 'Carries a measured field level, or a limit, to another measuring distance.',
  inputs: {
    level: {
      label: 'Field level',
      symbol: 'E',
      unit: 'dBµV/m',
      help: 'Measured, or a limit',
      isRequired: true,
      atLeast: -200,
      atMost: 300,
    },
    from: { label: 'Its distance', symbol: 'd₁', help: 'Of the antenna', ...distance },
    to: { label: 'Wanted distance', symbol: 'd₂', help: 'Of the limit', ...distance },
    frequency: {
      label: 'Frequency',
      symbol: 'f',
      unit: 'Hz',
      help: 'Decides the rule',
      isRequired: true,
      atLeast: 1e3,
      atMost: 1e12,
    },
  },
  formulas: [
    'E₂ = E₁ + 20 lg(d₁/d₂) from 30 MHz on',
    'E₂ = E₁ + 40 lg(d₁/d₂) below 30 MHz, where not measured at two distances',
  ],
  notes: [
    'From 10 m to 3 m the far field rises by 10.46 dB; the tables of CISPR take a rounded 10 dB.',
    'Nearer than λ/(2π) the field of a source falls with the second or third power of distance; equipment that is large against the distance follows no power at all. A prediction over distance is weaker than a measurement at the distance of the limit.',
  ],
  cautions: ['An extrapolated level is an estimate, never a statement of conformity.'],
  sources: [{ citation: '47 CFR 15.31(f)(1) and (2), read in a public copy', standing: 'published' }],
  example: { level: '43', from: '3 m', to: '10 m', frequency: '100 MHz' },
  compute: ({ level, from, to, frequency }) => {
    const rule = distanceRuleAt(frequency)
    const edge = speedOfLight / frequency / (2 * Math.PI)
    const isFar = Math.min(from, to) >= edge
    return ok({
      results: [
        main(
          'converted',
          'Field level at the wanted distance',
          'E₂',
          'dBµV/m',
          levelAtDistance(level, from, to, rule),
        ),
        step('change', 'Change', 'E₂ − E₁', 'dB', levelAtDistance(0, from, to, rule)),
        step('rule', 'Rule, a decade of distance', '', 'dB', rule),
        step('farField', 'End of the reactive near field', 'λ/(2π)', 'm', edge),
      ],
      choices: [],
      validity: [
        {
          passed: isFar,
          sentence: isFar
            ? 'Both distances lie beyond the reactive near field.'
            : 'One of the distances lies within the reactive near field, λ/(2π): the rule is a convention there, not physics.',
        },
      ],
      figures: [],
    })
  },
})
