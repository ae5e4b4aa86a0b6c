'use server'

import { action } from '@/lib/server/action'
import { invitations } from '@/lib/server/operations'

export const inviteColleague = action(invitations.inviteColleague)
