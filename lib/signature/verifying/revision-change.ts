import { catalogOf, findObject, type PdfFile, type PdfRevision, resolveArray } from '../pdf/pdf-file'
import { isWhiteSpace } from '../pdf/pdf-scanner'
import {
  isSameDictionary,
  isSameList,
  isSameValue,
  type PdfObject,
  referencedObjects,
} from '../pdf/pdf-value'
import type { SignedField } from './signature-entry'

/**
 * What revision `at` did besides adding the signature field `added`; null where it did nothing else.
 *
 * The field may be listed in the form and on its page; the new objects must hang from the field alone; every other
 * object stays as it was, no earlier object may have waited for a new one, and no byte stands outside the objects.
 */
export function changeBesides(file: PdfFile, at: number, added: SignedField): string | null {
  const revision = file.revisions[at]
  const before = file.revisions[at - 1]
  if (!revision || !before) return 'there is no earlier state to compare with'
  if (!isSameDictionary(revision.trailer, before.trailer, ['Size', 'Prev'])) return 'the trailer was changed'
  if ([...revision.freed].some((number) => number !== 0)) return 'objects were removed'
  if (hasStrayBytes(file, before.end, revision)) return 'bytes were added outside the objects'

  const page = added.dictionary.entries.get('P')
  const pageNumber = page?.kind === 'reference' ? page.object : null
  if (pageNumber === null || !revision.objects.has(pageNumber)) return 'the signature is not on its page'

  const fresh = [...revision.objects.values()].filter(({ number }) => !findObject(file, number, at - 1))
  for (const object of revision.objects.values()) {
    const old = findObject(file, object.number, at - 1)
    if (!old || isSameObject(file, old, object)) continue
    if (object.number === formNumber(file, at) && isListedMore(file, at, old, object, 'Fields', added))
      continue
    if (object.number === pageNumber && isListedMore(file, at, old, object, 'Annots', added)) continue
    return `object ${object.number} was changed`
  }
  const own = reachableFrom(added.field.number, fresh)
  const stranger = fresh.find(({ number }) => !own.has(number))
  if (stranger) return `object ${stranger.number} was added, which is no part of the signature`
  return isAwaited(file, at, own) ? 'content that an earlier state had left open was filled in' : null
}

function formNumber(file: PdfFile, at: number): number | null {
  const form = catalogOf(file, at)?.entries.get('AcroForm')
  return form?.kind === 'reference' ? form.object : null
}

const dataOf = (file: PdfFile, { stream }: PdfObject): Uint8Array | null =>
  stream && file.bytes.subarray(stream.start, stream.end)

function isSameObject(file: PdfFile, a: PdfObject, b: PdfObject): boolean {
  const [left, right] = [dataOf(file, a), dataOf(file, b)]
  const isSameData = left && right ? Buffer.compare(left, right) === 0 : left === right
  return isSameData && isSameValue(a.value, b.value)
}

/** Whether the list under `key` got exactly the new field at its end, and all else in the dictionary stayed. */
function isListedMore(
  file: PdfFile,
  at: number,
  old: PdfObject,
  object: PdfObject,
  key: 'Fields' | 'Annots',
  added: SignedField,
): boolean {
  if (old.value.kind !== 'dictionary' || object.value.kind !== 'dictionary') return false
  if (old.stream || object.stream || !isSameDictionary(old.value, object.value, [key])) return false
  const earlier = resolveArray(file, old.value.entries.get(key), at - 1)?.items ?? []
  const later = resolveArray(file, object.value.entries.get(key), at)?.items ?? []
  const last = later.at(-1)
  return (
    last?.kind === 'reference' &&
    last.object === added.field.number &&
    isSameList(earlier, later.slice(0, -1))
  )
}

function reachableFrom(start: number, fresh: readonly PdfObject[]): Set<number> {
  const objects = new Map(fresh.map((object) => [object.number, object]))
  const reached = new Set<number>()
  const waiting = [start]
  while (waiting.length > 0) {
    const object = objects.get(waiting.pop() ?? start)
    if (!object || reached.has(object.number)) continue
    reached.add(object.number)
    for (const number of referencedObjects(object.value)) waiting.push(number)
  }
  return reached
}

/** Whether an object of an earlier save refers to one of these numbers, which did not exist then. */
const isAwaited = (file: PdfFile, at: number, numbers: ReadonlySet<number>): boolean =>
  file.revisions
    .slice(0, at)
    .some((revision) =>
      [...revision.objects.values()].some(({ value }) =>
        referencedObjects(value).some((n) => numbers.has(n)),
      ),
    )

function hasStrayBytes(file: PdfFile, from: number, revision: PdfRevision): boolean {
  let position = from
  const spans = [...revision.objects.values()].sort((a, b) => a.start - b.start)
  for (const { start, end } of [...spans, { start: revision.offset, end: revision.end }]) {
    if (!file.bytes.subarray(position, start).every(isWhiteSpace)) return true
    position = end
  }
  return false
}
