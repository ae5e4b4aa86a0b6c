import { catalogOf, findObject, type PdfFile, resolve, resolveArray, resolveDictionary } from './pdf-file'
import { textOf } from './pdf-text'
import type { PdfDictionary, PdfObject } from './pdf-value'

/** A field of the document's form; `signature` is null where it is not a signature field that has been signed. */
export type FormField = {
  readonly name: string
  readonly field: PdfObject
  readonly dictionary: PdfDictionary
  readonly signature: { readonly object: PdfObject; readonly dictionary: PdfDictionary } | null
}

/**
 * The fields that the form lists after the newest save, in its order; null where the list is broken. Only this list
 * counts: a signature dictionary that no field points to is no signature.
 */
export function formFields(file: PdfFile): FormField[] | null {
  const reference = catalogOf(file)?.entries.get('AcroForm')
  if (reference === undefined) return []
  const list = resolveArray(file, resolveDictionary(file, reference)?.entries.get('Fields'))
  if (!list) return null
  const fields: FormField[] = []
  for (const item of list.items) {
    const field = item.kind === 'reference' ? findObject(file, item.object) : null
    if (field?.value.kind !== 'dictionary') return null
    const name = textOf(resolve(file, field.value.entries.get('T')))
    if (name === null) return null
    fields.push({ name, field, dictionary: field.value, signature: signatureOf(file, field.value) })
  }
  return fields
}

function signatureOf(file: PdfFile, field: PdfDictionary): FormField['signature'] {
  const type = field.entries.get('FT')
  const value = field.entries.get('V')
  if (type?.kind !== 'name' || type.value !== 'Sig' || value?.kind !== 'reference') return null
  const object = findObject(file, value.object)
  return object?.value.kind === 'dictionary' ? { object, dictionary: object.value } : null
}
