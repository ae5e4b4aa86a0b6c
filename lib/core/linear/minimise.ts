const golden = (Math.sqrt(5) - 1) / 2

/** The argument of the smallest value of a function with one minimum in [low, high], by golden-section search. */
export function minimiseOn(
  objective: (x: number) => number,
  low: number,
  high: number,
  tolerance = 1e-9,
): number {
  let a = low
  let b = high
  let x1 = b - golden * (b - a)
  let x2 = a + golden * (b - a)
  let f1 = objective(x1)
  let f2 = objective(x2)
  while (b - a > tolerance * Math.max(1, Math.abs(a), Math.abs(b))) {
    if (f1 < f2) {
      b = x2
      x2 = x1
      f2 = f1
      x1 = b - golden * (b - a)
      f1 = objective(x1)
    } else {
      a = x1
      x1 = x2
      f1 = f2
      x2 = a + golden * (b - a)
      f2 = objective(x2)
    }
  }
  return (a + b) / 2
}
