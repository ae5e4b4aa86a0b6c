import type { EvidenceKind } from '@/db/tables/evidence'

/** How the bytes of a file are checked against its name. */
export type ContentCheck = 'pdf' | 'png' | 'jpeg' | 'zip' | 'svg' | 'touchstone' | 'text' | 'signature'

export type FileKind = {
  readonly kind: EvidenceKind
  readonly mediaType: string
  readonly check: ContentCheck
  /** What the signature library must recognise, where the format has a signature. */
  readonly signature: readonly string[]
}

const text = (mediaType: string, kind: EvidenceKind, check: ContentCheck = 'text'): FileKind => ({
  kind,
  mediaType,
  check,
  signature: [],
})

const touchstone = text('text/plain', 'attachment', 'touchstone')
const plain = text('text/plain', 'attachment')
const captureText = text('text/csv', 'capture')
const jpeg: FileKind = { kind: 'picture', mediaType: 'image/jpeg', check: 'jpeg', signature: ['jpg'] }

/** Every ending that is taken in; the Content-Type that a browser sends plays no part. */
export const fileKinds: ReadonlyMap<string, FileKind> = new Map([
  ['csv', captureText],
  ['tsv', captureText],
  ['txt', captureText],
  ['dat', captureText],
  ['pdf', { kind: 'document', mediaType: 'application/pdf', check: 'pdf', signature: ['pdf'] }],
  ['svg', text('image/svg+xml', 'document', 'svg')],
  ['png', { kind: 'picture', mediaType: 'image/png', check: 'png', signature: ['png', 'apng'] }],
  ['jpg', jpeg],
  ['jpeg', jpeg],
  ['webp', { kind: 'picture', mediaType: 'image/webp', check: 'signature', signature: ['webp'] }],
  ['heic', { kind: 'picture', mediaType: 'image/heic', check: 'signature', signature: ['heic'] }],
  ['zip', { kind: 'attachment', mediaType: 'application/zip', check: 'zip', signature: ['zip'] }],
  ['s1p', touchstone],
  ['s2p', touchstone],
  ['gbr', plain],
  ['drl', plain],
  ['cir', plain],
  ['net', plain],
  ['md', plain],
])

export const acceptedKindsInWords =
  'captures as delimited text (.csv .tsv .txt .dat), .pdf, .svg, pictures (.png .jpg .webp .heic), Touchstone (.s1p .s2p), text (.gbr .drl .cir .net .md), .zip'
