import type { RunDto } from '@/lib/domain/findings/run-dto'

import { Hash } from '../ui/hash'
import { TextLink } from '../ui/text-link'

/** The files that a run rests on, with the SHA-256 that their bytes had then. */
export const RunEvidence = ({ run }: { readonly run: Pick<RunDto, 'engagementId' | 'evidence'> }) =>
  run.evidence.length === 0 ? (
    <span className="text-ink-soft">None: every value was typed.</span>
  ) : (
    <ul className="flex flex-col gap-1.5">
      {run.evidence.map(({ evidenceId, number, name, sha256 }) => (
        <li key={evidenceId}>
          <TextLink href={`/engagements/${run.engagementId}/evidence/${evidenceId}`}>
            {number}. {name}
          </TextLink>
          <span className="block text-sm">
            SHA-256 <Hash value={sha256} what={`SHA-256 of ${name}`} />
          </span>
        </li>
      ))}
    </ul>
  )
