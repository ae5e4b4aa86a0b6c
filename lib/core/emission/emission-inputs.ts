import type { InputDefinitions } from '../method/input-definition'

const needed = { isRequired: true, above: 0, atMost: 1e15 } as const

/** What every estimate of a radiated field takes. */
export const emissionInputs = {
  frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', help: 'Of the harmonic', ...needed },
  distance: { label: 'Distance', symbol: 'r', unit: 'm', help: 'To the antenna: 3 m or 10 m', ...needed },
  limit: {
    label: 'Limit',
    symbol: 'E_lim',
    unit: 'dBµV/m',
    help: 'At this frequency and distance, from the standard and edition in force; left empty, none',
    isRequired: false,
    atLeast: -200,
    atMost: 300,
  },
} as const satisfies InputDefinitions

export const emissionCautions = [
  'An estimate from one current is never a statement of conformity: that is for an accredited laboratory under the standard and edition in force.',
] as const
