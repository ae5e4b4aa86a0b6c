const cosine72 = (Math.sqrt(5) - 1) / 4
const cosine144 = -(Math.sqrt(5) + 1) / 4
const sine72 = Math.sqrt(10 + 2 * Math.sqrt(5)) / 4
const sine144 = Math.sqrt(10 - 2 * Math.sqrt(5)) / 4

/** One pass of radix 5 over `s` transforms at a time; see `passFour`. `twiddles` holds w … w⁴ for each p, from `at`. */
export function passFive(
  x: Float64Array,
  y: Float64Array,
  m: number,
  s: number,
  twiddles: Float64Array,
  at: number,
): void {
  const width = 2 * s
  const apart = m * width
  for (let p = 0; p < m; p += 1) {
    const w = at + 8 * p
    const w1r = twiddles[w] ?? 0
    const w1i = twiddles[w + 1] ?? 0
    const w2r = twiddles[w + 2] ?? 0
    const w2i = twiddles[w + 3] ?? 0
    const w3r = twiddles[w + 4] ?? 0
    const w3i = twiddles[w + 5] ?? 0
    const w4r = twiddles[w + 6] ?? 0
    const w4i = twiddles[w + 7] ?? 0
    const end = (p + 1) * width
    let to = 5 * p * width
    for (let from = p * width; from < end; from += 2) {
      const b = from + apart
      const c = b + apart
      const d = c + apart
      const e = d + apart
      const ar = x[from] ?? 0
      const ai = x[from + 1] ?? 0
      const outerSumR = (x[b] ?? 0) + (x[e] ?? 0)
      const outerSumI = (x[b + 1] ?? 0) + (x[e + 1] ?? 0)
      const outerR = (x[b] ?? 0) - (x[e] ?? 0)
      const outerI = (x[b + 1] ?? 0) - (x[e + 1] ?? 0)
      const innerSumR = (x[c] ?? 0) + (x[d] ?? 0)
      const innerSumI = (x[c + 1] ?? 0) + (x[d + 1] ?? 0)
      const innerR = (x[c] ?? 0) - (x[d] ?? 0)
      const innerI = (x[c + 1] ?? 0) - (x[d + 1] ?? 0)
      const nearR = ar + cosine72 * outerSumR + cosine144 * innerSumR
      const nearI = ai + cosine72 * outerSumI + cosine144 * innerSumI
      const farR = ar + cosine144 * outerSumR + cosine72 * innerSumR
      const farI = ai + cosine144 * outerSumI + cosine72 * innerSumI
      const nearTurnedR = sine72 * outerR + sine144 * innerR
      const nearTurnedI = sine72 * outerI + sine144 * innerI
      const farTurnedR = sine144 * outerR - sine72 * innerR
      const farTurnedI = sine144 * outerI - sine72 * innerI
      const y1r = nearR + nearTurnedI
      const y1i = nearI - nearTurnedR
      const y2r = farR + farTurnedI
      const y2i = farI - farTurnedR
      const y3r = farR - farTurnedI
      const y3i = farI + farTurnedR
      const y4r = nearR - nearTurnedI
      const y4i = nearI + nearTurnedR
      const to1 = to + width
      const to2 = to1 + width
      const to3 = to2 + width
      const to4 = to3 + width
      y[to] = ar + outerSumR + innerSumR
      y[to + 1] = ai + outerSumI + innerSumI
      y[to1] = w1r * y1r - w1i * y1i
      y[to1 + 1] = w1r * y1i + w1i * y1r
      y[to2] = w2r * y2r - w2i * y2i
      y[to2 + 1] = w2r * y2i + w2i * y2r
      y[to3] = w3r * y3r - w3i * y3i
      y[to3 + 1] = w3r * y3i + w3i * y3r
      y[to4] = w4r * y4r - w4i * y4i
      y[to4 + 1] = w4r * y4i + w4i * y4r
      to += 2
    }
  }
}
