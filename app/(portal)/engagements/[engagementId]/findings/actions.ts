'use server'

import { action } from '@/lib/server/action'
import { findings } from '@/lib/server/operations'

export const createFinding = action(findings.createFinding, {
  goTo: ({ engagementId, findingId }) => `/engagements/${engagementId}/findings/${findingId}`,
})

export const editFinding = action(findings.editFinding, {
  goTo: ({ engagementId, findingId }) => `/engagements/${engagementId}/findings/${findingId}`,
})

export const publishFinding = action(findings.publishFinding)
