import { fileTypeFromBuffer } from 'file-type'

import { err, ok, type Result } from '@/lib/core/result'
import type { FileStore } from '@/lib/ports/file-store'

import { hasPdfEnding, hasWholeZipDirectory, jpegSize, looksLikeText, pngSize } from './content-structure'
import { contentDiffers, type EvidenceError } from './evidence.errors'
import type { FileKind } from './file-kinds'

const headBytes = 512 * 1024
const tailBytes = 68 * 1024

type Sample = { readonly head: Uint8Array; readonly tail: Uint8Array; readonly sizeBytes: number }

/** Reads the beginning and the end of a stored file and compares them with what its name promises. */
export async function inspectContent(
  files: FileStore,
  id: string,
  sizeBytes: number,
  extension: string,
  kind: FileKind,
): Promise<Result<true, EvidenceError>> {
  const sample: Sample = {
    head: await files.readPart(id, 0, Math.min(headBytes, sizeBytes)),
    tail: await files.readPart(id, Math.max(0, sizeBytes - tailBytes), Math.min(tailBytes, sizeBytes)),
    sizeBytes,
  }
  const recognised = await fileTypeFromBuffer(sample.head)
  const isAsNamed =
    kind.signature.length > 0
      ? recognised !== undefined && kind.signature.includes(recognised.ext)
      : recognised === undefined || recognised.ext === 'xml'
  if (!isAsNamed) {
    const found = recognised ? `its content is that of a .${recognised.ext} file` : 'its content is not'
    return err(
      contentDiffers(
        `The name ends in .${extension} but ${found}. Send it under its true ending, or export it again.`,
      ),
    )
  }
  const fault = faultIn(sample, kind)
  return fault === null ? ok(true) : err(contentDiffers(fault))
}

/** What is wrong with the structure, as a sentence; null when it holds together. */
function faultIn({ head, tail, sizeBytes }: Sample, kind: FileKind): string | null {
  switch (kind.check) {
    case 'pdf':
      return hasPdfEnding(head, tail, sizeBytes) ? null : brokenOff('PDF')
    case 'png':
      return pngSize(head, tail) ? null : brokenOff('PNG picture')
    case 'jpeg':
      return jpegSize(head) ? null : brokenOff('JPEG picture')
    case 'zip':
      return hasWholeZipDirectory(tail, sizeBytes) ? null : brokenOff('ZIP')
    case 'signature':
      return null
    case 'text':
      return looksLikeText(head) && looksLikeText(tail) ? null : notText
    case 'svg':
      return looksLikeText(head) && holds(head, /<svg[\s>]/i)
        ? null
        : 'The file is not an SVG drawing. Export it again.'
    case 'touchstone':
      return looksLikeText(head) && holds(head, /^\s*#/m)
        ? null
        : 'The file has no option line (a line that begins with #), so it is not a Touchstone file. Export it again.'
  }
}

const brokenOff = (what: string) =>
  `The ${what} is damaged or broken off: its end or its size is missing. Export it again, then send it.`

const notText =
  'The file is not plain text: it holds bytes that no text has. Export it as delimited text, then send it.'

function holds(bytes: Uint8Array, pattern: RegExp): boolean {
  return pattern.test(Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString('latin1'))
}
