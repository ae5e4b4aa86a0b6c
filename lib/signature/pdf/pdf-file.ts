import type { CrossReferenceSection } from './pdf-section-reader'
import type { PdfArray, PdfDictionary, PdfObject, PdfValue } from './pdf-value'

/** One save of the file: its cross-reference section with the objects read. */
export type PdfRevision = CrossReferenceSection & { readonly objects: ReadonlyMap<number, PdfObject> }

/** A file read strictly; the revisions stand oldest first. */
export type PdfFile = { readonly bytes: Uint8Array; readonly revisions: readonly PdfRevision[] }

/** The object as it was after revision `at` (the newest by default), or null where there is none. */
export function findObject(file: PdfFile, number: number, at = file.revisions.length - 1): PdfObject | null {
  for (let index = at; index >= 0; index--) {
    const revision = file.revisions[index]
    if (revision?.freed.has(number)) return null
    const object = revision?.objects.get(number)
    if (object) return object
  }
  return null
}

/** The value itself, or what it refers to; null where nothing is. */
export function resolve(file: PdfFile, value: PdfValue | undefined, at?: number): PdfValue | null {
  if (value?.kind !== 'reference') return value ?? null
  return findObject(file, value.object, at)?.value ?? null
}

export function resolveDictionary(
  file: PdfFile,
  value: PdfValue | undefined,
  at?: number,
): PdfDictionary | null {
  const resolved = resolve(file, value, at)
  return resolved?.kind === 'dictionary' ? resolved : null
}

export function resolveArray(file: PdfFile, value: PdfValue | undefined, at?: number): PdfArray | null {
  const resolved = resolve(file, value, at)
  return resolved?.kind === 'array' ? resolved : null
}

/** The document catalogue after revision `at`. */
export function catalogOf(file: PdfFile, at = file.revisions.length - 1): PdfDictionary | null {
  return resolveDictionary(file, file.revisions[at]?.trailer.entries.get('Root'), at)
}
