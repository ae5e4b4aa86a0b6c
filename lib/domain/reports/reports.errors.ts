import type { ServiceError } from '../service-error'

export type ReportError = ServiceError<
  | 'step_not_open'
  | 'not_the_author'
  | 'not_the_reviewer'
  | 'reviewer_not_possible'
  | 'finding_not_published'
  | 'no_remark'
  | 'no_certificate'
  | 'wrong_passphrase'
  | 'rendering_failed'
  | 'signing_failed'
  | 'no_such_code'
  | 'too_large'
>

export const stepNotOpen = (wanted: string): ReportError => ({
  code: 'step_not_open',
  message: `The report cannot be ${wanted} now: it has moved on, or an earlier step is missing. Open it again to see where it stands.`,
})

export const notTheAuthor: ReportError = {
  code: 'not_the_author',
  message: 'This step belongs to the author of the report.',
}

export const notTheReviewer: ReportError = {
  code: 'not_the_reviewer',
  message: 'This step belongs to the reviewer, who is never the author.',
}

export const reviewerNotPossible: ReportError = {
  code: 'reviewer_not_possible',
  message:
    'The reviewer must be another consultant who is on this engagement. An administrator can assign one.',
  fields: { reviewerId: 'Choose another consultant of this engagement.' },
}

export const findingNotPublished: ReportError = {
  code: 'finding_not_published',
  message: 'Only published findings of this engagement can stand in a report. Publish the finding first.',
  fields: { findingIds: 'One of these is not published.' },
}

export const noRemark: ReportError = {
  code: 'no_remark',
  message: 'Write at least one remark that says what to change, then return the report.',
}

export const noCertificate: ReportError = {
  code: 'no_certificate',
  message: 'You have no valid signing certificate yet. Make one on your account page, then sign.',
}

export const wrongPassphrase: ReportError = {
  code: 'wrong_passphrase',
  message: 'This is not the passphrase of your signing certificate.',
  fields: { passphrase: 'Does not open your signing key.' },
}

export const renderingFailed: ReportError = {
  code: 'rendering_failed',
  message: 'The PDF could not be made just now. Nothing was changed; try again.',
}

export const signingFailed = (reason: string): ReportError => ({
  code: 'signing_failed',
  message: `The file was not signed. ${reason}`,
})

export const noSuchCode: ReportError = {
  code: 'no_such_code',
  message: 'No released report has this code. Compare it with the last page of the report.',
  fields: { code: 'Not known here.' },
}
