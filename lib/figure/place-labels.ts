import { contains, crossedWidth, extentBetween, overlaps } from './label-space'
import type { PlacedLabel, Rect } from './layout'
import type { Point } from './polyline'
import { textWidth } from './text-width'

export type Runs = readonly (readonly Point[])[]

/** What is already on the plot while labels are being placed; `taken` grows with each. */
export type LabelSpace = {
  readonly plot: Rect
  readonly textSize: number
  readonly lines: readonly Runs[]
  readonly taken: Rect[]
}

type Candidate = { readonly box: Rect; readonly penalty: number }

const gap = (space: LabelSpace) => space.textSize * 0.3

/** A label box of the right size with its lower left corner at (x, bottom). */
const boxFor = (space: LabelSpace, text: string, x: number, bottom: number): Rect => {
  const height = space.textSize * 1.15
  return { x, y: bottom - height, width: textWidth(text, space.textSize, 'sans') + gap(space), height }
}

const labelIn = (space: LabelSpace, text: string, box: Rect): PlacedLabel => ({
  text,
  x: box.x + gap(space) / 2,
  y: box.y + box.height - space.textSize * 0.27,
  anchor: 'start',
  rotation: 0,
  box,
})

/** Takes the candidate that hides least; one that would cover another label, or leave the plot, is never taken. */
const takeBest = (space: LabelSpace, text: string, candidates: readonly Candidate[]): PlacedLabel | null => {
  let best: Candidate | null = null
  let bestCost = Infinity
  for (const candidate of candidates) {
    if (!contains(space.plot, candidate.box)) continue
    if (space.taken.some((other) => overlaps(other, candidate.box))) continue
    const crossed = space.lines.reduce((sum, runs) => sum + crossedWidth(runs, candidate.box), 0)
    const cost = candidate.penalty + (crossed > 0 ? 2 + (8 * crossed) / candidate.box.width : 0)
    if (cost < bestCost - 1e-9) {
      best = candidate
      bestCost = cost
    }
  }
  // Past this cost the text would cover too much of the lines: better below the plot.
  if (!best || bestCost > 4) return null
  space.taken.push(best.box)
  return labelIn(space, text, best.box)
}

/** Beside a point, the corners before the sides. */
export const labelPoint = (space: LabelSpace, text: string, [x, y]: Point): PlacedLabel | null => {
  const size = boxFor(space, text, 0, 0)
  const away = space.textSize * 0.55
  const columns = [x + away, x - away - size.width, x - size.width / 2]
  const rows = [y - away * 0.6, y + away * 0.6 + size.height, y + size.height / 2]
  const candidates = columns.flatMap((left, column) =>
    rows
      .filter((_, row) => !(column === 2 && row === 2))
      .map((bottom, row) => ({ box: boxFor(space, text, left, bottom), penalty: 0.2 * (column + row) })),
  )
  return takeBest(space, text, candidates)
}

/** On a level line, above it or below, at the right end, the left end or between. */
export const labelLevel = (space: LabelSpace, text: string, y: number): PlacedLabel | null => {
  const { plot } = space
  const size = boxFor(space, text, 0, 0)
  const room = plot.width - size.width - 2 * gap(space)
  const shares = [1, 0, 0.75, 0.5, 0.25]
  const candidates = shares.flatMap((share, order) => {
    const left = plot.x + gap(space) + room * share
    return [y - 1.5, y + 1.5 + size.height].map((bottom, side) => ({
      box: boxFor(space, text, left, bottom),
      penalty: 0.3 * order + 0.5 * side,
    }))
  })
  return takeBest(space, text, candidates)
}

/** Beside an instant's line, from the top of the plot downwards. */
export const labelInstant = (space: LabelSpace, text: string, x: number): PlacedLabel | null => {
  const { plot } = space
  const size = boxFor(space, text, 0, 0)
  const candidates = Array.from({ length: 12 }, (_, row) => {
    const bottom = plot.y + size.height * (row + 1) + gap(space)
    return [x + gap(space), x - gap(space) - size.width].map((left, side) => ({
      box: boxFor(space, text, left, bottom),
      penalty: 0.15 * row + 0.1 * side,
    }))
  }).flat()
  return takeBest(space, text, candidates)
}

const positions = 24

/** From 0, where every other line keeps well away from this stretch, to 1 where one runs along or across it. */
const confusion = (space: LabelSpace, own: Runs, stretch: Rect): number => {
  const clearance = space.textSize * 2.5
  const closeness = space.lines.map((other) => {
    if (other === own) return 0
    const extent = extentBetween(other, stretch.x, stretch.x + stretch.width, space.plot)
    if (!extent) return 0
    const distance = Math.max(extent[0] - stretch.y - stretch.height, stretch.y - extent[1], 0)
    return Math.max(0, 1 - distance / clearance)
  })
  return Math.max(0, ...closeness)
}

/**
 * On its own line: just above, or just below, all of the line that the text spans. Better nearer the right end, and
 * where no other line runs close by that the name could be taken for.
 */
export const labelLine = (space: LabelSpace, text: string, runs: Runs): PlacedLabel | null => {
  const { plot } = space
  const size = boxFor(space, text, 0, 0)
  const room = plot.width - size.width - 2 * gap(space)
  if (room < 0) return null
  const candidates = Array.from({ length: positions + 1 }, (_, index) => {
    const left = plot.x + gap(space) + room * (1 - index / positions)
    const extent = extentBetween(runs, left, left + size.width, plot)
    if (!extent) return []
    // A label that must clear a tall swing stands far from most of its line: it costs.
    const height = (extent[1] - extent[0]) / size.height
    const stretch = { x: left, y: extent[0], width: size.width, height: extent[1] - extent[0] }
    const penalty = (1.2 * index) / positions + 0.25 * height + 2 * confusion(space, runs, stretch)
    return [
      { box: boxFor(space, text, left, extent[0] - gap(space)), penalty },
      { box: boxFor(space, text, left, extent[1] + gap(space) + size.height), penalty: penalty + 0.15 },
    ]
  }).flat()
  return takeBest(space, text, candidates)
}
