import 'server-only'

import type { Tx } from '@/db/client'
import { insertBrief } from '@/db/repositories/engagement-brief.repo'
import { putClientOn } from '@/db/repositories/engagement-people.repo'
import { insertEngagement, nextEngagementNumber } from '@/db/repositories/engagement.repo'
import type { Actor } from '@/lib/authz/actor'

import type { Deps } from '../deps'
import type { OpenEngagement } from './engagements.schema'

export type OpenedEngagement = { readonly engagementId: string; readonly number: number }

/** Writes the engagement under the next number, its brief, and the opener as the first client on it. */
export async function storeEngagement(
  tx: Tx,
  deps: Deps,
  opener: Actor,
  input: OpenEngagement,
): Promise<OpenedEngagement> {
  const engagementId = deps.ids.newId()
  const number = await nextEngagementNumber(tx)
  const now = deps.clock.now()
  await insertEngagement(tx, {
    id: engagementId,
    company_id: input.companyId,
    number,
    title: input.title,
    status: 'briefed',
    opened_by: opener.personId,
    created_at: now,
  })
  const oscillators = input.oscillators.map((oscillator, position) => ({
    engagement_id: engagementId,
    position,
    name: oscillator.name,
    hertz: oscillator.frequency,
    tolerance_ppm: oscillator.tolerancePpm,
  }))
  await insertBrief(tx, briefRow(engagementId, input), oscillators)
  await putClientOn(tx, { engagementId, personId: opener.personId, at: now })
  return { engagementId, number }
}

const briefRow = (engagementId: string, input: OpenEngagement) => ({
  engagement_id: engagementId,
  product: input.product,
  goal_standard: input.goalStandard,
  goal_class: input.goalClass,
  goal_test_date: input.goalTestDate,
  symptom: input.symptom,
  vin_volts: input.vin,
  vout_volts: input.vout,
  iout_amperes: input.iout,
  switching_hertz: input.switchingFrequency,
  spread_spectrum: input.spreadSpectrum,
  already_tried: input.alreadyTried,
})
