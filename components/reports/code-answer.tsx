'use client'

import { useContext } from 'react'

import { FormState } from '../forms/form-state'
import { DescriptionList } from '../ui/description-list'
import { Hash } from '../ui/hash'
import { Timestamp } from '../ui/timestamp'
import { z } from '../shell/plain-zod'

const answerSchema = z.object({
  number: z.string(),
  revision: z.number(),
  standing: z.enum(['current', 'withdrawn']),
  releasedAt: z.number(),
  sha256: z.string(),
})

/** What the code of the form around it stands for. */
export const CodeAnswer = () => {
  const state = useContext(FormState)
  const answer = state.status === 'done' ? answerSchema.safeParse(state.value) : null
  if (!answer?.success) return null
  const report = answer.data
  return (
    <div role="status">
      <DescriptionList
        items={[
          {
            term: 'Report',
            detail: <span className="num">{`${report.number}, revision ${report.revision}`}</span>,
          },
          { term: 'Standing', detail: report.standing === 'current' ? 'Current' : 'Withdrawn' },
          { term: 'Released', detail: <Timestamp instant={report.releasedAt} /> },
          {
            term: 'SHA-256 of the issued file',
            detail: <Hash value={report.sha256} what="SHA-256 of the issued file" full />,
          },
        ]}
      />
    </div>
  )
}
