/** An edge among samples, seen from its levels. */
export type EdgeView = {
  readonly values: Float64Array
  /** The level before and after the edge. */
  readonly before: number
  readonly after: number
  /** The first sample beyond half of the way. */
  readonly crossing: number
  /** Samples that belong to the edge and to the states beside it: [start, end). */
  readonly start: number
  readonly end: number
  /** Standard deviation of the noise, in the unit of the values. */
  readonly noise: number
}

/** Curves through so many samples on either side of a crossing are tried, as parts of the transition from 10 to 90 %. */
const fitParts = [0.08, 0.16, 0.25] as const

/** A wider curve is tried while the noise moves a crossing by more than this part of the transition. */
const mostShift = 0.015

/** A curve is laid again about the crossing that it gives, so often. */
const passes = 4

/**
 * The instants, in samples, at which an edge passes 10, 50 and 90 % of the way (reference levels of IEEE Std 181-2011): the
 * first crossings on either side of the middle. Sub-sample: a cubic through the four samples around a crossing where an
 * edge has few of them; else a parabola by least squares through those within 8 % of the transition on either side, and up
 * to 25 % where the noise asks for it.
 */
export function edgeInstants(edge: EdgeView): {
  readonly at10: number
  readonly at50: number
  readonly at90: number
} {
  const rough10 = lastBelow(edge, 0.1)
  const rough90 = firstAbove(edge, 0.9)
  const width = rough90 - rough10
  return {
    at10: refine(edge, rough10, 0.1, width),
    at50: refine(edge, lastBelow(edge, 0.5), 0.5, width),
    at90: refine(edge, rough90 - 1, 0.9, width),
  }
}

const progressAt = ({ values, before, after }: EdgeView, index: number): number =>
  ((values[index] ?? 0) - before) / (after - before)

/** The last sample before the crossing that is not beyond a level; the first one of the edge where none is. */
function lastBelow(edge: EdgeView, level: number): number {
  let index = edge.crossing
  while (index > edge.start && progressAt(edge, index) > level) index -= 1
  return index
}

function firstAbove(edge: EdgeView, level: number): number {
  let index = edge.crossing
  while (index < edge.end - 1 && progressAt(edge, index) < level) index += 1
  return index
}

/** The crossing between the samples `below` and the next one. */
function refine(edge: EdgeView, below: number, level: number, width: number): number {
  const noise = edge.noise / Math.abs(edge.after - edge.before)
  let best = cubicCrossing(edge, below, level)
  for (const part of fitParts) {
    const half = Math.floor(part * width)
    if (half < 2) continue
    const fitted = settledCrossing(edge, below + 0.5, level, half)
    if (fitted === null) continue
    best = fitted.at
    if (noise / fitted.slope / Math.sqrt(2 * half) <= mostShift * width) break
  }
  return best
}

/** Lagrange's cubic through four neighbours, halved down to the crossing between the middle two. */
function cubicCrossing(edge: EdgeView, below: number, level: number): number {
  const first = progressAt(edge, below) - level
  const second = progressAt(edge, below + 1) - level
  if (first === second) return below + 1
  const linear = below - first / (second - first)
  if (below - 1 < edge.start || below + 2 >= edge.end || first > 0 || second < 0) return linear
  const before = progressAt(edge, below - 1) - level
  const beyond = progressAt(edge, below + 2) - level
  const at = (x: number): number =>
    (-before * x * (x - 1) * (x - 2)) / 6 +
    (first * (x + 1) * (x - 1) * (x - 2)) / 2 -
    (second * (x + 1) * x * (x - 2)) / 2 +
    (beyond * (x + 1) * x * (x - 1)) / 6
  let low = 0
  let high = 1
  for (let halving = 0; halving < 40; halving += 1) {
    const middle = (low + high) / 2
    if (at(middle) < 0) low = middle
    else high = middle
  }
  return below + (low + high) / 2
}

type Crossing = { readonly at: number; readonly slope: number }

/** The crossing of a curve that is laid about itself; null where the edge has no room for it or it does not cross. */
function settledCrossing(edge: EdgeView, rough: number, level: number, half: number): Crossing | null {
  let found: Crossing = { at: rough, slope: Infinity }
  for (let pass = 0; pass < passes; pass += 1) {
    const from = Math.round(found.at + 0.5) - half
    const next = parabolaCrossing(edge, from, from + 2 * half - 1, level)
    if (next === null) return pass === 0 ? null : found
    const isSettled = Math.abs(next.at - found.at) < 0.5
    found = next
    if (isSettled) break
  }
  return found
}

/** By least squares over the samples from … to; null where it does not cross among them. */
function parabolaCrossing(edge: EdgeView, from: number, to: number, level: number): Crossing | null {
  if (from < edge.start || to >= edge.end) return null
  const middle = (from + to) / 2
  let s2 = 0
  let s4 = 0
  let y0 = 0
  let y1 = 0
  let y2 = 0
  for (let index = from; index <= to; index += 1) {
    const x = index - middle
    const y = progressAt(edge, index) - level
    s2 += x * x
    s4 += x ** 4
    y0 += y
    y1 += x * y
    y2 += x * x * y
  }
  const count = to - from + 1
  const bend = (count * y2 - s2 * y0) / (count * s4 - s2 * s2)
  const slope = y1 / s2
  const root = nearRoot(bend, slope, (y0 - bend * s2) / count)
  return root !== null && Math.abs(root) <= count ? { at: middle + root, slope } : null
}

/** The root of bend x² + slope x + constant nearer to 0. */
function nearRoot(bend: number, slope: number, constant: number): number | null {
  const discriminant = slope ** 2 - 4 * bend * constant
  if (!(slope > 0) || discriminant < 0) return null
  return (-2 * constant) / (slope + Math.sqrt(discriminant))
}
