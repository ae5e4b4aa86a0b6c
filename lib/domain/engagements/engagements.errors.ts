import type { ServiceError } from '../service-error'

export type EngagementError = ServiceError<
  'not_a_colleague' | 'not_a_consultant' | 'scope_not_saved' | 'scope_not_open'
>

export const notAColleague: EngagementError = {
  code: 'not_a_colleague',
  message:
    'This person does not belong to the company of the engagement. Invite them first, then put them on it.',
  fields: { personId: 'Choose somebody of the company.' },
}

export const notAConsultant: EngagementError = {
  code: 'not_a_consultant',
  message: 'This person is not one of the practice’s consultants, so nothing was changed.',
  fields: { personId: 'Choose a consultant.' },
}

export const scopeNotSaved: EngagementError = {
  code: 'scope_not_saved',
  message:
    'Only a saved draft can be proposed, and this version is not one any more. Open the page again to see where it stands.',
}

export const scopeNotOpen: EngagementError = {
  code: 'scope_not_open',
  message:
    'This version is not waiting for a decision: it was decided already, or a newer one took its place. Open the page again to see it.',
}
