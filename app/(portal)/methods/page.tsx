import type { Metadata } from 'next'

import { MethodList } from '@/components/findings/method-list'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { Sheet } from '@/components/ui/sheet'
import { methodPages } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Methods' }

export default async function MethodsPage() {
  const groups = await query(methodPages.listMethodPages)
  return (
    <>
      <PageHeader
        title="Methods"
        lead="What the practice computes with: each method with its formulas, its limits, its sources, and an example that is computed as you look."
      />
      <PageBody>
        {groups.map(({ title, methods }) => (
          <Sheet key={title} title={title}>
            <MethodList base="/methods" methods={methods} />
          </Sheet>
        ))}
      </PageBody>
    </>
  )
}
