import type { QuantityInput } from '../method/input-definition'

/** An end of the part of a record that is looked at; left empty, that of the record. */
export const instantInput = (label: string, symbol: string, help: string): QuantityInput => ({
  label,
  symbol,
  unit: 's',
  help,
  isRequired: false,
})

export const probingCaution =
  'Switch nodes and circuits tied to the mains can injure: isolated or differential probes, discharged capacitors, qualified people.'
