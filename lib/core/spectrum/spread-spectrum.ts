import { transformComplex } from '../fourier/complex-transform'

/** A line whose frequency is swept up and down; Hz. */
export type SpreadLine = {
  /** From the lowest to the highest frequency of the line: for a harmonic, the harmonic times the width of the clock. */
  readonly width: number
  /** Sweeps up and down per second. */
  readonly rate: number
  readonly profile: 'triangle' | 'sine'
}

/** The lines that modulation makes of one, `spacing` Hz apart around its middle. */
export type Sidebands = {
  /** Interleaved complex amplitudes of lines −count … count; the steady line has 1. */
  readonly lines: Float64Array
  readonly count: number
  readonly spacing: number
}

/** Sidebands so far outside the sweep are left out, as a multiple of its width. */
const outside = 1.5

/** The width that holds about 98 % of the power of a line swept by a sine, W + 2 f_m. J. R. Carson 1922 (from memory). */
export const carsonWidth = ({ width, rate }: SpreadLine): number => width + 2 * rate

/**
 * How much lower the power in a passband is than that of the steady line, in dB, where the power is spread evenly over the
 * width of the sweep: 10 lg(W/max(B, f_m)), and 0 where the passband holds all. The share that every detector has to live
 * with on average: a peak detector gains less.
 */
export const evenSpreadReduction = ({ width, rate }: SpreadLine, noiseBandwidth: number): number =>
  Math.max(0, 10 * Math.log10(width / Math.max(noiseBandwidth, rate)))

/** The sidebands of a swept line, from the transform of one period of exp(jφ), dφ/dt = 2π × its frequency offset. */
export function sidebandsOf(line: SpreadLine): Sidebands {
  const { width, rate } = line
  const count = Math.ceil((outside * width) / 2 / rate) + 16
  const points = 2 ** Math.ceil(Math.log2(4 * count))
  const wave = new Float64Array(2 * points)
  for (let index = 0; index < points; index += 1) {
    const turns = (width / rate) * sweptTurns(line.profile, index / points)
    wave[2 * index] = Math.cos(2 * Math.PI * turns)
    wave[2 * index + 1] = Math.sin(2 * Math.PI * turns)
  }
  const transform = transformComplex(wave)
  const lines = new Float64Array(2 * (2 * count + 1))
  for (let index = 0; index <= 2 * count; index += 1) {
    const bin = (index - count + points) % points
    lines[2 * index] = (transform[2 * bin] ?? 0) / points
    lines[2 * index + 1] = (transform[2 * bin + 1] ?? 0) / points
  }
  return { lines, count, spacing: rate }
}

/** The integral of the profile, from −½ to ½ over one period, in parts of the period. */
function sweptTurns(profile: SpreadLine['profile'], u: number): number {
  if (profile === 'sine') return -Math.cos(2 * Math.PI * u) / (4 * Math.PI)
  return u < 0.5 ? u * u - u / 2 : (u - 0.5) / 2 - (u - 0.5) ** 2
}
