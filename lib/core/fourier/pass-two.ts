/** One pass of radix 2 over `s` transforms at a time; see `passFour`. `twiddles` holds w for each p, from `at`. */
export function passTwo(
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
    const wr = twiddles[at + 2 * p] ?? 0
    const wi = twiddles[at + 2 * p + 1] ?? 0
    const end = (p + 1) * width
    let to = 2 * p * width
    for (let from = p * width; from < end; from += 2) {
      const ar = x[from] ?? 0
      const ai = x[from + 1] ?? 0
      const br = x[from + apart] ?? 0
      const bi = x[from + apart + 1] ?? 0
      const differenceR = ar - br
      const differenceI = ai - bi
      y[to] = ar + br
      y[to + 1] = ai + bi
      y[to + width] = wr * differenceR - wi * differenceI
      y[to + width + 1] = wr * differenceI + wi * differenceR
      to += 2
    }
  }
}
