'use server'

import { openAction } from '@/lib/server/action'
import { links } from '@/lib/server/operations'

export const askForReset = openAction(links.askForPasswordReset)
