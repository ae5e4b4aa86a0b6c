import type { FormAction } from '@/lib/core/action-state'
import type { FindingDto } from '@/lib/domain/findings/finding-dto'

import { ActionForm } from '../forms/action-form'
import { DescriptionList } from '../ui/description-list'
import { LinkButton } from '../ui/link-button'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { FindingStatus } from './finding-status'
import { RunEvidence } from './run-evidence'
import { SeverityMark } from './severity-mark'

type FindingDetailsProps = {
  readonly finding: FindingDto
  /** For those who write it, while it is a draft. */
  readonly publish?: FormAction | undefined
}

/** State and origin of a finding, the steps open to its writer, and all evidence behind it. */
export const FindingDetails = ({ finding, publish }: FindingDetailsProps) => {
  const pieces = finding.runs.flatMap((run) => run.evidence)
  const evidence = [...new Map(pieces.map((piece) => [piece.evidenceId, piece])).values()]
  return (
    <>
      <Sheet title={`Finding ${finding.number}`}>
        <DescriptionList
          items={[
            { term: 'State', detail: <FindingStatus status={finding.status} /> },
            { term: 'Matters', detail: <SeverityMark severity={finding.severity} /> },
            { term: 'Author', detail: finding.author },
            { term: 'Written', detail: <Timestamp instant={finding.createdAt} dayOnly /> },
            ...(finding.publishedAt === null
              ? []
              : [{ term: 'Published', detail: <Timestamp instant={finding.publishedAt} dayOnly /> }]),
          ]}
        />
      </Sheet>
      {publish ? (
        <Sheet title="The draft">
          <div className="flex flex-col gap-4">
            <p className="text-sm text-ink-soft">
              Only the practice sees it. Once published it is in front of the client and is not changed any
              more.
            </p>
            <ActionForm
              action={publish}
              hidden={{ findingId: finding.findingId }}
              submitLabel="Publish"
              pendingLabel="Publishing…"
              label="Publish the finding"
            />
            <LinkButton
              href={`/engagements/${finding.engagementId}/findings/${finding.findingId}/edit`}
              tone="plain"
            >
              Edit the draft
            </LinkButton>
          </div>
        </Sheet>
      ) : null}
      <Sheet title="Evidence">
        <RunEvidence run={{ engagementId: finding.engagementId, evidence }} />
      </Sheet>
    </>
  )
}
