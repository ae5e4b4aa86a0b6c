import type { Rectangle } from '../pdf/field-place'

/** The largest visible block: it may stand beside the report's text, never replace a page of it. */
export const LARGEST_BLOCK = { width: 400, height: 160 } as const

/** Who signs what, when and where it shows. */
export type SignatureRequest = {
  /** The name of the field, one for each role in the report: "author", "reviewer". */
  readonly field: string
  /** A sentence such as "Approved as reviewer of this report". */
  readonly reason: string
  /** UTC milliseconds; the signature states it to the second. */
  readonly signedAt: number
  /** Where the block shows; `page` counts from 0. */
  readonly block: { readonly page: number; readonly rectangle: Rectangle; readonly lines: readonly string[] }
  /** A complete TrueType font; the characters that are used are embedded. */
  readonly font: Uint8Array
  readonly signer: { readonly certificateDer: Uint8Array; readonly privateKeyPkcs8: Uint8Array }
  readonly authorityCertificateDer: Uint8Array
}
