/** One measured figure of a benchmark, beside what it was compared with and what is asked of it. */
export type BenchLine = {
  readonly name: string
  readonly value: number
  readonly unit: string
  /** The figure of something known, measured in the same run; null where the goal is an absolute one. */
  readonly reference: number | null
  /** The most that the value may be, in its unit or as a multiple of the reference; null for a figure to know. */
  readonly goal: number | null
  readonly goalText: string
}

/** The value as a multiple of its reference. */
export const ratioOf = ({ value, reference }: BenchLine): number | null =>
  reference === null ? null : value / reference

export const isMet = (line: BenchLine): boolean =>
  line.goal === null || (ratioOf(line) ?? line.value) <= line.goal
