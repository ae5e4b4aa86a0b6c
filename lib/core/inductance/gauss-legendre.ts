/** Nodes within −1…1 and weights of a Gauss–Legendre rule. */
export type GaussRule = { readonly nodes: readonly number[]; readonly weights: readonly number[] }

const rules = new Map<number, GaussRule>()

/** The rule with n nodes, exact for polynomials up to degree 2n − 1. Source: NIST DLMF 3.5(v). */
export function gaussRule(count: number): GaussRule {
  const known = rules.get(count)
  if (known) return known
  const found = Array.from({ length: count }, (_, index) => nodeOf(count, index))
  const rule = { nodes: found.map(([node]) => node), weights: found.map(([, weight]) => weight) }
  rules.set(count, rule)
  return rule
}

/** ∫ f over start…end by a rule: for functions that are smooth well beyond the ends. */
export function gaussLegendre(
  { nodes, weights }: GaussRule,
  start: number,
  end: number,
  f: (x: number) => number,
): number {
  const [middle, half] = [(start + end) / 2, (end - start) / 2]
  let sum = 0
  for (const [index, node] of nodes.entries()) sum += (weights[index] ?? 0) * f(middle + half * node)
  return half * sum
}

function nodeOf(count: number, index: number): readonly [node: number, weight: number] {
  let node = -Math.cos((Math.PI * (index + 0.75)) / (count + 0.5))
  let slope = 1
  for (let round = 0; round < 8; round += 1) {
    const { value, previous } = legendre(count, node)
    slope = (count * (node * value - previous)) / (node * node - 1)
    node -= value / slope
  }
  return [node, 2 / ((1 - node * node) * slope * slope)]
}

/** P(n) and P(n − 1) at a point. */
function legendre(degree: number, x: number): { readonly value: number; readonly previous: number } {
  let [previous, value] = [1, x]
  for (let n = 2; n <= degree; n += 1) {
    const next = ((2 * n - 1) * x * value - (n - 1) * previous) / n
    previous = value
    value = next
  }
  return { value, previous }
}
