/** A trace seen from its edge: 0 at the base, 1 at the top, whichever way the edge goes. */
export type Progress = (index: number) => number

/** Samples within this part of the step around a reference level make the line that finds its crossing. */
const reach = 0.025

/** With fewer samples than this near the level, the line between the two neighbours is used. */
const enoughForLine = 4

/**
 * The instant, in samples, at which the edge passes a reference level below or above the middle: of the crossings the
 * one next to `crossing`. Near a slow crossing the noise makes several; there a least-squares line through the samples
 * around the level stands for all. Reference levels as in IEEE Std 181-2011 (10, 50 and 90 %).
 */
export function instantOf(progress: Progress, crossing: number, level: number, count: number): number {
  const after =
    level < 0.5 ? lastBelow(progress, crossing, level) + 1 : firstAbove(progress, crossing, level, count)
  let first = after - 1
  let last = after
  while (first > 0 && progress(first) > level - reach) first -= 1
  while (last < count - 1 && progress(last) < level + reach) last += 1
  if (last - first + 1 >= enoughForLine + 2) return lineCrossing(progress, first, last, level)
  const below = progress(after - 1)
  const above = progress(after)
  return above === below ? after : after - 1 + (level - below) / (above - below)
}

function lastBelow(progress: Progress, crossing: number, level: number): number {
  let index = crossing
  while (index > 0 && progress(index) > level) index -= 1
  return index
}

function firstAbove(progress: Progress, crossing: number, level: number, count: number): number {
  let index = crossing
  while (index < count - 1 && progress(index) < level) index += 1
  return index
}

function lineCrossing(progress: Progress, first: number, last: number, level: number): number {
  const count = last - first + 1
  const middle = (first + last) / 2
  let sum = 0
  let moment = 0
  let spread = 0
  for (let index = first; index <= last; index += 1) {
    const value = progress(index)
    sum += value
    moment += value * (index - middle)
    spread += (index - middle) ** 2
  }
  const slope = moment / spread
  return middle + (level - sum / count) / slope
}
