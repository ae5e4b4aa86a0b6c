import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import type { Actor } from '@/lib/authz/actor'
import type { Operation } from '@/lib/domain/operation'
import { checkCode, checkFile } from '@/lib/domain/reports/check.service'
import { createReport, editReport, submitReport } from '@/lib/domain/reports/compose.service'
import { getReport, listReports, openReportFile, previewReport } from '@/lib/domain/reports/read.service'
import { addRemark, approveReport, returnReport } from '@/lib/domain/reports/review.service'
import { signReport } from '@/lib/domain/reports/sign.service'

import { createOnePageRenderer } from '../support/one-page-renderer'
import { addCompany, addPerson } from '../support/people'
import {
  giveCertificates,
  openReportScene,
  passphrase,
  password,
  type ReportScene,
} from '../support/report-scene'
import { openTestPortal, type TestPortal } from '../support/test-portal'

let portal: TestPortal
let scene: ReportScene

beforeEach(async () => {
  portal = await openTestPortal()
  scene = await openReportScene(portal)
})

afterEach(() => portal.close())

async function expectOk<T>(operation: Operation<T>, actor: Actor, input: unknown): Promise<T> {
  const result = await operation.execute(portal.deps, actor, input)
  if (!result.ok) throw new Error(`${operation.name}: ${result.error.code} ${result.error.message}`)
  return result.value
}

async function codeOf(operation: Operation, actor: Actor, input: unknown): Promise<string> {
  const result = await operation.execute(portal.deps, actor, input)
  return result.ok ? 'ok' : result.error.code
}

const content = () => ({
  title: 'Ringing switch node',
  belief: 'The loop rings.',
  certainty: 'High.',
  nextStep: 'Fit a snubber.',
  findingIds: [scene.findingId],
})

async function draft(): Promise<string> {
  const { reportId } = await expectOk(createReport, scene.author, {
    engagementId: scene.engagementId,
    ...content(),
  })
  return reportId
}

const submit = (reportId: string) =>
  expectOk(submitReport, scene.author, { reportId, reviewerId: scene.reviewer.personId })

const sign = (reportId: string, actor: Actor) =>
  expectOk(signReport, actor, { reportId, password, passphrase })

async function released(): Promise<string> {
  await giveCertificates(portal, scene)
  const reportId = await draft()
  await submit(reportId)
  await expectOk(approveReport, scene.reviewer, { reportId })
  await sign(reportId, scene.author)
  await sign(reportId, scene.reviewer)
  return reportId
}

async function fileOf(reportId: string, actor: Actor): Promise<Uint8Array> {
  const { body } = await expectOk(openReportFile, actor, { reportId })
  const parts: Uint8Array[] = []
  for await (const part of body) parts.push(part)
  return new Uint8Array(Buffer.concat(parts))
}

async function verdictOn(bytes: Uint8Array) {
  const checked = await checkFile.execute(portal.deps, { bytes })
  if (!checked.ok) throw new Error(checked.error.message)
  return checked.value
}

