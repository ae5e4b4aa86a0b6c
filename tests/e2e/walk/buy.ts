import { expect, type APIRequestContext, type Page } from '@playwright/test'

import { expectAccessible } from '../support/accessibility'
import { mailTo } from '../support/mail'
import type { Person } from '../support/people'

/** The purchaser buys ten hours by card; the webhook credits them and a receipt arrives. */
export async function buyTenHours(page: Page, request: APIRequestContext, purchaser: Person): Promise<void> {
  await page.goto('/')
  await page.getByRole('link', { name: 'Hours' }).first().click()
  await expect(page.getByText('No hours yet')).toBeVisible()
  await expectAccessible(page)
  await page.getByRole('link', { name: 'Buy hours' }).first().click()
  await expect(page.getByRole('heading', { level: 1, name: 'Buy hours' })).toBeVisible()
  await expectAccessible(page)
  await page
    .getByRole('form', { name: 'Buy: Ten hours' })
    .getByRole('button', { name: 'Pay by card' })
    .click()
  await page.getByRole('button', { name: 'Pay with a card that is declined' }).click()
  await expect(page.getByRole('alert')).toContainText('declined')
  await page.getByRole('button', { name: 'Pay with a card that is accepted' }).click()
  await expect(page.getByText(/10\s*h are credited/)).toBeVisible()
  await expectAccessible(page)
  await page.getByRole('link', { name: 'To your hours' }).click()
  await expect(page.getByText('Bought: Ten hours')).toBeVisible()
  await expectAccessible(page)
  const receipt = await mailTo(request, purchaser.email, /Receipt/i)
  expect(receipt).toMatch(/2,201\.50/)
}
