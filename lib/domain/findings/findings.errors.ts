import type { ServiceError } from '../service-error'

export type FindingError = ServiceError<
  'already_published' | 'run_not_here' | 'no_run' | 'no_approved_scope' | 'not_complete'
>

export const alreadyPublished: FindingError = {
  code: 'already_published',
  message:
    'This finding is published, and the client may have read it: it is not changed any more. Write a new one.',
}

export const runNotHere: FindingError = {
  code: 'run_not_here',
  message: 'A finding rests on runs of its own engagement only.',
  fields: { runIds: 'One of these is not a run of this engagement. Choose again.' },
}

export const noRun: FindingError = {
  code: 'no_run',
  message:
    'A finding needs at least one run before it is published: without one, no number of it could be opened.',
  fields: { runIds: 'Choose at least one run.' },
}

export const noApprovedScope: FindingError = {
  code: 'no_approved_scope',
  message:
    'The purchaser has not approved a scope yet, so nothing can be published. Propose the scope on the overview first; the draft stays.',
}

export const notComplete = (fields: Readonly<Record<string, string>>): FindingError => ({
  code: 'not_complete',
  message: 'The draft is not complete yet. Edit it first:',
  fields,
})
