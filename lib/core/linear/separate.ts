import { add, complex, magnitude, scale, type Complex } from './complex'

/** Roots nearer than this to each other, relative to their size, are moved apart to it. */
const ofTwo = 1e-4
const ofThree = 2e-3

/**
 * Up to three roots of a real polynomial, moved apart where they coincide, so that partial fractions over simple roots
 * hold: about their mean, which rounding leaves accurate. It changes a response by about the square of the distance,
 * 1e-8 for two roots and 4e-6 for three; the distances keep the rounding of a squared response at the same size.
 */
export function separate(roots: readonly Complex[]): readonly Complex[] {
  const [a, b, c] = roots
  if (a === undefined || b === undefined) return roots
  if (c === undefined) return areNear(a, b, ofTwo) ? aroundMean([a, b], ofTwo) : roots
  if (areNear(a, b, ofThree) && areNear(b, c, ofThree) && areNear(a, c, ofThree)) {
    return aroundMean([a, b, c], ofThree)
  }
  if (areNear(a, b, ofTwo)) return [...aroundMean([a, b], ofTwo), c]
  if (areNear(b, c, ofTwo)) return [a, ...aroundMean([b, c], ofTwo)]
  if (areNear(a, c, ofTwo)) return [...aroundMean([a, c], ofTwo), b]
  return roots
}

const areNear = (a: Complex, b: Complex, distance: number): boolean =>
  magnitude(add(a, scale(b, -1))) < distance * magnitude(a)

/** Roots of a real polynomial that coincide are real, but for rounding. */
function aroundMean(cluster: readonly Complex[], distance: number): readonly Complex[] {
  const mean = cluster.reduce((sum, root) => sum + root.re, 0) / cluster.length
  const middle = (cluster.length - 1) / 2
  return cluster.map((_, index) => complex(mean * (1 + (index - middle) * distance)))
}
