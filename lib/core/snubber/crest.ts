import { derivativeOf, valueIn, type Stretch } from './edge-response'

/** Enough in each window to tell its highest swing; Newton's method then finds the crest of that swing. */
const samples = 30

/** A swing whose largest sample is below this part of the largest of all is not the highest one. */
const share = 0.9

/** Newton's method with bisection ends long before; it doubles its digits with every step. */
const mostSteps = 60

/** A part of a stretch, in the time of the stretch. */
export type Window = { readonly stretch: Stretch; readonly from: number; readonly to: number }

/** The largest value in a window, or 0 where all are below: at its ends or where the rate passes through 0. */
export const highestIn = (window: Window): number => largestIn(window, (value) => value)

/** The largest magnitude in a window, of swings both ways. */
export const largestMagnitudeIn = (window: Window): number => largestIn(window, Math.abs)

function largestIn(window: Window, measure: (value: number) => number): number {
  const { stretch, from, to } = window
  const step = (to - from) / samples
  const values = sampled(stretch, from, step)
  let most = 0
  for (let index = 0; index <= samples; index += 1) {
    const value = measure(values[index] ?? 0)
    values[index] = value
    if (value > most) most = value
  }
  let largest = 0
  let before = 0
  for (let index = 0; index <= samples; index += 1) {
    const value = values[index] ?? 0
    const behind = index < samples ? (values[index + 1] ?? 0) : 0
    if (value >= before && value >= behind && value >= share * most) {
      const crest = crestNear(window, from + index * step, step)
      largest = Math.max(
        largest,
        measure(valueIn(stretch, crest)),
        measure(valueIn(stretch, from + index * step)),
      )
    }
    before = value
  }
  return largest
}

/** Equally spaced values, each exponential by multiplication from one to the next. */
function sampled({ offset, slope, modes }: Stretch, from: number, step: number): Float64Array {
  const values = new Float64Array(samples + 1)
  for (let index = 0; index <= samples; index += 1) values[index] = offset + slope * (from + index * step)
  for (const { pole, weight } of modes) {
    if (pole.im < 0) continue
    const size = (pole.im === 0 ? 1 : 2) * Math.exp(pole.re * from)
    const [cosine, sine] = [Math.cos(pole.im * from), Math.sin(pole.im * from)]
    let re = size * (weight.re * cosine - weight.im * sine)
    let im = size * (weight.re * sine + weight.im * cosine)
    const factor = Math.exp(pole.re * step)
    const [turnRe, turnIm] = [factor * Math.cos(pole.im * step), factor * Math.sin(pole.im * step)]
    for (let index = 0; index <= samples; index += 1) {
      values[index] = (values[index] ?? 0) + re
      const next = re * turnRe - im * turnIm
      im = re * turnIm + im * turnRe
      re = next
    }
  }
  return values
}

/** The crest of the swing, up or down, whose largest sample is at `time`; an end of the window where it lies beyond. */
function crestNear({ stretch, from, to }: Window, time: number, step: number): number {
  const rate = derivativeOf(stretch)
  const direction = valueIn(stretch, time) < 0 ? -1 : 1
  const isLater = direction * valueIn(rate, time) > 0
  const end = isLater ? Math.min(to, time + step) : Math.max(from, time - step)
  return end === time ? time : zeroOf(rate, time, end)
}

/** Where a stretch is 0 that changes its sign between `start` and `end`. */
function zeroOf(stretch: Stretch, start: number, end: number): number {
  const rate = derivativeOf(stretch)
  const enough = 1e-9 * Math.abs(end - start)
  const isPositive = valueIn(stretch, start) > 0
  let [near, far, time] = [start, end, (start + end) / 2]
  for (let step = 0; step < mostSteps; step += 1) {
    const value = valueIn(stretch, time)
    if (value > 0 === isPositive) near = time
    else far = time
    const newton = time - value / valueIn(rate, time)
    const isBetween = (newton - near) * (newton - far) < 0
    const next = isBetween ? newton : (near + far) / 2
    if (Math.abs(next - time) <= enough) return next
    time = next
  }
  return time
}
