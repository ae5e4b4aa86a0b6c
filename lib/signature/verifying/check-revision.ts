import type { PdfFile } from '../pdf/pdf-file'
import { changeBesides } from './revision-change'
import type { SignatureEntry } from './signature-entry'
import { check, type SignatureCheck } from './verdict'

/** The byte range leaves out nothing but the container, ends with its save, and nothing crept in since the last signature. */
export function checkRevision(
  file: PdfFile,
  entry: SignatureEntry,
  previous: SignatureEntry | undefined,
): SignatureCheck[] {
  return [
    check(
      'byte_range',
      entry.range !== null,
      'The signature leaves out nothing of the file but its own place.',
      'The signature does not cover the file around its own place.',
    ),
    check(
      'coverage',
      entry.revision !== null,
      'The signature covers the whole file as it was when it was made.',
      'The signature does not cover the whole file as it was when it was made.',
    ),
    checkChanges(file, entry, previous),
  ]
}

function checkChanges(
  file: PdfFile,
  entry: SignatureEntry,
  previous: SignatureEntry | undefined,
): SignatureCheck {
  if (!previous) {
    return check('changes', true, 'It is the first signature and covers all that came before it.', '')
  }
  const change = changeSince(file, entry, previous)
  const earlier = previous.field.name
  return check(
    'changes',
    change === null,
    `Since the signature "${earlier}" nothing was added but this signature.`,
    `Since the signature "${earlier}" the file was changed beyond adding this signature: ${change}.`,
  )
}

function changeSince(file: PdfFile, entry: SignatureEntry, previous: SignatureEntry): string | null {
  if (entry.revision === null || previous.revision === null) return 'the states cannot be told apart'
  if (entry.revision !== previous.revision + 1) return 'it was saved in between without a signature'
  return changeBesides(file, entry.revision, entry.field)
}
