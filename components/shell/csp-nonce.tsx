'use client'

import { useState } from 'react'

/**
 * Where react-aria finds the nonce for the one style element that it adds. The nonce is that of the document: a later
 * answer of the server carries another one, which the browser would not accept, so the first is kept.
 */
export const CspNonce = ({ nonce }: { readonly nonce: string | undefined }) => {
  const [first] = useState(nonce)
  return <meta property="csp-nonce" nonce={first} />
}
