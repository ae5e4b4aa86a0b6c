import { findObject, type PdfFile } from '../pdf/pdf-file'
import { typeOf } from '../pdf/page-list'
import type { PdfDictionary, PdfValue } from '../pdf/pdf-value'
import type { FormField } from '../pdf/signature-fields'
import { LARGEST_BLOCK, type Rectangle } from '../signing/signature-request'
import type { SignatureEntry } from './signature-entry'
import { check, type ExpectedSignature, type SignatureCheck } from './verdict'

const WIDGET_KEYS = ['Type', 'Subtype', 'FT', 'T', 'F', 'Rect', 'P', 'V', 'AP']
const SIGNATURE_KEYS = ['Type', 'Filter', 'SubFilter', 'ByteRange', 'Contents', 'M', 'Name', 'Reason']
/** Points; the file format writes decimals. */
const PLACE_TOLERANCE = 0.01

/** The field is a plain visible signature field in its place, without actions, scripts or further entries. */
export function checkField(
  file: PdfFile,
  entry: SignatureEntry,
  pages: readonly number[],
  others: readonly FormField[],
  expected: ExpectedSignature | undefined,
): SignatureCheck {
  const { dictionary, signature, name } = entry.field
  const isPlain =
    hasOnly(dictionary, WIDGET_KEYS) &&
    hasOnly(signature.dictionary, SIGNATURE_KEYS) &&
    isName(dictionary.entries.get('Subtype'), 'Widget') &&
    isName(signature.dictionary.entries.get('SubFilter'), 'ETSI.CAdES.detached') &&
    hasPlainAppearance(file, dictionary)
  const overlaps = others.some((other) => other.name !== name && isOverlapping(dictionary, other.dictionary))
  return check(
    'field',
    isPlain && !overlaps && isInPlace(dictionary, pages, expected),
    'The signature field is plain and stands in its place.',
    'The signature field holds entries that a signature of the practice never has, or its block stands in another place.',
  )
}

/** The page that a field's block says it is on, counted from 0. */
export function pageOf(dictionary: PdfDictionary, pages: readonly number[]): number | null {
  const page = dictionary.entries.get('P')
  const index = page?.kind === 'reference' ? pages.indexOf(page.object) : -1
  return index < 0 ? null : index
}

const hasOnly = (dictionary: PdfDictionary, keys: readonly string[]): boolean =>
  [...dictionary.entries.keys()].every((key) => keys.includes(key))

const isName = (value: PdfValue | undefined, name: string): boolean =>
  value?.kind === 'name' && value.value === name

function hasPlainAppearance(file: PdfFile, dictionary: PdfDictionary): boolean {
  const appearance = dictionary.entries.get('AP')
  if (appearance?.kind !== 'dictionary' || !hasOnly(appearance, ['N'])) return false
  const normal = appearance.entries.get('N')
  const form = normal?.kind === 'reference' ? findObject(file, normal.object) : null
  return form?.stream != null && form.value.kind === 'dictionary' && typeOf(form.value) === 'XObject'
}

function isInPlace(
  dictionary: PdfDictionary,
  pages: readonly number[],
  expected: ExpectedSignature | undefined,
): boolean {
  const rectangle = rectangleOf(dictionary)
  const page = pageOf(dictionary, pages)
  if (!rectangle || page === null) return false
  if (!expected?.block)
    return rectangle.width <= LARGEST_BLOCK.width && rectangle.height <= LARGEST_BLOCK.height
  const wanted = expected.block.rectangle
  return (
    page === expected.block.page &&
    (['x', 'y', 'width', 'height'] as const).every(
      (side) => Math.abs(rectangle[side] - wanted[side]) < PLACE_TOLERANCE,
    )
  )
}

function isOverlapping(a: PdfDictionary, b: PdfDictionary): boolean {
  const [left, right] = [rectangleOf(a), rectangleOf(b)]
  const [leftPage, rightPage] = [a.entries.get('P'), b.entries.get('P')]
  if (!left || !right || leftPage?.kind !== 'reference' || rightPage?.kind !== 'reference') return false
  return (
    leftPage.object === rightPage.object &&
    left.x < right.x + right.width &&
    right.x < left.x + left.width &&
    left.y < right.y + right.height &&
    right.y < left.y + left.height
  )
}

function rectangleOf(dictionary: PdfDictionary): Rectangle | null {
  const value = dictionary.entries.get('Rect')
  if (value?.kind !== 'array' || value.items.length !== 4) return null
  const [x, y, right, top] = value.items.map((item) => (item.kind === 'number' ? item.value : NaN))
  if (x === undefined || y === undefined || right === undefined || top === undefined) return null
  return right > x && top > y ? { x, y, width: right - x, height: top - y } : null
}
