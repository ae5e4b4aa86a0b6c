/** A stretch of a record, in seconds; `from` is before `to`. */
export type TimeWindow = { readonly from: number; readonly to: number }

/** Zooming stops at a millionth of the record: below that the axis has no digits left to tell instants apart. */
const narrowest = 1e-6

export const spanOf = (window: TimeWindow): number => window.to - window.from

/** The window, no wider than the whole and no narrower than a millionth of it, moved to lie inside. */
export const withinWhole = (window: TimeWindow, whole: TimeWindow): TimeWindow => {
  const widest = spanOf(whole)
  const span = Math.min(widest, Math.max(spanOf(window), widest * narrowest))
  const centre = (window.from + window.to) / 2
  const from = Math.min(whole.to - span, Math.max(whole.from, centre - span / 2))
  return span === widest ? whole : { from, to: from + span }
}

/** Narrower for a factor below 1, wider above, about the middle of the window. */
export const zoomed = (window: TimeWindow, factor: number, whole: TimeWindow): TimeWindow => {
  const half = (spanOf(window) * factor) / 2
  const centre = (window.from + window.to) / 2
  return withinWhole({ from: centre - half, to: centre + half }, whole)
}

/** Moved by a share of its own span; positive is later. */
export const panned = (window: TimeWindow, share: number, whole: TimeWindow): TimeWindow => {
  const shift = spanOf(window) * share
  return withinWhole({ from: window.from + shift, to: window.to + shift }, whole)
}

/** The index whose value is nearest; `values` rise. −1 for an empty record. */
export const nearestIndex = (values: readonly number[], target: number): number => {
  let low = 0
  let high = values.length - 1
  if (high < 0) return -1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((values[middle] ?? Infinity) <= target) low = middle
    else high = middle
  }
  const before = Math.abs((values[low] ?? Infinity) - target)
  const after = Math.abs((values[high] ?? Infinity) - target)
  return after < before ? high : low
}
