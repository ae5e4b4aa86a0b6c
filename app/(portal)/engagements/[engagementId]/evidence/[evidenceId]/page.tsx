import type { Metadata } from 'next'
import { notFound } from 'next/navigation'

import { CaptureRecord } from '@/components/evidence/capture-record'
import { CaptureSheets } from '@/components/evidence/capture-sheets'
import { FileDetails } from '@/components/evidence/file-details'
import { PageBody } from '@/components/shell/page-body'
import { Notice } from '@/components/ui/notice'
import { TextLink } from '@/components/ui/text-link'
import { evidence } from '@/lib/server/operations'
import { query } from '@/lib/server/query'
import { requireActor } from '@/lib/server/session'

import { stateFacts } from './actions'

type Props = PageProps<'/engagements/[engagementId]/evidence/[evidenceId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { evidenceId } = await params
  const file = await query(evidence.getEvidence, { evidenceId })
  return { title: file.name }
}

export default async function EvidenceFilePage({ params }: Props) {
  const { engagementId, evidenceId } = await params
  const [file, { isConsultant }] = await Promise.all([
    query(evidence.getEvidence, { evidenceId }),
    requireActor(),
  ])
  if (file.engagementId !== engagementId) notFound()
  const { capture } = file
  const aside = (
    <>
      <FileDetails file={file} />
      {capture ? <CaptureRecord capture={capture} /> : null}
    </>
  )
  return (
    <PageBody aside={aside}>
      <div>
        <p className="text-sm">
          <TextLink href={`/engagements/${engagementId}/evidence`}>All evidence</TextLink>
        </p>
        <h2 className="mt-1 text-xl [overflow-wrap:anywhere]">{file.name}</h2>
      </div>
      {file.refusal ? (
        <Notice tone="error" title="This file is kept, but could not be read">
          {file.refusal}
        </Notice>
      ) : null}
      {capture ? (
        <CaptureSheets
          evidenceId={evidenceId}
          name={file.name}
          measureHref={isConsultant ? `/engagements/${engagementId}/bench?capture=${evidenceId}` : undefined}
          capture={capture}
          stateFacts={stateFacts}
        />
      ) : null}
      {capture || file.refusal ? null : (
        <Notice>This kind of file is kept as it was sent. Download it to look at it.</Notice>
      )}
    </PageBody>
  )
}
