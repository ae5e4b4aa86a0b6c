'use server'

import { openAction } from '@/lib/server/action'
import { reportCheck } from '@/lib/server/operations'

export const checkCode = openAction(reportCheck.checkCode)
