import 'server-only'

import type { Tx } from '@/db/client'
import { findBrief, listKnownOscillators, type BriefRow } from '@/db/repositories/engagement-brief.repo'
import { findEvidence } from '@/db/repositories/evidence.repo'
import { findPerson } from '@/db/repositories/person.repo'
import { listReportFindingIds, type ReportRow } from '@/db/repositories/report.repo'
import { findScopeWithStatus } from '@/db/repositories/scope.repo'
import { postedMinutesOf } from '@/db/repositories/posted-time.repo'
import type { Fact, ReportDocument, ReportEvidence } from '@/lib/core/report/report-document'
import { quantityText } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'

import type { Deps } from '../deps'
import type { LoadedEngagement } from '../engagements/engagement-resource'
import { loadCapture } from '../evidence/evidence-resource'
import { consequencesOf } from '../evidence/fact-consequences'
import type { FindingDto } from '../findings/finding-dto'
import { publishedFindings } from '../findings/published-findings'
import { factTexts } from './fact-texts'
import { frozenFinding, frozenRun, orderedRuns } from './frozen-findings'

/**
 * Gathers everything that stands in the report at this moment into one document. From here on the report is that
 * document: later changes to findings, evidence or people do not reach it.
 */
export async function freezeReport(
  tx: Tx,
  deps: Deps,
  report: ReportRow,
  engagement: LoadedEngagement,
): Promise<ReportDocument> {
  const now = deps.clock.now()
  const findings = await chosenFindings(tx, report)
  const runs = orderedRuns(findings)
  const { practiceName, practiceAddress, publicUrl } = deps.settings
  return {
    practice: { name: practiceName, address: practiceAddress },
    number: report.number,
    revision: report.revision,
    title: report.title,
    issuedAt: now,
    checkAddress: `${publicUrl}/check`,
    checkCode: report.check_code,
    clientCompany: engagement.row.company_name,
    engagement: await engagementPart(tx, engagement),
    summary: {
      belief: report.summary_belief,
      certainty: report.summary_certainty,
      nextStep: report.summary_next_step,
    },
    evidence: await evidencePart(tx, findings),
    findings: findings.map((finding) => frozenFinding(finding, runs)),
    runs: runs.map(frozenRun),
    minutesUsed: await postedMinutesOf(tx, engagement.row.id),
    author: await nameOf(tx, report.author_id),
    reviewer: report.reviewer_id ? await nameOf(tx, report.reviewer_id) : '',
    revisions: [{ revision: report.revision, date: now, change: 'First issue' }],
  }
}

async function chosenFindings(tx: Tx, report: ReportRow): Promise<FindingDto[]> {
  const published = await publishedFindings(tx, report.engagement_id)
  const ids = await listReportFindingIds(tx, report.id)
  return ids.flatMap((id) => published.filter((finding) => finding.findingId === id))
}

async function engagementPart(tx: Tx, { row }: LoadedEngagement): Promise<ReportDocument['engagement']> {
  const brief = await findBrief(tx, row.id)
  if (!brief) throw new Error('An engagement without its brief')
  const oscillators = await listKnownOscillators(tx, row.id)
  const scope = await findScopeWithStatus(tx, row.id, 'approved')
  const test = brief.goal_test_date ? `next test ${brief.goal_test_date}` : ''
  const goalClass = brief.goal_class ? `class ${brief.goal_class}` : ''
  return {
    number: row.number,
    title: row.title,
    openedAt: row.created_at,
    product: brief.product,
    goal: [brief.goal_standard, goalClass, test].filter(Boolean).join(', ') || 'Not stated',
    symptom: brief.symptom,
    operatingPoint: operatingPoint(brief),
    oscillators: oscillators.map((oscillator) => ({
      label: oscillator.name,
      value: `${quantityText(oscillator.hertz, 'Hz')} ± ${oscillator.tolerance_ppm} ppm`,
    })),
    alreadyTried: brief.already_tried,
    scope: scope?.body ?? '',
  }
}

function operatingPoint(brief: BriefRow): Fact[] {
  const values: readonly (readonly [string, number | null, Unit])[] = [
    ['Input voltage', brief.vin_volts, 'V'],
    ['Output voltage', brief.vout_volts, 'V'],
    ['Output current', brief.iout_amperes, 'A'],
    ['Switching frequency', brief.switching_hertz, 'Hz'],
  ]
  const facts = values.flatMap(([label, value, unit]) =>
    value === null ? [] : [{ label, value: quantityText(value, unit) }],
  )
  return brief.spread_spectrum
    ? [...facts, { label: 'Spread spectrum', value: brief.spread_spectrum }]
    : facts
}

async function evidencePart(tx: Tx, findings: readonly FindingDto[]): Promise<ReportEvidence[]> {
  const used = findings.flatMap((finding) => finding.runs.flatMap((run) => run.evidence))
  const byId = new Map(used.map((piece) => [piece.evidenceId, piece]))
  const pieces = [...byId.values()].sort((a, b) => a.number - b.number)
  return Promise.all(pieces.map((piece) => describedEvidence(tx, piece)))
}

async function describedEvidence(
  tx: Tx,
  piece: FindingDto['runs'][number]['evidence'][number],
): Promise<ReportEvidence> {
  const row = await findEvidence(tx, piece.evidenceId)
  if (!row) throw new Error('A run rests on evidence that does not exist')
  const capture = await loadCapture(tx, piece.evidenceId)
  return {
    number: piece.number,
    name: piece.name,
    sha256: piece.sha256,
    sizeBytes: row.size_bytes,
    receivedAt: row.created_at,
    facts: capture ? factTexts(capture.facts) : [],
    missing: capture
      ? consequencesOf(capture.facts, capture.intervalSeconds).missing.map(({ rulesOut }) => rulesOut)
      : [],
  }
}

async function nameOf(tx: Tx, personId: string): Promise<string> {
  const person = await findPerson(tx, personId)
  return person?.name ?? ''
}
