/**
 * One pass of radix 4 over `s` transforms at a time: groups of four values `m·s` apart become four neighbours `s` apart.
 * Arrays are interleaved; `twiddles` holds w, w², w³ for each p, from `at`.
 */
export function passFour(
  x: Float64Array,
  y: Float64Array,
  m: number,
  s: number,
  twiddles: Float64Array,
  at: number,
): void {
  const width = 2 * s
  const apart = m * width
  plainFour(x, y, apart, width)
  for (let p = 1; p < m; p += 1) {
    const w = at + 6 * p
    const w1r = twiddles[w] ?? 0
    const w1i = twiddles[w + 1] ?? 0
    const w2r = twiddles[w + 2] ?? 0
    const w2i = twiddles[w + 3] ?? 0
    const w3r = twiddles[w + 4] ?? 0
    const w3i = twiddles[w + 5] ?? 0
    const end = (p + 1) * width
    let to = 4 * p * width
    for (let from = p * width; from < end; from += 2) {
      const b = from + apart
      const c = b + apart
      const d = c + apart
      const ar = x[from] ?? 0
      const ai = x[from + 1] ?? 0
      const br = x[b] ?? 0
      const bi = x[b + 1] ?? 0
      const cr = x[c] ?? 0
      const ci = x[c + 1] ?? 0
      const dr = x[d] ?? 0
      const di = x[d + 1] ?? 0
      const evenSumR = ar + cr
      const evenSumI = ai + ci
      const evenDifferenceR = ar - cr
      const evenDifferenceI = ai - ci
      const oddSumR = br + dr
      const oddSumI = bi + di
      const oddDifferenceR = br - dr
      const oddDifferenceI = bi - di
      const y1r = evenDifferenceR + oddDifferenceI
      const y1i = evenDifferenceI - oddDifferenceR
      const y2r = evenSumR - oddSumR
      const y2i = evenSumI - oddSumI
      const y3r = evenDifferenceR - oddDifferenceI
      const y3i = evenDifferenceI + oddDifferenceR
      const to1 = to + width
      const to2 = to1 + width
      const to3 = to2 + width
      y[to] = evenSumR + oddSumR
      y[to + 1] = evenSumI + oddSumI
      y[to1] = w1r * y1r - w1i * y1i
      y[to1 + 1] = w1r * y1i + w1i * y1r
      y[to2] = w2r * y2r - w2i * y2i
      y[to2 + 1] = w2r * y2i + w2i * y2r
      y[to3] = w3r * y3r - w3i * y3i
      y[to3 + 1] = w3r * y3i + w3i * y3r
      to += 2
    }
  }
}

/** The first group, whose twiddle factors are all 1. */
function plainFour(x: Float64Array, y: Float64Array, apart: number, width: number): void {
  for (let from = 0; from < width; from += 2) {
    const b = from + apart
    const c = b + apart
    const d = c + apart
    const ar = x[from] ?? 0
    const ai = x[from + 1] ?? 0
    const br = x[b] ?? 0
    const bi = x[b + 1] ?? 0
    const cr = x[c] ?? 0
    const ci = x[c + 1] ?? 0
    const dr = x[d] ?? 0
    const di = x[d + 1] ?? 0
    const evenSumR = ar + cr
    const evenSumI = ai + ci
    const evenDifferenceR = ar - cr
    const evenDifferenceI = ai - ci
    const oddSumR = br + dr
    const oddSumI = bi + di
    const oddDifferenceR = br - dr
    const oddDifferenceI = bi - di
    const to1 = from + width
    const to2 = to1 + width
    const to3 = to2 + width
    y[from] = evenSumR + oddSumR
    y[from + 1] = evenSumI + oddSumI
    y[to1] = evenDifferenceR + oddDifferenceI
    y[to1 + 1] = evenDifferenceI - oddDifferenceR
    y[to2] = evenSumR - oddSumR
    y[to2 + 1] = evenSumI - oddSumI
    y[to3] = evenDifferenceR - oddDifferenceI
    y[to3 + 1] = evenDifferenceI + oddDifferenceR
  }
}
