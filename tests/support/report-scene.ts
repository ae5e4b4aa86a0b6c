import type { Actor } from '@/lib/authz/actor'
import { findMethod } from '@/lib/core/method/registry'
import { createCertificate } from '@/lib/domain/reports/certificate.service'

import { addCompany, addPerson } from './people'
import type { TestPortal } from './test-portal'

export const password = 'copper pour under the tie'
export const passphrase = 'one ground under it all'

export type ReportScene = {
  readonly companyId: string
  readonly engagementId: string
  readonly findingId: string
  readonly author: Actor
  readonly reviewer: Actor
  readonly purchaser: Actor
  readonly engineer: Actor
}

/** An engagement with an approved scope and one published finding on a real run, and the people around it. */
export async function openReportScene(portal: TestPortal): Promise<ReportScene> {
  const companyId = await addCompany(portal, 'Osterby Pump Controls')
  const memberships = (role: 'purchaser' | 'engineer') => [{ companyId, role }]
  const author = await addPerson(portal, { name: 'Edda Quist', isConsultant: true, password })
  const reviewer = await addPerson(portal, { name: 'Tobias Rehn', isConsultant: true, password })
  const purchaser = await addPerson(portal, { name: 'Petra Lind', memberships: memberships('purchaser') })
  const engineer = await addPerson(portal, { name: 'Jonas Ek', memberships: memberships('engineer') })
  const engagementId = await addEngagement(portal, companyId, [author, reviewer], engineer)
  const findingId = await addPublishedFinding(portal, engagementId, author)
  return { companyId, engagementId, findingId, author, reviewer, purchaser, engineer }
}

/** Gives both consultants a signing certificate. */
export async function giveCertificates(portal: TestPortal, scene: ReportScene): Promise<void> {
  for (const person of [scene.author, scene.reviewer]) {
    const made = await createCertificate.execute(portal.deps, person, { password, passphrase })
    if (!made.ok) throw new Error(made.error.message)
  }
}

async function addEngagement(
  portal: TestPortal,
  companyId: string,
  consultants: readonly Actor[],
  engineer: Actor,
): Promise<string> {
  const id = portal.deps.ids.newId()
  const now = portal.clock.now()
  const number = await portal.db.selectFrom('engagement').select('id').execute()
  await portal.db
    .insertInto('engagement')
    .values({
      id,
      company_id: companyId,
      number: number.length + 1,
      title: 'Ringing switch node',
      status: 'active',
      opened_by: engineer.personId,
      created_at: now,
    })
    .execute()
  await portal.db
    .insertInto('brief')
    .values({
      engagement_id: id,
      product: 'Pump controller',
      goal_standard: 'CISPR 32',
      goal_class: 'B',
      goal_test_date: '2027-01-15',
      symptom: 'Rings near 103 MHz',
      vin_volts: 48,
      vout_volts: 12,
      iout_amperes: 5,
      switching_hertz: 420e3,
      spread_spectrum: '',
      already_tried: '',
    })
    .execute()
  await portal.db
    .insertInto('engagement_client')
    .values({ engagement_id: id, person_id: engineer.personId, added_at: now, removed_at: null })
    .execute()
  for (const consultant of consultants) {
    await portal.db
      .insertInto('engagement_consultant')
      .values({ engagement_id: id, person_id: consultant.personId, assigned_at: now, removed_at: null })
      .execute()
  }
  return id
}

async function addPublishedFinding(portal: TestPortal, engagementId: string, author: Actor): Promise<string> {
  const run = findMethod('ring-parasitics')?.run({ f0: '102.72M', f1: '64.11M', cAdd: '470p' })
  if (!run?.ok) throw new Error('The run of the scene failed')
  const { outcome, values } = run.value
  const now = portal.clock.now()
  const runId = portal.deps.ids.newId()
  const findingId = portal.deps.ids.newId()
  const typed = Object.entries(values).map(([key, value]) => [
    key,
    { by: 'typed', value, text: String(value) },
  ])
  await portal.db
    .insertInto('method_run')
    .values({
      id: runId,
      engagement_id: engagementId,
      number: 1,
      method_id: run.value.methodId,
      method_version: run.value.methodVersion,
      inputs: JSON.stringify({ trace: null, values: Object.fromEntries(typed) }),
      result: JSON.stringify({
        absence: null,
        results: outcome.results,
        choices: outcome.choices,
        validity: outcome.validity,
        warnings: [],
      }),
      figures: JSON.stringify(outcome.figures),
      created_by: author.personId,
      created_at: now,
    })
    .execute()
  await portal.db
    .insertInto('finding')
    .values({
      id: findingId,
      engagement_id: engagementId,
      number: 1,
      claim: 'The hot loop of 8 nH rings with 300 pF',
      severity: 'major',
      confidence: 'high',
      reasoning: 'Two frequencies.',
      alternative_causes: '',
      disproving_experiment: '',
      status: 'published',
      author_id: author.personId,
      created_at: now,
      published_at: now,
    })
    .execute()
  await portal.db
    .insertInto('finding_run')
    .values({ finding_id: findingId, run_id: runId, position: 0 })
    .execute()
  return findingId
}
