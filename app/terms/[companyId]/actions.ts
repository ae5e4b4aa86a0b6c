'use server'

import { action } from '@/lib/server/action'
import { confidentiality } from '@/lib/server/operations'

export const acceptTerms = action(confidentiality.acceptTerms, { goTo: () => '/' })
