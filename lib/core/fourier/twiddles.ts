/**
 * The point exp(−j 2π k/n) of the unit circle as `[cosine, −sine]`, rounded correctly to about the last digit: the
 * angle is first brought into one eighth of a turn, where sine and cosine lose nothing. Whole k from 0, n > 0.
 */
export function rootOfUnity(k: number, n: number): readonly [number, number] {
  const eighths = 8 * (k % n)
  const octant = Math.floor(eighths / n)
  const isBackwards = octant % 2 === 1
  const rest = isBackwards ? (octant + 1) * n - eighths : eighths - octant * n
  const angle = (rest / n) * (Math.PI / 4)
  const along = Math.cos(angle)
  const across = Math.sin(angle)
  const swaps = octant % 4 === 1 || octant % 4 === 2
  const x = swaps ? across : along
  const y = swaps ? along : across
  return [octant >= 2 && octant < 6 ? -x : x, octant < 4 ? -y : y]
}

/** exp(−j 2π k·step/n) for k = 0 … count − 1, interleaved real and imaginary. */
export function rootsOfUnity(count: number, n: number, step = 1): Float64Array {
  const roots = new Float64Array(2 * count)
  for (let k = 0; k < count; k += 1) roots.set(rootOfUnity(k * step, n), 2 * k)
  return roots
}
