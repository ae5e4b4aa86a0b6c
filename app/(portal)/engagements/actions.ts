'use server'

import { action } from '@/lib/server/action'
import { engagements } from '@/lib/server/operations'

export const openEngagement = action(engagements.openEngagement, {
  goTo: ({ engagementId }) => `/engagements/${engagementId}`,
})
