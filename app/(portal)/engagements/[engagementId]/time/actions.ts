'use server'

import { action } from '@/lib/server/action'
import { posting, timeDrafts, timers } from '@/lib/server/operations'

export const startTimer = action(timers.startTimer)

export const addTime = action(timeDrafts.addTime)

export const editTime = action(timeDrafts.editTime)

export const discardTime = action(timeDrafts.discardTime)

export const postTime = action(posting.postTime)
