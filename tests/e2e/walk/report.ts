import { readFile } from 'node:fs/promises'

import { expect, type Page } from '@playwright/test'

import { expectAccessible } from '../support/accessibility'
import type { Person } from '../support/people'

const passphrase = 'one ground under it all'

/** Makes the signing certificate of a consultant. */
export async function makeCertificate(page: Page, person: Person): Promise<void> {
  await page.goto('/account')
  await expectAccessible(page)
  const form = page.getByRole('form', { name: 'Make a signing certificate' })
  await form.getByLabel('Your password').fill(person.password)
  await form.getByLabel('New signing passphrase').fill(passphrase)
  await form.getByRole('button', { name: 'Make the certificate' }).click()
  await expect(page.getByText('Valid until')).toBeVisible()
}

/** The author composes the report and hands it to the reviewer. @returns its path. */
export async function composeReport(page: Page, engagement: string, reviewer: string): Promise<string> {
  await page.goto(`${engagement}/reports/new`)
  await expectAccessible(page)
  await page.getByLabel('Title').fill('Ringing switch node of the servo drive')
  await page.getByRole('checkbox').first().check()
  await page.getByLabel('What we believe').fill('The hot loop rings; a snubber of 5.1 Ω and 820 pF calms it.')
  await page.getByLabel('How sure we are').fill('High: two captures under one set-up agree.')
  await page.getByLabel('What to do next').fill('Solder the snubber and send a capture of it.')
  await page.getByRole('button', { name: 'Save the draft' }).click()
  await expect(page).toHaveURL(/\/reports\/[0-9a-z]{26}$/)
  await expectAccessible(page)
  await page.getByLabel('Reviewer').selectOption({ label: reviewer })
  await page.getByRole('button', { name: 'Submit for review' }).click()
  await expect(page.getByText('In review')).toBeVisible()
  return new URL(page.url()).pathname
}

export async function approveReport(page: Page, report: string): Promise<void> {
  await page.goto(report)
  await expectAccessible(page)
  await page.getByRole('button', { name: 'Approve the report' }).click()
  await expect(page.getByText('Approved, not signed')).toBeVisible({ timeout: 90_000 })
}

export async function signReport(page: Page, report: string, person: Person): Promise<void> {
  await page.goto(report)
  await page.getByLabel('Your password').fill(person.password)
  await page.getByLabel('Your signing passphrase').fill(passphrase)
  await page.getByRole('button', { name: 'Sign the report' }).click()
  await expect(page.getByRole('button', { name: 'Sign the report' })).toBeHidden()
  await expectAccessible(page)
}

/** The client downloads the signed file. */
export async function downloadReport(page: Page, report: string): Promise<Buffer> {
  await page.goto(report)
  await expect(page.getByText('Signed and released')).toBeVisible()
  await expectAccessible(page)
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: 'Download the signed report' }).click(),
  ])
  return readFile(await download.path())
}

/** What the public page says of a file. */
export async function checkFile(page: Page, bytes: Buffer, verdict: RegExp): Promise<void> {
  await page.goto('/check')
  const file = { name: 'report.pdf', mimeType: 'application/pdf', buffer: bytes }
  await page.getByLabel('Report to check (PDF)').setInputFiles(file)
  await expect(page.getByRole('region', { name: 'Result of the check' })).toContainText(verdict)
  await expectAccessible(page)
}
