import type { SeriesRole } from '@/lib/core/figure/figure'

export type LineStyle = {
  readonly width: number
  /** Lengths of dash and gap in layout units; empty for a solid line. */
  readonly dash: readonly number[]
}

const widths: Record<SeriesRole, number> = { measured: 1.3, computed: 1.6, reference: 1.2, limit: 2 }
const later: readonly (readonly number[])[] = [[], [6, 2.5], [2, 2], [8, 2, 2, 2]]

/**
 * Width and dash of the n-th line of a role (from 0), the same on screen and on paper. Lines of one role share a colour,
 * so the second and later are told apart by their dash; a reference is dashed from the first.
 */
export const lineStyle = (role: SeriesRole, rank: number): LineStyle => ({
  width: widths[role],
  dash: later[(role === 'reference' ? rank + 1 : rank) % later.length] ?? [],
})
