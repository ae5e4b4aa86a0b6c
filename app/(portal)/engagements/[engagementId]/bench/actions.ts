'use server'

import { action } from '@/lib/server/action'
import { measurements, recomputations, runs } from '@/lib/server/operations'

export const measureRing = action(measurements.measureRing, {
  goTo: ({ engagementId, runId }) => `/engagements/${engagementId}/bench/runs/${runId}`,
})

export const runMethod = action(runs.runMethod, {
  goTo: ({ engagementId, runId }) => `/engagements/${engagementId}/bench/runs/${runId}`,
})

export const recomputeRun = action(recomputations.recomputeRun)
