import type { ServiceError } from '../service-error'

export type IdentityError = ServiceError<
  | 'wrong_credentials'
  | 'throttled'
  | 'link_not_usable'
  | 'name_needed'
  | 'already_a_member'
  | 'company_exists'
  | 'terms_changed'
  | 'last_administrator'
>

export const wrongCredentials: IdentityError = {
  code: 'wrong_credentials',
  message: 'E-mail address and password do not belong together. Check both, or ask for a new password.',
}

export const throttled: IdentityError = {
  code: 'throttled',
  message: 'Too many attempts in a short time. Wait 15 minutes, then try again.',
}

export const linkNotUsable: IdentityError = {
  code: 'link_not_usable',
  message:
    'This link cannot be used: it was used already, is older than its time limit, or was asked for in another browser. Ask for a new one in this browser.',
}
