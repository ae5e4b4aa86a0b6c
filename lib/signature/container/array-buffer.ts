/** The ASN.1 library keeps the whole buffer behind a view, so it is given a copy that holds nothing else. */
export const arrayBuffer = (bytes: Uint8Array): ArrayBuffer => Uint8Array.from(bytes).buffer
