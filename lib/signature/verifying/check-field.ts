import { type FieldPlace, fieldPlace, isOverlapping } from '../pdf/field-place'
import { findObject, type PdfFile } from '../pdf/pdf-file'
import { typeOf } from '../pdf/page-list'
import type { PdfDictionary, PdfValue } from '../pdf/pdf-value'
import type { FormField } from '../pdf/signature-fields'
import { LARGEST_BLOCK } from '../signing/signature-request'
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
  const place = fieldPlace(dictionary)
  const overlaps = others.some((other) => other.name !== name && isCovering(place, other))
  return check(
    'field',
    isPlain && !overlaps && isInPlace(place, pages, expected),
    'The signature field is plain and stands in its place.',
    'The signature field holds entries that a signature of the practice never has, or its block stands in another place.',
  )
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
  place: FieldPlace | null,
  pages: readonly number[],
  expected: ExpectedSignature | undefined,
): boolean {
  if (!place || !pages.includes(place.page)) return false
  const { page, rectangle } = place
  if (!expected?.block)
    return rectangle.width <= LARGEST_BLOCK.width && rectangle.height <= LARGEST_BLOCK.height
  const wanted = expected.block.rectangle
  return (
    pages.indexOf(page) === expected.block.page &&
    (['x', 'y', 'width', 'height'] as const).every(
      (side) => Math.abs(rectangle[side] - wanted[side]) < PLACE_TOLERANCE,
    )
  )
}

function isCovering(place: FieldPlace | null, other: FormField): boolean {
  const otherPlace = fieldPlace(other.dictionary)
  return place !== null && otherPlace !== null && isOverlapping(place, otherPlace)
}
