import { createHash } from 'node:crypto'

import { signContainer } from '../container/sign-container'
import { formFields } from '../pdf/signature-fields'
import { readPdfFile } from '../pdf/read-pdf-file'
import type { SignatureRequest } from './signature-request'

/**
 * Signs the empty field that the newest save added: writes the byte range, digests everything but the container's
 * place, and puts the container there. The length of the file stays the same.
 */
export function fillSignature(
  unsigned: Uint8Array,
  request: Pick<SignatureRequest, 'field' | 'signer' | 'authorityCertificateDer'>,
): Uint8Array {
  const { byteRange, contents } = placesOf(unsigned, request.field)
  const bytes = Uint8Array.from(unsigned)
  const range = `[0 ${contents.start} ${contents.end} ${bytes.length - contents.end}`
  write(bytes, byteRange.start, `${range.padEnd(byteRange.end - byteRange.start - 1)}]`)
  const documentDigest = createHash('sha256')
    .update(bytes.subarray(0, contents.start))
    .update(bytes.subarray(contents.end))
    .digest()
  const container = signContainer({
    documentDigest,
    signerCertificateDer: request.signer.certificateDer,
    privateKeyPkcs8: request.signer.privateKeyPkcs8,
    authorityCertificateDer: request.authorityCertificateDer,
  })
  const hex = Buffer.from(container).toString('hex')
  if (hex.length > contents.end - contents.start - 2) throw new Error('The signature does not fit its place')
  write(bytes, contents.start + 1, hex)
  return bytes
}

function placesOf(bytes: Uint8Array, field: string) {
  const file = readPdfFile(bytes)
  const fields = file.ok ? formFields(file.value) : null
  const signature = fields?.find(({ name }) => name === field)?.signature
  const byteRange = signature?.dictionary.entries.get('ByteRange')
  const contents = signature?.dictionary.entries.get('Contents')
  if (!byteRange || !contents) throw new Error('The update that was just written holds no field to sign')
  return { byteRange, contents }
}

function write(bytes: Uint8Array, offset: number, text: string): void {
  bytes.set(Buffer.from(text, 'latin1'), offset)
}