describe('a report from draft to release', () => {
  it('is signed by both, mailed to the client, and found valid by its file and its code', async () => {
    const reportId = await released()
    const file = await fileOf(reportId, scene.purchaser)
    const verdict = await verdictOn(file)
    expect(verdict).toMatchObject({
      outcome: 'valid',
      problems: [],
      report: { number: '2026-001', standing: 'current' },
    })
    expect(verdict.signatures.map(({ field, signerName }) => [field, signerName])).toEqual([
      ['author', 'Edda Quist'],
      ['reviewer', 'Tobias Rehn'],
    ])
    const { checkCode: code, fileSha256 } = await expectOk(getReport, scene.engineer, { reportId })
    const byCode = await checkCode.execute(portal.deps, { code: ` ${code.toUpperCase()} ` })
    expect(byCode).toMatchObject({ ok: true, value: { number: '2026-001', sha256: fileSha256 } })
    const mails = await portal.db
      .selectFrom('outbox_message')
      .select('recipient')
      .where('kind', '=', 'report_released')
      .execute()
    expect(mails.map((mail) => mail.recipient).sort()).toEqual(
      [scene.purchaser.email, scene.engineer.email].sort(),
    )
  })

  it('BZ3: is found invalid when a byte changes, is added or is missing', async () => {
    const file = await fileOf(await released(), scene.purchaser)
    for (const place of [0.1, 0.35, 0.6, 0.9]) {
      const changed = Uint8Array.from(file)
      const index = Math.floor(changed.length * place)
      changed[index] = (changed[index] ?? 0) ^ 1
      expect((await verdictOn(changed)).outcome, `byte ${index}`).not.toBe('valid')
    }
    const longer = new Uint8Array([...file, 10])
    expect((await verdictOn(longer)).outcome).toBe('invalid')
    expect((await verdictOn(file.subarray(0, file.length - 1))).outcome).not.toBe('valid')
  })

  it('is unknown to the check as long as it is not released', async () => {
    await giveCertificates(portal, scene)
    const reportId = await draft()
    await submit(reportId)
    await expectOk(approveReport, scene.reviewer, { reportId })
    await sign(reportId, scene.author)
    const verdict = await verdictOn(await fileOf(reportId, scene.author))
    expect(verdict).toMatchObject({ outcome: 'unknown', report: null })
  })

  it('keeps what was approved, whatever happens to its findings afterwards', async () => {
    await giveCertificates(portal, scene)
    const reportId = await draft()
    await submit(reportId)
    const before = await expectOk(previewReport, scene.reviewer, { reportId })
    await portal.db.updateTable('brief').set({ symptom: 'Something else, and at some length' }).execute()
    const after = await expectOk(previewReport, scene.reviewer, { reportId })
    expect(after.sizeBytes).toBe(before.sizeBytes)
  })

  it('numbers reports of a year without gaps', async () => {
    await draft()
    await draft()
    const rows = await portal.db.selectFrom('report').select('number').orderBy('number').execute()
    expect(rows.map((row) => row.number)).toEqual(['2026-001', '2026-002'])
  })
})

describe('BZ2: steps in their order', () => {
  const steps = ['edit', 'submit', 'remark', 'return', 'approve', 'author signs', 'reviewer signs'] as const
  type Step = (typeof steps)[number]

  const open: Readonly<Record<string, readonly Step[]>> = {
    draft: ['edit', 'submit'],
    in_review: ['remark', 'return', 'approve'],
    returned: ['edit', 'submit'],
    approved: ['author signs'],
    author_signed: ['reviewer signs'],
    released: [],
  }

  const take = (step: Step, reportId: string): Promise<string> => {
    const { author, reviewer } = scene
    switch (step) {
      case 'edit':
        return codeOf(editReport, author, { reportId, ...content() })
      case 'submit':
        return codeOf(submitReport, author, { reportId, reviewerId: reviewer.personId })
      case 'remark':
        return codeOf(addRemark, reviewer, { reportId, section: 'summary', text: 'Say how sure.' })
      case 'return':
        return codeOf(returnReport, reviewer, { reportId })
      case 'approve':
        return codeOf(approveReport, reviewer, { reportId })
      case 'author signs':
        return codeOf(signReport, author, { reportId, password, passphrase })
      case 'reviewer signs':
        return codeOf(signReport, reviewer, { reportId, password, passphrase })
    }
  }

  async function bringTo(state: string): Promise<string> {
    const reportId = await draft()
    const path: Readonly<Record<string, readonly Step[]>> = {
      draft: [],
      in_review: ['submit'],
      returned: ['submit', 'remark', 'return'],
      approved: ['submit', 'approve'],
      author_signed: ['submit', 'approve', 'author signs'],
      released: ['submit', 'approve', 'author signs', 'reviewer signs'],
    }
    for (const step of path[state] ?? []) expect(await take(step, reportId), step).toBe('ok')
    return reportId
  }

  // Only the order of the steps is looked at here, so a report of one page will do.
  beforeEach(async () => {
    await giveCertificates(portal, scene)
    portal = { ...portal, deps: { ...portal.deps, pdf: createOnePageRenderer() } }
  })

  const reviewerless = ['remark', 'return', 'approve', 'reviewer signs']

  it.each(Object.keys(open))('in state %s only its own steps are open', async (state) => {
    for (const step of steps) {
      if (open[state]?.includes(step)) continue
      const reportId = await bringTo(state)
      const answer = await take(step, reportId)
      const expected =
        reviewerless.includes(step) && state === 'draft'
          ? ['not_the_reviewer', 'step_not_open']
          : ['step_not_open', 'not_the_author', 'not_the_reviewer']
      expect(expected, `${step} in ${state}: ${answer}`).toContain(answer)
      const row = await portal.db
        .selectFrom('report')
        .select('status')
        .where('id', '=', reportId)
        .executeTakeFirst()
      expect(row?.status).toBe(state)
    }
  })

  it('needs a remark since the last submission before it can be returned', async () => {
    const reportId = await bringTo('in_review')
    expect(await take('return', reportId)).toBe('no_remark')
    await take('remark', reportId)
    expect(await take('return', reportId)).toBe('ok')
  })

  it('lets two people who sign at the same moment sign once', async () => {
    const reportId = await bringTo('approved')
    const answers = await Promise.all([take('author signs', reportId), take('author signs', reportId)])
    expect(answers.filter((answer) => answer === 'ok')).toHaveLength(1)
  })
})

