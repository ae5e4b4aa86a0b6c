'use server'

import { openAction } from '@/lib/server/action'
import { links } from '@/lib/server/operations'

export const setPassword = openAction(links.setPassword, { goTo: () => '/sign-in?password=set' })
