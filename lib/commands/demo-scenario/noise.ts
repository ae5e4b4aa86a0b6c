/** Normal deviates from a fixed seed: a 32-bit mixing generator (splitmix32 form) and the Box-Muller transform. */
export function seededNoise(seed: number): () => number {
  let state = seed >>> 0
  const uniform = () => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = state
    mixed = Math.imul(mixed ^ (mixed >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32
  }
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
}
