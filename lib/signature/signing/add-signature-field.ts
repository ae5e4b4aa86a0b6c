import {
  PDFArray,
  PDFDict,
  type PDFDocument,
  PDFHexString,
  PDFName,
  PDFNumber,
  type PDFRef,
  PDFString,
} from '@cantoo/pdf-lib'

import { ok, type Result } from '@/lib/core/result'

import { formatPdfDate } from '../pdf/pdf-date'
import type { SignPdfError } from './sign-pdf-error'
import { drawAppearance } from './signature-appearance'
import type { SignatureRequest } from './signature-request'

/** Room for the container: two certificates and the signed attributes take about 2,000 bytes. */
const CONTAINER_BYTES = 4096
/** As wide as any offset in a file that the portal handles, so that the true numbers fit in its place. */
const WIDE_NUMBER = 9_999_999_999
/** The form holds signatures, and may only be added to (ISO 32000-1, table 219). */
const SIGNATURES_EXIST_APPEND_ONLY = 3
/** The block prints and is locked (ISO 32000-1, table 165). */
const PRINT_AND_LOCKED = 4 + 128

/**
 * Adds an unsigned signature field with its visible block to a document that is open for an incremental update. All
 * texts are written as escaped or hexadecimal strings, never as syntax.
 */
export async function addSignatureField(
  document: PDFDocument,
  request: SignatureRequest,
  signerName: string,
): Promise<Result<void, SignPdfError>> {
  const appearance = await drawAppearance(document, request)
  if (!appearance.ok) return appearance
  const { context } = document
  const { x, y, width, height } = request.block.rectangle
  const page = document.getPage(request.block.page)
  const widget = context.register(
    context.obj({
      Type: 'Annot',
      Subtype: 'Widget',
      FT: 'Sig',
      T: PDFHexString.fromText(request.field),
      F: PRINT_AND_LOCKED,
      Rect: [x, y, x + width, y + height],
      P: page.ref,
      V: context.register(emptySignature(document, request, signerName)),
      AP: { N: appearance.value },
    }),
  )
  const annotations = page.node.lookupMaybe(PDFName.of('Annots'), PDFArray)?.asArray() ?? []
  page.node.set(PDFName.of('Annots'), context.obj([...annotations, widget]))
  addToForm(document, widget)
  return ok(undefined)
}

function emptySignature(document: PDFDocument, request: SignatureRequest, signerName: string): PDFDict {
  return document.context.obj({
    Type: 'Sig',
    Filter: 'Adobe.PPKLite',
    SubFilter: 'ETSI.CAdES.detached',
    ByteRange: [0, WIDE_NUMBER, WIDE_NUMBER, WIDE_NUMBER].map((number) => PDFNumber.of(number)),
    Contents: PDFHexString.of('00'.repeat(CONTAINER_BYTES)),
    M: PDFString.of(formatPdfDate(request.signedAt)),
    Name: PDFHexString.fromText(signerName),
    Reason: PDFHexString.fromText(request.reason),
  })
}

/** The form is an object of its own, so that a later signature leaves the catalogue as it is. */
function addToForm(document: PDFDocument, widget: PDFRef): void {
  const { catalog, context } = document
  const form = catalog.lookupMaybe(PDFName.of('AcroForm'), PDFDict)
  if (!form) {
    const created = context.obj({ Fields: [widget], SigFlags: SIGNATURES_EXIST_APPEND_ONLY })
    catalog.set(PDFName.of('AcroForm'), context.register(created))
    return
  }
  const fields = form.lookup(PDFName.of('Fields'), PDFArray).asArray()
  form.set(PDFName.of('Fields'), context.obj([...fields, widget]))
  form.set(PDFName.of('SigFlags'), PDFNumber.of(SIGNATURES_EXIST_APPEND_ONLY))
}
