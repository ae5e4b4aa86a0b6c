import type { PdfDictionary } from './pdf-value'

/** A rectangle on a page in points (1/72 inch), from the lower left corner of the page. */
export type Rectangle = {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

/** Where a field's block shows: the object number of its page, and its rectangle there. */
export type FieldPlace = { readonly page: number; readonly rectangle: Rectangle }

/** The place that a field's dictionary states; null where it states none or an empty one. */
export function fieldPlace(dictionary: PdfDictionary): FieldPlace | null {
  const page = dictionary.entries.get('P')
  const value = dictionary.entries.get('Rect')
  if (page?.kind !== 'reference' || value?.kind !== 'array' || value.items.length !== 4) return null
  const [x, y, right, top] = value.items.map((item) => (item.kind === 'number' ? item.value : NaN))
  if (x === undefined || y === undefined || right === undefined || top === undefined) return null
  if (!(right > x && top > y)) return null
  return { page: page.object, rectangle: { x, y, width: right - x, height: top - y } }
}

/** Whether two blocks share any part of a page. */
export const isOverlapping = (a: FieldPlace, b: FieldPlace): boolean =>
  a.page === b.page &&
  a.rectangle.x < b.rectangle.x + b.rectangle.width &&
  b.rectangle.x < a.rectangle.x + a.rectangle.width &&
  a.rectangle.y < b.rectangle.y + b.rectangle.height &&
  b.rectangle.y < a.rectangle.y + a.rectangle.height
