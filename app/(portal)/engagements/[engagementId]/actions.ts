'use server'

import { action } from '@/lib/server/action'
import { engagementPeople, scopes } from '@/lib/server/operations'

export const addClient = action(engagementPeople.addClient)
export const removeClient = action(engagementPeople.removeClient)
export const assignConsultant = action(engagementPeople.assignConsultant)
export const releaseConsultant = action(engagementPeople.releaseConsultant)
export const saveScope = action(scopes.saveScope)
export const proposeScope = action(scopes.proposeScope)
export const approveScope = action(scopes.approveScope)
export const declineScope = action(scopes.declineScope)
