import { solveLinear } from '../ring/solve-linear'

/** Decay and angular frequency of the ring and decay of the tail, all per sample; an infinite tail is none. */
export type Rates = readonly [decay: number, omega: number, tail: number]

/** A fit: its rates, the sum of squares that it leaves over, and level, cosine, sine and tail. */
export type TailFit = { readonly rates: Rates; readonly square: number; readonly linear: readonly number[] }

/** Every `stride`-th sample of a stretch. */
export type Stretched = { readonly samples: Float64Array; readonly stride: number }

const mostIterations = 40

/** Levenberg and Marquardt over the three rates, on their logarithms, with numeric derivatives of the residual. */
export function refineRates(stretch: Stretched, start: Rates): TailFit | null {
  let best = fitLinear(stretch, start)
  let damping = 1e-2
  for (let iteration = 0; best !== null && iteration < mostIterations; iteration += 1) {
    const step = stepFrom(stretch, best, damping)
    if (step === null) return best
    const tried = fitLinear(stretch, scaledBy(best.rates, step))
    if (tried !== null && tried.square < best.square) {
      const gain = 1 - tried.square / best.square
      best = tried
      damping /= 5
      if (gain < 1e-9) break
    } else {
      damping *= 5
      if (damping > 1e6) break
    }
  }
  return best
}

const scaledBy = (rates: Rates, step: readonly number[]): Rates => {
  const at = (index: 0 | 1 | 2) => rates[index] * Math.exp(Math.max(-0.5, Math.min(0.5, step[index] ?? 0)))
  return [at(0), at(1), at(2)]
}

const nudge = 1e-5

function stepFrom(stretch: Stretched, { rates }: TailFit, damping: number): readonly number[] | null {
  const base = residualOf(stretch, rates)
  const slopes = [0, 1, 2].map((index) => {
    const moved = residualOf(
      stretch,
      scaledBy(
        rates,
        [0, 1, 2].map((other) => (other === index ? nudge : 0)),
      ),
    )
    return base === null || moved === null
      ? null
      : moved.map((value, at) => (value - (base[at] ?? 0)) / nudge)
  })
  if (base === null) return null
  const columns = slopes.flatMap((slope) => (slope === null ? [] : [slope]))
  if (columns.length < 3) return null
  const matrix = columns.map((row, i) =>
    columns.map((column, j) => dot(row, column) * (i === j ? 1 + damping : 1)),
  )
  return solveLinear(
    matrix,
    columns.map((column) => -dot(column, base)),
  )
}

const dot = (a: Float64Array, b: Float64Array): number =>
  a.reduce((sum, value, index) => sum + value * (b[index] ?? 0), 0)

/** Level, cosine, sine and tail for given rates, by linear least squares; null where two of them cannot be told apart. */
export function fitLinear({ samples, stride }: Stretched, rates: Rates): TailFit | null {
  const basis = basisOf(samples.length, stride, rates)
  const linear = project(samples, basis)
  if (linear === null) return null
  const residual = leftOver(samples, basis, linear)
  return { rates, linear, square: dot(residual, residual) }
}

function residualOf({ samples, stride }: Stretched, rates: Rates): Float64Array | null {
  const basis = basisOf(samples.length, stride, rates)
  const linear = project(samples, basis)
  return linear === null ? null : leftOver(samples, basis, linear)
}

/** 1, e^(−αt) cos ωt, e^(−αt) sin ωt and, for a finite γ, e^(−γt). */
function basisOf(count: number, stride: number, [decay, omega, tail]: Rates): readonly Float64Array[] {
  const of = (shape: (time: number) => number) =>
    Float64Array.from({ length: count }, (_, index) => shape(index * stride))
  return [
    of(() => 1),
    of((time) => Math.exp(-decay * time) * Math.cos(omega * time)),
    of((time) => Math.exp(-decay * time) * Math.sin(omega * time)),
    ...(Number.isFinite(tail) ? [of((time) => Math.exp(-tail * time))] : []),
  ]
}

const project = (samples: Float64Array, basis: readonly Float64Array[]): readonly number[] | null =>
  solveLinear(
    basis.map((row) => basis.map((column) => dot(row, column))),
    basis.map((row) => dot(row, samples)),
  )

const leftOver = (
  samples: Float64Array,
  basis: readonly Float64Array[],
  linear: readonly number[],
): Float64Array =>
  samples.map((value, index) =>
    basis.reduce((rest, part, at) => rest - (linear[at] ?? 0) * (part[index] ?? 0), value),
  )