describe('who may do what', () => {
  it('the reviewer is never the author, and is on the engagement', async () => {
    const reportId = await draft()
    const outsider = await addPerson(portal, { name: 'Una Berg', isConsultant: true })
    for (const reviewerId of [scene.author.personId, outsider.personId, scene.purchaser.personId]) {
      expect(await codeOf(submitReport, scene.author, { reportId, reviewerId })).toBe('reviewer_not_possible')
    }
  })

  it('signing asks for the password and the passphrase of the key', async () => {
    await giveCertificates(portal, scene)
    const reportId = await draft()
    await submit(reportId)
    await expectOk(approveReport, scene.reviewer, { reportId })
    expect(await codeOf(signReport, scene.author, { reportId, password: 'wrong', passphrase })).toBe(
      'wrong_credentials',
    )
    expect(await codeOf(signReport, scene.author, { reportId, password, passphrase: 'wrong' })).toBe(
      'wrong_passphrase',
    )
  })

  it('AZ4: a client sees neither drafts, remarks nor the file before the release', async () => {
    await giveCertificates(portal, scene)
    const reportId = await draft()
    await submit(reportId)
    await expectOk(addRemark, scene.reviewer, { reportId, section: 'summary', text: 'internal-canary' })
    await expectOk(approveReport, scene.reviewer, { reportId })
    for (const client of [scene.purchaser, scene.engineer]) {
      const list = await expectOk(listReports, client, { engagementId: scene.engagementId })
      expect(list.reports).toEqual([])
      expect(await codeOf(getReport, client, { reportId })).toBe('not_found')
      expect(await codeOf(openReportFile, client, { reportId })).toBe('not_found')
    }
    await sign(reportId, scene.author)
    await sign(reportId, scene.reviewer)
    const seen = await expectOk(getReport, scene.purchaser, { reportId })
    expect(JSON.stringify(seen)).not.toContain('internal-canary')
    expect(seen.work).toBeNull()
  })

  it('AZ2: another company and an unassigned consultant get the answer for an unknown id', async () => {
    const reportId = await released()
    const otherCompany = await addCompany(portal, 'Larkfield Rail Sensors')
    const memberships = [{ companyId: otherCompany, role: 'purchaser' as const }]
    const strangers = [
      await addPerson(portal, { name: 'Iris Vane', memberships }),
      await addPerson(portal, { name: 'Una Berg', isConsultant: true }),
    ]
    const unknown = portal.deps.ids.newId()
    for (const stranger of strangers) {
      for (const operation of [getReport, openReportFile, approveReport, returnReport, previewReport]) {
        const foreign = await operation.execute(portal.deps, stranger, { reportId })
        expect(foreign).toEqual(await operation.execute(portal.deps, stranger, { reportId: unknown }))
        expect(foreign).toMatchObject({ error: { code: 'not_found' } })
      }
    }
  })
})
