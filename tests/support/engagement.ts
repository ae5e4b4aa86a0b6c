import { openEngagement } from '@/lib/domain/engagements/engagement.service'
import { assignConsultant } from '@/lib/domain/engagements/people.service'
import { approveScope, proposeScope, saveScope } from '@/lib/domain/engagements/scope.service'

import { addCompany, addPerson } from './people'
import type { TestPortal } from './test-portal'
import { valueOf } from './value-of'

export const aBrief = {
  title: 'Buck converter rings',
  product: 'Pump controller, 48 V to 12 V',
  goalStandard: 'CISPR 11',
  goalClass: 'B',
  goalTestDate: '2027-01-15',
  symptom: 'Ringing near 180 MHz, radiated emission 4 dB over the limit.',
  vin: '48',
  vout: '12 V',
  iout: '2.5',
  switchingFrequency: '420k',
  spreadSpectrum: 'off',
  alreadyTried: 'Larger gate resistor',
  oscillators: [{ name: 'Processor clock', frequency: '25 MHz', tolerancePpm: '50' }],
}

/** A company with its purchaser, an engineer on one engagement, a consultant assigned to it, and an administrator. */
export async function openTestEngagement(portal: TestPortal, companyName = 'Osterby Pump Controls') {
  const companyId = await addCompany(portal, companyName)
  const member = (name: string, role: 'purchaser' | 'engineer') =>
    addPerson(portal, { name: `${name} of ${companyName}`, memberships: [{ companyId, role }] })
  const purchaser = await member('Petra', 'purchaser')
  const engineer = await member('Emil', 'engineer')
  const consultant = await addPerson(portal, { name: `Cora for ${companyName}`, isConsultant: true })
  const administrator = await addPerson(portal, { name: `Ada for ${companyName}`, isAdministrator: true })
  const opened = await openEngagement.execute(portal.deps, engineer, { companyId, ...aBrief })
  const { engagementId, number } = valueOf(opened)
  valueOf(
    await assignConsultant.execute(portal.deps, administrator, {
      engagementId,
      personId: consultant.personId,
    }),
  )
  return { companyId, purchaser, engineer, consultant, administrator, engagementId, number }
}

export type TestEngagement = Awaited<ReturnType<typeof openTestEngagement>>

/** Takes an engagement to an approved scope with the given cap. */
export async function approveTestScope(
  portal: TestPortal,
  engagement: TestEngagement,
  capHours = '10',
): Promise<void> {
  const { engagementId, consultant, purchaser } = engagement
  const saved = await saveScope.execute(portal.deps, consultant, {
    engagementId,
    body: 'Find the ring, size a snubber, check it.',
    capHours,
  })
  const { scopeId } = valueOf(saved)
  valueOf(await proposeScope.execute(portal.deps, consultant, { scopeId }))
  valueOf(await approveScope.execute(portal.deps, purchaser, { scopeId }))
}
