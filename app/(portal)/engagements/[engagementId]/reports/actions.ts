'use server'

import { action } from '@/lib/server/action'
import { reportReview, reports, reportSigning } from '@/lib/server/operations'

export const createReport = action(reports.createReport, {
  goTo: ({ engagementId, reportId }) => `/engagements/${engagementId}/reports/${reportId}`,
})

export const editReport = action(reports.editReport, {
  goTo: ({ engagementId, reportId }) => `/engagements/${engagementId}/reports/${reportId}`,
})

export const submitReport = action(reports.submitReport)

export const addRemark = action(reportReview.addRemark)

export const returnReport = action(reportReview.returnReport)

export const approveReport = action(reportReview.approveReport)

export const signReport = action(reportSigning.signReport)
