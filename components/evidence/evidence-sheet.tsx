import type { EvidenceDto } from '@/lib/domain/evidence/evidence-dto'

import { EmptyState } from '../ui/empty-state'
import { LinkButton } from '../ui/link-button'
import { Sheet } from '../ui/sheet'
import { TextLink } from '../ui/text-link'
import { EvidenceTable } from './evidence-table'

const mostShown = 5

type EvidenceSheetProps = { readonly engagementId: string; readonly files: readonly EvidenceDto[] }

/** The newest evidence on the overview of an engagement. */
export const EvidenceSheet = ({ engagementId, files }: EvidenceSheetProps) => {
  const href = `/engagements/${engagementId}/evidence`
  const add = (
    <LinkButton href={href} size="small" tone="plain">
      Add files
    </LinkButton>
  )
  if (files.length === 0) {
    return (
      <EmptyState title="No evidence yet" action={<LinkButton href={href}>Add files</LinkButton>}>
        Captures as delimited text, schematics, layouts, photos of the set-up: drag them in on the next page.
      </EmptyState>
    )
  }
  return (
    <Sheet title="Evidence" flush actions={add}>
      <EvidenceTable files={files.slice(0, mostShown)} brief />
      {files.length > mostShown ? (
        <p className="border-t border-rule px-4 py-2 text-sm sm:px-5">
          <TextLink href={href}>All {files.length} files</TextLink>
        </p>
      ) : null}
    </Sheet>
  )
}
