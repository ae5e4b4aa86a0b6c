import { expect, test } from '@playwright/test'

import { expectAccessible } from './support/accessibility'
import { mailTo } from './support/mail'
import { askPdfTools } from './support/pdf-tools'
import { browserOf, practice, signIn, type Person } from './support/people'
import { Watch } from './support/watch'
import { analyse, postTime, publishFinding } from './walk/analyse'
import { buyTenHours } from './walk/buy'
import { approveScope, assignConsultants, openEngagement, proposeScope, sendCaptures } from './walk/engage'
import { company, inviteCompany, join } from './walk/join'
import {
  approveReport,
  checkFile,
  composeReport,
  downloadReport,
  makeCertificate,
  signReport,
} from './walk/report'

const purchaserOf = (suffix: string): Person => ({
  name: 'Rosa Tamm',
  email: `rosa.tamm.${suffix}@brackwater.example`,
  password: 'three unrelated short words',
})

test('the whole job, from the invitation to books that agree', async ({ browser, request }) => {
  test.setTimeout(900_000)
  const watch = new Watch()
  const purchaser = purchaserOf('1')
  const pages = {
    administrator: await (await browserOf(browser, watch)).newPage(),
    purchaser: await (await browserOf(browser, watch)).newPage(),
    consultant: await (await browserOf(browser, watch)).newPage(),
    reviewer: await (await browserOf(browser, watch)).newPage(),
    stranger: await (await browserOf(browser, watch)).newPage(),
  }

  await test.step('an administrator invites a company, and its purchaser joins', async () => {
    await signIn(pages.administrator, practice.administrator)
    await inviteCompany(pages.administrator, purchaser)
    await join(pages.purchaser, request, purchaser)
  })

  await test.step('the purchaser buys hours by card', async () => {
    await buyTenHours(pages.purchaser, request, purchaser)
  })

  const engagement = await test.step('the purchaser opens an engagement', () =>
    openEngagement(pages.purchaser))

  await test.step('the purchaser sends two captures', () => sendCaptures(pages.purchaser, engagement))

  await test.step('the scope is proposed and approved', async () => {
    const { consultant, reviewer } = practice
    await assignConsultants(pages.administrator, engagement, [consultant.name, reviewer.name])
    await signIn(pages.consultant, consultant)
    await proposeScope(pages.consultant, engagement)
    await mailTo(request, purchaser.email, /scope/i)
    await approveScope(pages.purchaser, engagement)
  })

  await test.step('the consultant measures, computes, finds and posts time', async () => {
    await analyse(pages.consultant, engagement)
    const finding = await publishFinding(pages.consultant, engagement)
    await postTime(pages.consultant, engagement)
    await pages.purchaser.goto(finding)
    await expect(pages.purchaser.getByText('The hot loop of 8 nH rings with 300 pF').first()).toBeVisible()
    await expectAccessible(pages.purchaser)
  })

  const report = await test.step('the report is composed, reviewed and signed by both', async () => {
    const { consultant, reviewer } = practice
    await makeCertificate(pages.consultant, consultant)
    const path = await composeReport(pages.consultant, engagement, reviewer.name)
    await signIn(pages.reviewer, reviewer)
    await makeCertificate(pages.reviewer, reviewer)
    await approveReport(pages.reviewer, path)
    await signReport(pages.consultant, path, consultant)
    await signReport(pages.reviewer, path, reviewer)
    return path
  })

  await test.step('the client downloads it, and anybody can check it', async () => {
    const file = await downloadReport(pages.purchaser, report)
    const said = askPdfTools(file)
    expect(said.pdfsig.match(/Signature is Valid/g)).toHaveLength(2)
    expect(said.pdfsig).toContain('Edda Quist')
    expect(said.pdfsig).toContain('Tobias Rehn')
    expect(said.qpdf).toContain('No syntax or stream encoding errors found')
    expect(said.text).toContain('Ringing switch node of the servo drive')
    await checkFile(pages.stranger, file, /Valid: whole, unchanged/)
    const changed = Buffer.from(file)
    const place = Math.floor(changed.length / 3)
    changed.writeUInt8(changed.readUInt8(place) ^ 1, place)
    await checkFile(pages.stranger, changed, /Invalid|Not one of our/)
  })

  await test.step('the administrator sees payment, fee, credit, debit and balance agree', async () => {
    await pages.administrator.goto('/books')
    await expect(pages.administrator.getByText('All books agree')).toBeVisible()
    const row = pages.administrator.getByRole('row').filter({ hasText: company })
    await expect(row.first()).toContainText('2,201.50')
    await expect(row.last()).toContainText(/9\s*h\s*54\s*min/)
    await expectAccessible(pages.administrator)
  })

  await test.step('another company gets the answer for an unknown page', async () => {
    await signIn(pages.stranger, {
      ...practice.consultant,
      name: 'Iris Vane',
      email: 'iris.vane@larkfield.example',
    })
    const unknown = engagement.replace(/[0-9a-z]{26}$/, '0'.repeat(26))
    for (const suffix of ['', '/evidence', '/findings', '/reports', '/time', '/bench']) {
      const foreignText = await textOf(engagement + suffix)
      expect(foreignText).toBe(await textOf(unknown + suffix))
      expect(foreignText).toContain('Nothing is here')
    }
  })

  watch.expectNothing()

  async function textOf(path: string): Promise<string> {
    await pages.stranger.goto(path)
    await expect(pages.stranger.getByRole('heading', { name: 'Nothing is here' })).toBeVisible()
    return pages.stranger.locator('body').innerText()
  }
})
