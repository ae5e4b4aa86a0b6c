/** At most `most` of some things, evenly spread over all of them, first and last included. */
export function spreadChoice<Item>(items: readonly Item[], most: number): readonly Item[] {
  if (items.length <= most) return items
  const step = (items.length - 1) / (most - 1)
  return Array.from({ length: most }, (_, index) => items[Math.round(index * step)]).flatMap((item) =>
    item === undefined ? [] : [item],
  )
}
