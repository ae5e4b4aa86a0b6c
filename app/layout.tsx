import type { Metadata, Viewport } from 'next'
import { cookies, headers } from 'next/headers'
import type { ReactNode } from 'react'

import { CspNonce } from '@/components/shell/csp-nonce'
import { themeCookie } from '@/components/shell/theme-cookie'

import { fontVariables } from './fonts'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Quellbench', template: '%s · Quellbench' },
  description: 'Client portal of a signal-integrity and EMC consulting practice',
  robots: { index: false, follow: false },
}

export const viewport: Viewport = { width: 'device-width', initialScale: 1, colorScheme: 'light dark' }

// Every response carries its own script nonce, so no page may be prepared ahead of its request.
export const dynamic = 'force-dynamic'

export default async function RootLayout({ children }: { readonly children: ReactNode }) {
  const [jar, head] = await Promise.all([cookies(), headers()])
  const nonce = head.get('x-nonce') ?? undefined
  const theme = jar.get(themeCookie)?.value
  const chosen = theme === 'light' || theme === 'dark' ? theme : undefined
  return (
    <html lang="en" className={fontVariables} data-theme={chosen}>
      <head>
        <CspNonce nonce={nonce} />
      </head>
      <body>{children}</body>
    </html>
  )
}
