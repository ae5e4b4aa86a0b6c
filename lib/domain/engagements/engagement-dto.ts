import 'server-only'

import type { BriefRow, KnownOscillatorRow } from '@/db/repositories/engagement-brief.repo'
import type { EngagementRow } from '@/db/repositories/engagement.repo'
import type { EngagementStatus } from '@/db/tables/engagements'
import type { Actor } from '@/lib/authz/actor'
import { isAllowed } from '@/lib/authz/authorize'
import type { EngagementResource } from '@/lib/authz/resource'

/** What everybody who may know of an engagement sees of it. */
export type EngagementHeading = {
  readonly engagementId: string
  readonly number: number
  readonly title: string
  readonly companyName: string
  readonly status: EngagementStatus
}

/** The steps that are open to the reader, so that a page offers no others. */
export type EngagementSteps = {
  readonly read: boolean
  readonly addClient: boolean
  readonly assign: boolean
  readonly writeScope: boolean
  readonly decideScope: boolean
  readonly addEvidence: boolean
  readonly compute: boolean
  readonly trackTime: boolean
  readonly readTime: boolean
  readonly composeReport: boolean
}

export type BriefDto = {
  readonly product: string
  readonly goalStandard: string
  readonly goalClass: string
  readonly goalTestDate: string | null
  readonly symptom: string
  readonly vinVolts: number | null
  readonly voutVolts: number | null
  readonly ioutAmperes: number | null
  readonly switchingHertz: number | null
  readonly spreadSpectrum: string
  readonly alreadyTried: string
  readonly oscillators: readonly {
    readonly name: string
    readonly hertz: number
    readonly tolerancePpm: number
  }[]
}

export const headingOf = (row: EngagementRow): EngagementHeading => ({
  engagementId: row.id,
  number: row.number,
  title: row.title,
  companyName: row.company_name,
  status: row.status,
})

export const stepsOf = (actor: Actor, resource: EngagementResource): EngagementSteps => ({
  read: isAllowed(actor, 'engagement.read', resource),
  addClient: isAllowed(actor, 'engagement.addClient', resource),
  assign: isAllowed(actor, 'engagement.assign', resource),
  writeScope: isAllowed(actor, 'scope.write', resource),
  decideScope: isAllowed(actor, 'scope.decide', resource),
  addEvidence: isAllowed(actor, 'evidence.add', resource),
  compute: isAllowed(actor, 'run.create', resource),
  trackTime: isAllowed(actor, 'time.track', resource),
  readTime: isAllowed(actor, 'time.readPosted', resource),
  composeReport: isAllowed(actor, 'report.compose', resource),
})

export const briefOf = (brief: BriefRow, oscillators: readonly KnownOscillatorRow[]): BriefDto => ({
  product: brief.product,
  goalStandard: brief.goal_standard,
  goalClass: brief.goal_class,
  goalTestDate: brief.goal_test_date,
  symptom: brief.symptom,
  vinVolts: brief.vin_volts,
  voutVolts: brief.vout_volts,
  ioutAmperes: brief.iout_amperes,
  switchingHertz: brief.switching_hertz,
  spreadSpectrum: brief.spread_spectrum,
  alreadyTried: brief.already_tried,
  oscillators: oscillators.map(({ name, hertz, tolerance_ppm }) => ({
    name,
    hertz,
    tolerancePpm: tolerance_ppm,
  })),
})
