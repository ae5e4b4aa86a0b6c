import { expect, type APIRequestContext, type Page } from '@playwright/test'

import { expectAccessible } from '../support/accessibility'
import { linkIn, mailTo } from '../support/mail'
import { signIn, type Person } from '../support/people'

export const company = 'Brackwater Drives'

/** The administrator invites a company by the address of its purchaser. */
export async function inviteCompany(page: Page, purchaser: Person): Promise<void> {
  await page.goto('/clients')
  await expectAccessible(page)
  await page.getByLabel('Company', { exact: true }).fill(company)
  await page.getByLabel('E-mail address of its purchaser').fill(purchaser.email)
  await page.getByRole('button', { name: 'Send the invitation' }).click()
  await expect(page.getByText('The invitation is on its way.')).toBeVisible()
}

/** The purchaser follows the invitation, sets a password by the mailed link, signs in and accepts the terms. */
export async function join(page: Page, request: APIRequestContext, purchaser: Person): Promise<void> {
  const invitation = await mailTo(request, purchaser.email, /\/invitation\//)
  await page.goto(linkIn(invitation, '/invitation/'))
  await expect(page.getByText(company)).toBeVisible()
  await expectAccessible(page)
  await page.getByRole('button', { name: 'Mail me the link' }).click()
  await expect(page.getByText('The link is on its way.')).toBeVisible()
  const link = linkIn(await mailTo(request, purchaser.email, /\/set-password\//), '/set-password/')
  await page.goto(link)
  await expectAccessible(page)
  await page.getByLabel('Your name').fill(purchaser.name)
  await page.getByLabel('New password').fill(purchaser.password)
  await page.getByRole('button', { name: 'Set the password' }).click()
  await expect(page).toHaveURL(/sign-in/)
  await expectAccessible(page)
  await signIn(page, purchaser)
  await expect(page.getByRole('heading', { name: 'Confidentiality terms' })).toBeVisible()
  await expectAccessible(page)
  await page.getByLabel('Your full name').fill(purchaser.name)
  await page.getByRole('button', { name: 'Accept the terms' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Engagements' })).toBeVisible()
  await page.goto(link)
  await expect(page.getByText('This link cannot be used').first()).toBeVisible()
}
