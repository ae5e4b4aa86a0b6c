import type { Metadata } from 'next'

import { NothingHere } from '@/components/shell/nothing-here'
import { PublicShell } from '@/components/shell/public-shell'
import { practiceName } from '@/lib/server/practice'

export const metadata: Metadata = { title: 'Nothing here' }

export default function NotFoundPage() {
  return (
    <PublicShell practiceName={practiceName()}>
      <NothingHere />
    </PublicShell>
  )
}
