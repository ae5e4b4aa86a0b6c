import { catalogOf, findObject, type PdfFile } from './pdf-file'
import type { PdfDictionary, PdfValue } from './pdf-value'

/** The object numbers of the pages in reading order; null where the page tree is broken. */
export function pageObjects(file: PdfFile): number[] | null {
  const pages: number[] = []
  const seen = new Set<number>()
  const waiting: (PdfValue | undefined)[] = [catalogOf(file)?.entries.get('Pages')]
  while (waiting.length > 0) {
    const reference = waiting.pop()
    if (reference?.kind !== 'reference' || seen.has(reference.object)) return null
    seen.add(reference.object)
    const node = findObject(file, reference.object)?.value
    if (node?.kind !== 'dictionary') return null
    if (typeOf(node) === 'Page') pages.push(reference.object)
    else {
      const kids = node.entries.get('Kids')
      if (typeOf(node) !== 'Pages' || kids?.kind !== 'array') return null
      waiting.push(...kids.items.toReversed())
    }
  }
  return pages
}

export function typeOf(dictionary: PdfDictionary): string | null {
  const type = dictionary.entries.get('Type')
  return type?.kind === 'name' ? type.value : null
}
