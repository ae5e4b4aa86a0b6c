'use server'

import { action } from '@/lib/server/action'
import { evidence } from '@/lib/server/operations'

export const stateFacts = action(evidence.stateFacts)
