import { add, complex, multiply, type Complex } from './complex'

/** Real coefficients, lowest power first. */
export type Polynomial = readonly number[]

/** The value at a complex point, by Horner's rule. */
export function valueAt(polynomial: Polynomial, point: Complex): Complex {
  let value = complex(0)
  for (let power = polynomial.length - 1; power >= 0; power -= 1) {
    value = add(multiply(value, point), complex(polynomial[power] ?? 0))
  }
  return value
}
