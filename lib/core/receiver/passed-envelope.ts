import { inverseComplex } from '../fourier/complex-transform'
import type { EnvelopeCycle } from './envelope-cycle'
import { coupledStagesGain } from './filter-bandwidths'

/** Lines so many bandwidths away are 100 dB down behind the filter. */
const reach = 8

/** How many lines a passband takes in, for lines `spacing` Hz apart. */
export const linesPassed = (b6: number, spacing: number): number =>
  2 * Math.max(8, Math.ceil((reach * b6) / spacing)) + 1

/**
 * The envelope behind two critically coupled stages tuned to `tuned` Hz of a signal with lines at whole multiples of
 * `spacing` Hz; it repeats with the period 1/spacing. `lineAt` gives the complex amplitude of a line by its multiple.
 */
export function passedEnvelope(
  lineAt: (multiple: number) => readonly [number, number],
  spacing: number,
  b6: number,
  tuned: number,
): EnvelopeCycle {
  const half = (linesPassed(b6, spacing) - 1) / 2
  const middle = Math.round(tuned / spacing)
  const points = 2 ** Math.ceil(Math.log2(4 * half))
  const passed = new Float64Array(2 * points)
  for (let away = -half; away <= half; away += 1) {
    const [lineR, lineI] = lineAt(middle + away)
    const [gainR, gainI] = coupledStagesGain(b6, (middle + away) * spacing - tuned)
    const bin = (away + points) % points
    passed[2 * bin] = points * (lineR * gainR - lineI * gainI)
    passed[2 * bin + 1] = points * (lineR * gainI + lineI * gainR)
  }
  const wave = inverseComplex(passed)
  const amplitudes = Float64Array.from({ length: points + 1 }, (_, index) => {
    const at = 2 * (index % points)
    return Math.hypot(wave[at] ?? 0, wave[at + 1] ?? 0)
  })
  const period = 1 / spacing
  return { amplitudes, step: period / points, period }
}
