/** Where a value stands in the file: from its first byte up to, not including, the byte after its last. */
export type Span = { readonly start: number; readonly end: number }

export type PdfDictionary = Span & {
  readonly kind: 'dictionary'
  readonly entries: ReadonlyMap<string, PdfValue>
}

export type PdfArray = Span & { readonly kind: 'array'; readonly items: readonly PdfValue[] }

export type PdfString = Span & {
  readonly kind: 'string'
  readonly notation: 'literal' | 'hex'
  readonly bytes: Uint8Array
}

/** A value of the file format (ISO 32000-1, 7.3), with its place. Indirect references keep only the object number. */
export type PdfValue =
  | PdfDictionary
  | PdfArray
  | PdfString
  | (Span & { readonly kind: 'null' })
  | (Span & { readonly kind: 'boolean'; readonly value: boolean })
  | (Span & { readonly kind: 'number'; readonly value: number; readonly text: string })
  | (Span & { readonly kind: 'name'; readonly value: string })
  | (Span & { readonly kind: 'reference'; readonly object: number })

/** An indirect object: its number, its value, and for a stream the place of its raw data. */
export type PdfObject = Span & {
  readonly number: number
  readonly value: PdfValue
  readonly stream: Span | null
}

/** Whether two values say the same, wherever they stand. */
export function isSameValue(a: PdfValue, b: PdfValue): boolean {
  switch (a.kind) {
    case 'null':
      return b.kind === 'null'
    case 'boolean':
      return b.kind === 'boolean' && a.value === b.value
    case 'number':
      return b.kind === 'number' && a.value === b.value
    case 'name':
      return b.kind === 'name' && a.value === b.value
    case 'reference':
      return b.kind === 'reference' && a.object === b.object
    case 'string':
      return b.kind === 'string' && Buffer.compare(a.bytes, b.bytes) === 0
    case 'array':
      return b.kind === 'array' && isSameList(a.items, b.items)
    case 'dictionary':
      return b.kind === 'dictionary' && isSameDictionary(a, b, [])
  }
}

export const isSameList = (a: readonly PdfValue[], b: readonly PdfValue[]): boolean =>
  a.length === b.length &&
  a.every((item, index) => {
    const other = b[index]
    return other !== undefined && isSameValue(item, other)
  })

/** Whether two dictionaries agree in every key except those named. */
export function isSameDictionary(a: PdfDictionary, b: PdfDictionary, except: readonly string[]): boolean {
  const keys = new Set([...a.entries.keys(), ...b.entries.keys()])
  return [...keys]
    .filter((key) => !except.includes(key))
    .every((key) => {
      const left = a.entries.get(key)
      const right = b.entries.get(key)
      return left !== undefined && right !== undefined && isSameValue(left, right)
    })
}

/** Every object number that a value refers to, at any depth. */
export function referencedObjects(value: PdfValue): number[] {
  switch (value.kind) {
    case 'reference':
      return [value.object]
    case 'array':
      return value.items.flatMap(referencedObjects)
    case 'dictionary':
      return [...value.entries.values()].flatMap(referencedObjects)
    case 'null':
    case 'boolean':
    case 'number':
    case 'name':
    case 'string':
      return []
  }
}
