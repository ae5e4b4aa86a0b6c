'use server'

import { action } from '@/lib/server/action'
import { invitations, people } from '@/lib/server/operations'

export const inviteStaff = action(invitations.inviteStaff)

export const disablePerson = action(people.disablePerson)
