const sine60 = Math.sqrt(3) / 2

/** One pass of radix 3 over `s` transforms at a time; see `passFour`. `twiddles` holds w, w² for each p, from `at`. */
export function passThree(
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
    const w = at + 4 * p
    const w1r = twiddles[w] ?? 0
    const w1i = twiddles[w + 1] ?? 0
    const w2r = twiddles[w + 2] ?? 0
    const w2i = twiddles[w + 3] ?? 0
    const end = (p + 1) * width
    let to = 3 * p * width
    for (let from = p * width; from < end; from += 2) {
      const b = from + apart
      const c = b + apart
      const ar = x[from] ?? 0
      const ai = x[from + 1] ?? 0
      const sumR = (x[b] ?? 0) + (x[c] ?? 0)
      const sumI = (x[b + 1] ?? 0) + (x[c + 1] ?? 0)
      const turnedR = sine60 * ((x[b] ?? 0) - (x[c] ?? 0))
      const turnedI = sine60 * ((x[b + 1] ?? 0) - (x[c + 1] ?? 0))
      const middleR = ar - 0.5 * sumR
      const middleI = ai - 0.5 * sumI
      const y1r = middleR + turnedI
      const y1i = middleI - turnedR
      const y2r = middleR - turnedI
      const y2i = middleI + turnedR
      const to1 = to + width
      const to2 = to1 + width
      y[to] = ar + sumR
      y[to + 1] = ai + sumI
      y[to1] = w1r * y1r - w1i * y1i
      y[to1 + 1] = w1r * y1i + w1i * y1r
      y[to2] = w2r * y2r - w2i * y2i
      y[to2 + 1] = w2r * y2i + w2i * y2r
      to += 2
    }
  }
}
