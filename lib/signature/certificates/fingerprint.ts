import { createHash } from 'node:crypto'

/** The SHA-256 of a certificate's DER bytes in lower-case hexadecimal: how the portal names a certificate. */
export const certificateFingerprint = (certificateDer: Uint8Array): string =>
  createHash('sha256').update(certificateDer).digest('hex')
