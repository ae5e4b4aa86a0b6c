import { createPrivateKey, createPublicKey } from 'node:crypto'

import { PDFDocument } from '@cantoo/pdf-lib'

import { err, ok, type Result } from '@/lib/core/result'

import { isIssuedBy, readCertificate } from './certificates/certificate-facts'
import { fieldPlace, isOverlapping } from './pdf/field-place'
import { pageObjects } from './pdf/page-list'
import type { PdfFile } from './pdf/pdf-file'
import { readPdfFile } from './pdf/read-pdf-file'
import { formFields } from './pdf/signature-fields'
import { addSignatureField } from './signing/add-signature-field'
import { fillSignature } from './signing/fill-signature'
import type { SignPdfError } from './signing/sign-pdf-error'
import { LARGEST_BLOCK, type SignatureRequest } from './signing/signature-request'

/**
 * Signs a report: one incremental update that adds a signature field with its visible block and a detached CAdES
 * signature over the whole file as it then is. Earlier bytes, and so earlier signatures, stay as they are; call it
 * again for the next signer. Equal inputs give equal bytes but for the random part of the ECDSA signature.
 *
 * Errors: those of `readPdfFile`; `field_exists`, `no_such_page`, `block_taken`, `block_outside_page`, `block_too_small`,
 * `character_missing`, `certificate_unusable`.
 * Sources: ISO 32000-1:2008, 12.8; ETSI EN 319 142-1 (baseline signatures in PDF).
 */
export async function signPdf(
  pdf: Uint8Array,
  request: SignatureRequest,
): Promise<Result<Uint8Array, SignPdfError>> {
  const file = readPdfFile(pdf)
  if (!file.ok) return file
  const problem = problemWithPlace(file.value, request)
  if (problem) return err(problem)
  const signer = usableSigner(request)
  if (!signer.ok) return signer

  const document = await PDFDocument.load(pdf, {
    forIncrementalUpdate: true,
    updateMetadata: false,
    throwOnInvalidObject: true,
  })
  const page = document.getPage(request.block.page)
  const { x, y, width, height } = request.block.rectangle
  const box = page.getMediaBox()
  if (x < box.x || y < box.y || x + width > box.x + box.width || y + height > box.y + box.height) {
    return err({
      code: 'block_outside_page',
      message: `The block of the signature "${request.field}" reaches outside page ${request.block.page + 1}; move it inside.`,
    })
  }
  const added = await addSignatureField(document, request, signer.value)
  if (!added.ok) return added
  return ok(fillSignature(await document.save({ useObjectStreams: false }), request))
}

function problemWithPlace(file: PdfFile, request: SignatureRequest): SignPdfError | null {
  const { field, block } = request
  const fields = formFields(file)
  const pages = pageObjects(file)
  if (!fields || !pages)
    return { code: 'unreadable', message: 'The pages or fields of this PDF cannot be read.' }
  if (fields.some(({ name }) => name === field)) {
    return { code: 'field_exists', message: `This report already holds the signature "${field}".` }
  }
  const page = pages[block.page]
  if (page === undefined) {
    return {
      code: 'no_such_page',
      message: `This report has no page ${block.page + 1} to put the signature on.`,
    }
  }
  const places = fields.map(({ dictionary }) => fieldPlace(dictionary)).filter((place) => place !== null)
  if (places.some((place) => isOverlapping(place, { page, rectangle: block.rectangle }))) {
    return {
      code: 'block_taken',
      message: `Another signature already stands where "${field}" would go; move it.`,
    }
  }
  const { width, height } = block.rectangle
  if (width > LARGEST_BLOCK.width || height > LARGEST_BLOCK.height) {
    return {
      code: 'block_outside_page',
      message: `A signature's block is at most ${LARGEST_BLOCK.width} by ${LARGEST_BLOCK.height} points.`,
    }
  }
  return null
}

/** The signer's name, as the certificate states it, if that certificate can make a valid signature now. */
function usableSigner(request: SignatureRequest): Result<string, SignPdfError> {
  const unusable = (message: string) => err({ code: 'certificate_unusable' as const, message })
  const certificate = readCertificate(request.signer.certificateDer)
  if (!certificate || certificate.isAuthority) return unusable('The signing certificate cannot be read.')
  if (!isIssuedBy(certificate.der, request.authorityCertificateDer)) {
    return unusable("The signing certificate was not issued by the practice's authority.")
  }
  if (request.signedAt < certificate.notBefore || request.signedAt > certificate.notAfter) {
    return unusable('The signing certificate is not valid at this time; ask an administrator for a new one.')
  }
  const { privateKeyPkcs8 } = request.signer
  const key = createPrivateKey({ key: Buffer.from(privateKeyPkcs8), format: 'der', type: 'pkcs8' })
  if (!createPublicKey(key).equals(certificate.publicKey)) {
    return unusable('The signing key does not belong to the signing certificate.')
  }
  return ok(certificate.commonName)
}
