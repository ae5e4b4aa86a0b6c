'use server'

import { action } from '@/lib/server/action'
import { sessions } from '@/lib/server/operations'

export const signOutEverywhere = action(sessions.signOutEverywhere, { goTo: () => '/sign-in' })
