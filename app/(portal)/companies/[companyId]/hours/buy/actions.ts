'use server'

import { action } from '@/lib/server/action'
import { checkouts } from '@/lib/server/operations'

export const startCheckout = action(checkouts.startCheckout, { goTo: ({ url }) => url })
