import { longestSmoothLength } from '../fourier/radices'
import { transformReal } from '../fourier/real-transform'
import { blackmanHarris4, rectangular, underWindow, type CosineWindow } from '../spectrum/cosine-window'
import { levelOfPeak } from '../spectrum/level'
import { windowResponse } from '../spectrum/window-response'
import type { Harmonic, Harmonics } from './capture-analysis'
import { medianOf } from './median'

/** From so many periods on, neighbouring harmonics lie outside each other's main lobe of the window. */
const periodsForWindow = 9

/** So many samples are enough where they hold so many periods: noise falls by 3 dB only for twice as many. */
const samplesEnough = 2 ** 20
const periodsEnough = 100

const mostHarmonics = 4000

/** Longer records of few periods are read at a length that transforms quickly: their harmonics lie far below the rate. */
const longestExact = 2 ** 19

/** A sine stands above the noise from so many times its rms in a bin on; by chance one bin of 10⁵ does. */
const aboveNoise = 3.4

/** Bins asked for the noise. */
const asked = 4000

type Lines = {
  /** Interleaved transform, and what turns it into peak values. */
  readonly transform: Float64Array
  readonly scale: number
  readonly window: CosineWindow
  /** Bins from one harmonic to the next. */
  readonly spacing: number
}

/**
 * The harmonics of a fundamental of `period` samples, amplitude-correct: 2|X|/Σw at the bin nearest to each, over the
 * closed form of the window at the distance of the harmonic from the middle of that bin. From nine periods on under a
 * four-term Blackman-Harris window; below that from a whole number of periods without a window. The noise floor is that of
 * the bins midway between harmonics. `period` and `sampleNoise` in samples and in the unit of the record.
 */
export function harmonicsOf(
  values: Float64Array,
  period: number,
  intervalSeconds: number,
  sampleNoise: number,
): Harmonics | null {
  const lines = linesOf(values, period)
  if (lines === null) return null
  const floor = aboveNoise * noiseBetween(lines, sampleNoise)
  const count = Math.min(mostHarmonics, Math.floor(period / 2 - 0.5))
  const list = Array.from({ length: count }, (_, index): Harmonic => {
    const order = index + 1
    const amplitude = amplitudeAt(lines, order * lines.spacing)
    return {
      order,
      frequency: order / (period * intervalSeconds),
      amplitude,
      level: amplitude > floor ? levelOfPeak(amplitude) : null,
    }
  })
  return { list, floorAmplitude: floor, floorLevel: floor > 0 ? levelOfPeak(floor) : -Infinity }
}

function linesOf(values: Float64Array, period: number): Lines | null {
  const periods = values.length / period
  if (periods >= periodsForWindow) {
    const isEnough = values.length > samplesEnough && samplesEnough / period >= periodsEnough
    const length = isEnough ? samplesEnough : longestSmoothLength(values.length)
    const { coefficients } = blackmanHarris4
    const transform = transformReal(underWindow(values.subarray(0, length), coefficients))
    return {
      transform,
      scale: scaleOf(length, coefficients[0] ?? 1),
      window: blackmanHarris4,
      spacing: length / period,
    }
  }
  const length = wholePeriods(values.length, period)
  if (length === 0) return null
  const whole = values.subarray(0, length)
  const record = length > longestExact ? stretched(whole, longestSmoothLength(length)) : whole
  const transform = transformReal(record)
  return { transform, scale: scaleOf(record.length, 1), window: rectangular, spacing: length / period }
}

/** Of the numbers of periods that fill at least half a record, the samples of the one nearest to whole samples. */
function wholePeriods(samples: number, period: number): number {
  const most = Math.floor((samples + 0.5) / period)
  let best = 0
  let leastOff = Infinity
  for (let count = most; count >= 1 && 2 * count >= most; count -= 1) {
    const length = Math.min(samples, Math.round(count * period))
    const off = Math.abs(length - count * period)
    if (off < leastOff - 0.05) [best, leastOff] = [length, off]
  }
  return best
}

/** A record read at `length` points between its samples. */
function stretched(values: Float64Array, length: number): Float64Array {
  const step = values.length / length
  return Float64Array.from({ length }, (_, index) => {
    const at = Math.floor(index * step)
    const here = values[at] ?? 0
    return here + (index * step - at) * ((values[at + 1] ?? here) - here)
  })
}

const scaleOf = (length: number, gain: number): number => 2 / (length * gain)

function binAmplitude({ transform, scale }: Lines, bin: number): number {
  const real = transform[2 * bin] ?? 0
  const imaginary = transform[2 * bin + 1] ?? 0
  return scale * Math.sqrt(real * real + imaginary * imaginary)
}

function amplitudeAt(lines: Lines, position: number): number {
  const bin = Math.round(position)
  return binAmplitude(lines, bin) / windowResponse(lines.window.coefficients, position - bin)
}

/**
 * Rms of the noise in a bin: the median of bins midway between harmonics, which for noise is √(ln 2) of it; of a single
 * period, which has no bins between, that of the noise from sample to sample.
 */
function noiseBetween(lines: Lines, sampleNoise: number): number {
  if (lines.spacing < 1.9) return sampleNoise * Math.sqrt(2 * lines.scale)
  const gaps = Math.floor(lines.transform.length / 2 / lines.spacing) - 1
  const stride = Math.max(1, Math.floor(gaps / asked))
  const sizes: number[] = []
  for (let gap = 0; gap < gaps; gap += stride) {
    sizes.push(binAmplitude(lines, Math.round((gap + 0.5) * lines.spacing)))
  }
  return sizes.length === 0 ? 0 : medianOf(sizes) / Math.sqrt(Math.LN2)
}
