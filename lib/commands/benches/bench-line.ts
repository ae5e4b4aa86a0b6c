/** One measured figure of a benchmark, beside what it was compared with and what is asked of it. */
export type BenchLine = {
  readonly name: string
  readonly value: number
  readonly unit: string
  /** The figure of something known, measured in the same run; null where the goal is an absolute one. */
  readonly reference: number | null
  readonly ratio: number | null
  readonly goal: number
  readonly goalText: string
  readonly isMet: boolean
}
