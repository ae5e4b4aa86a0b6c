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
}

/** A curve through so many samples on either side of a crossing, as a part of the transition from 10 to 90 %. */
const fitPart = 0.08

/**
 * The instants, in samples, at which an edge passes 10, 50 and 90 % of the way (reference levels of IEEE Std 181-2011): the
 * first crossings on either side of the middle. Sub-sample: a cubic through the four samples around a crossing where an
 * edge has few of them; else a parabola by least squares through those within 8 % of the transition on either side, which
 * averages the noise.
 */
export function edgeInstants(edge: EdgeView): {
  readonly at10: number
  readonly at50: number
  readonly at90: number
} {
  const rough10 = lastBelow(edge, 0.1)
  const rough90 = firstAbove(edge, 0.9)
  const half = Math.floor(fitPart * (rough90 - rough10))
  return {
    at10: refine(edge, rough10, 0.1, half),
    at50: refine(edge, lastBelow(edge, 0.5), 0.5, half),
    at90: refine(edge, rough90 - 1, 0.9, half),
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
function refine(edge: EdgeView, below: number, level: number, half: number): number {
  if (half >= 2) {
    const fitted = parabolaCrossing(edge, below, level, half)
    if (fitted !== null) return fitted
  }
  return cubicCrossing(edge, below, level)
}

/** Lagrange's cubic through four neighbours, halved down to the crossing between the middle two. */
function cubicCrossing(edge: EdgeView, below: number, level: number): number {
  const first = progressAt(edge, below) - level
  const second = progressAt(edge, below + 1) - level
  if (first === second) return below + 1
  const linear = below - first / (second - first)
  if (below - 1 < edge.start || below + 2 >= edge.end || first > 0 || second < 0) return linear
  const outer = [progressAt(edge, below - 1) - level, progressAt(edge, below + 2) - level] as const
  const at = (x: number): number =>
    (-outer[0] * x * (x - 1) * (x - 2)) / 6 +
    (first * (x + 1) * (x - 1) * (x - 2)) / 2 -
    (second * (x + 1) * x * (x - 2)) / 2 +
    (outer[1] * (x + 1) * x * (x - 1)) / 6
  let low = 0
  let high = 1
  for (let halving = 0; halving < 40; halving += 1) {
    const middle = (low + high) / 2
    if (at(middle) < 0) low = middle
    else high = middle
  }
  return below + (low + high) / 2
}

/** By least squares over x = −half … half about the middle of the two samples; null where it does not cross there. */
function parabolaCrossing(edge: EdgeView, below: number, level: number, half: number): number | null {
  const from = below - half + 1
  const to = below + half
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
  const constant = (y0 - bend * s2) / count
  const slope = y1 / s2
  const root = nearRoot(bend, slope, constant)
  return root !== null && Math.abs(root) <= half ? middle + root : null
}

/** The root of bend x² + slope x + constant nearer to 0. */
function nearRoot(bend: number, slope: number, constant: number): number | null {
  const discriminant = slope ** 2 - 4 * bend * constant
  if (!(slope > 0) || discriminant < 0) return null
  return (-2 * constant) / (slope + Math.sqrt(discriminant))
}
