import type { Metadata } from 'next'

import { EvidenceTable } from '@/components/evidence/evidence-table'
import { UploadArea } from '@/components/evidence/upload-area'
import { PageBody } from '@/components/shell/page-body'
import { EmptyState } from '@/components/ui/empty-state'
import { Sheet } from '@/components/ui/sheet'
import { byteSizeInWords } from '@/lib/core/byte-size'
import { evidence } from '@/lib/server/operations'
import { uploadLimitBytes } from '@/lib/server/practice'
import { query } from '@/lib/server/query'

export const metadata: Metadata = { title: 'Evidence' }

export default async function EvidencePage({ params }: PageProps<'/engagements/[engagementId]/evidence'>) {
  const { engagementId } = await params
  const files = await query(evidence.listEvidence, { engagementId })
  return (
    <PageBody>
      <UploadArea engagementId={engagementId} limitInWords={byteSizeInWords(uploadLimitBytes())}>
        {files.length === 0 ? (
          <EmptyState title="No evidence yet">
            Begin with the raw data: the capture of the switch node as delimited text, then the failing scan,
            schematic, layout and photos of the set-up.
          </EmptyState>
        ) : (
          <Sheet title="Evidence" flush>
            <EvidenceTable files={files} />
          </Sheet>
        )}
      </UploadArea>
    </PageBody>
  )
}
