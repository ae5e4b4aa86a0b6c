/** A complex number. */
export type Complex = { readonly re: number; readonly im: number }

export const complex = (re: number, im = 0): Complex => ({ re, im })

export const add = (a: Complex, b: Complex): Complex => complex(a.re + b.re, a.im + b.im)

export const multiply = (a: Complex, b: Complex): Complex =>
  complex(a.re * b.re - a.im * b.im, a.re * b.im + a.im * b.re)

export const scale = (a: Complex, factor: number): Complex => complex(a.re * factor, a.im * factor)

export function divide(a: Complex, b: Complex): Complex {
  const square = b.re * b.re + b.im * b.im
  return complex((a.re * b.re + a.im * b.im) / square, (a.im * b.re - a.re * b.im) / square)
}

export const magnitude = (a: Complex): number => Math.hypot(a.re, a.im)

export function exponential(a: Complex): Complex {
  const radius = Math.exp(a.re)
  return complex(radius * Math.cos(a.im), radius * Math.sin(a.im))
}

/** (exp(z) − 1)/z, which tends to 1 for z → 0; a series is used near zero where the difference would cancel. */
export function exponentialMean(z: Complex): Complex {
  if (magnitude(z) > 1e-3) return divide(add(exponential(z), complex(-1)), z)
  const square = multiply(z, z)
  const cube = multiply(square, z)
  return add(add(complex(1), scale(z, 1 / 2)), add(scale(square, 1 / 6), scale(cube, 1 / 24)))
}
