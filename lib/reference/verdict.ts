/** How one output of a case compares. An output that only lends itself to comparison is shown and not judged. */
export type Verdict = {
  readonly output: string
  readonly expected: unknown
  readonly got: unknown
  /** Relative difference of two numbers; null where there is none to give. */
  readonly difference: number | null
  readonly outcome: 'pass' | 'miss' | 'not judged'
}

/** How far a number may be off. */
export type Allowance = { readonly relative?: number | undefined; readonly absolute?: number | undefined }

export const isWithin = (got: number, expected: number, { relative, absolute }: Allowance): boolean =>
  Math.abs(got - expected) <= Math.max(absolute ?? 0, (relative ?? 0) * Math.abs(expected), 1e-300)

export const relativeDifference = (got: unknown, expected: unknown): number | null => {
  if (typeof got !== 'number' || typeof expected !== 'number') return null
  return expected === 0 ? Math.abs(got) : Math.abs(got - expected) / Math.abs(expected)
}

/** Whether two values are alike: numbers within the allowance, everything else equal, lists and objects part by part. */
export function areAlike(got: unknown, expected: unknown, allowance: Allowance): boolean {
  if (typeof expected === 'number') return typeof got === 'number' && isWithin(got, expected, allowance)
  if (Array.isArray(expected)) {
    return (
      Array.isArray(got) &&
      got.length === expected.length &&
      expected.every((item, index) => areAlike(got[index], item, allowance))
    )
  }
  if (typeof expected === 'object' && expected !== null) {
    if (typeof got !== 'object' || got === null) return false
    const parts = new Map(Object.entries(got))
    return Object.entries(expected).every(([key, item]) => areAlike(parts.get(key), item, allowance))
  }
  return got === expected
}
