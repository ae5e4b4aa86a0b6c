import type { QuantityInput } from '../method/input-definition'
import type { ResultValue, Source } from '../method/method'
import { step } from '../method/result-value'

/** A length between 10 nm and 10 km: far beyond any board, within which every formula is well conditioned. */
export const lengthInput = <Required extends boolean>(
  label: string,
  symbol: string,
  help: string,
  isRequired: Required,
): QuantityInput & { readonly isRequired: Required } => ({
  label,
  symbol,
  unit: 'm',
  help,
  isRequired,
  atLeast: 1e-8,
  atMost: 1e4,
})

export const derivedHere: Source = {
  citation: 'Magnetic field of the stated current, by integration',
  standing: 'derived here, checked from outside',
}

export const rosaSource: Source = {
  citation:
    'E. B. Rosa, The Self and Mutual Inductances of Linear Conductors, Bulletin of the Bureau of Standards 4, 1908 (from memory)',
  standing: 'published',
}

export const loopCautions = [
  'A computed inductance is an engineering estimate; measure where it decides.',
] as const

/** The part that two models of the current leave open, as a result. */
export const currentModelSpread = (surface: number, uniform: number): ResultValue =>
  step('modelSpread', 'Difference between the models of the current', 'ΔL', 'H', uniform - surface)
