import { fileURLToPath } from 'node:url'

import { expect, type Page } from '@playwright/test'

import { expectAccessible } from '../support/accessibility'

const capture = (name: string): string =>
  fileURLToPath(new URL(`../../reference/captures/${name}`, import.meta.url))

export const captureNames = { bare: 'o01_bare.csv', loaded: 'o02_with_cadd_470pF.csv' } as const

/** The purchaser opens an engagement with a brief. @returns its path. */
export async function openEngagement(page: Page): Promise<string> {
  await page.goto('/engagements/new')
  await expectAccessible(page)
  await page.getByLabel('Title').fill('Servo drive rings at 103 MHz')
  await page.getByLabel('Product').fill('SD-48 servo drive, board revision C')
  await page.getByLabel('Symptom').fill('The switch node rings after the rising edge; class B fails by 4 dB.')
  await page.getByLabel('Standard').fill('CISPR 32')
  await page.getByLabel('Class').fill('B')
  await page.getByLabel('Input voltage').fill('12')
  await page.getByLabel('Switching frequency').fill('a lot')
  await page.getByRole('button', { name: 'Open the engagement' }).click()
  // A refused form says what is wrong and keeps what was typed.
  await expect(page.locator('main').getByRole('alert')).toBeVisible()
  await expect(page.getByLabel('Title')).toHaveValue('Servo drive rings at 103 MHz')
  await page.getByLabel('Switching frequency').fill('500k')
  await page.getByRole('button', { name: 'Open the engagement' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'Servo drive rings at 103 MHz' })).toBeVisible()
  await expect(page).toHaveURL(/\/engagements\/[0-9a-z]{26}$/)
  await expectAccessible(page)
  return new URL(page.url()).pathname
}

/** Two captures are dropped in, read, plotted and described. */
export async function sendCaptures(page: Page, engagement: string): Promise<void> {
  await page.goto(`${engagement}/evidence`)
  await expectAccessible(page)
  await page
    .locator('input[type=file]')
    .first()
    .setInputFiles([capture(captureNames.bare), capture(captureNames.loaded)])
  for (const name of Object.values(captureNames)) {
    await expect(page.getByRole('link', { name })).toBeVisible({ timeout: 60_000 })
  }
  await page.getByRole('link', { name: captureNames.bare }).click()
  await expect(page.getByRole('heading', { name: captureNames.bare })).toBeVisible()
  await expect(page.locator('canvas').first()).toBeVisible()
  await expectAccessible(page)
  await stateFacts(page)
  await page.goto(`${engagement}/evidence`)
  await page.getByRole('link', { name: captureNames.loaded }).click()
  await expect(page.locator('canvas').first()).toBeVisible()
  await stateFacts(page)
}

async function stateFacts(page: Page): Promise<void> {
  await page.getByLabel('Bandwidth').fill('1 GHz')
  await page.getByLabel('Probe attenuation').fill('10')
  await page.getByLabel('Probe capacitance').fill('1p')
  await page.getByLabel('Ground of the probe').selectOption({ index: 1 })
  await page.getByLabel('Where it was probed').fill('Switch node, at the low-side drain')
  await page.getByLabel('Operating condition').fill('12 V in, full load')
  await page.getByRole('button', { name: 'Save the facts' }).click()
  await expect(page.getByText('Saved. What the capture can support was worked out again.')).toBeVisible()
}

/** The administrator puts both consultants on it. */
export async function assignConsultants(
  page: Page,
  engagement: string,
  names: readonly string[],
): Promise<void> {
  await page.goto(engagement)
  for (const name of names) {
    const form = page.getByRole('form', { name: 'Assign a consultant' })
    if (!(await form.isVisible())) await page.locator('summary', { hasText: 'Assign a consultant' }).click()
    await form.getByLabel('Person').selectOption({ label: name })
    await form.getByRole('button', { name: 'Assign a consultant' }).click()
    await expect(page.getByRole('listitem').filter({ hasText: name }).first()).toBeVisible()
  }
}

/** The consultant writes a scope with an hour cap and proposes it. */
export async function proposeScope(page: Page, engagement: string): Promise<void> {
  await page.goto(engagement)
  await page.getByLabel('What will be done').fill('Find the cause of the ring and size a snubber for it.')
  await page.getByLabel('Hour cap').fill('8')
  await page.getByRole('button', { name: 'Save the draft' }).click()
  await page.getByRole('button', { name: 'Propose version 1' }).click()
  await expect(page.getByRole('button', { name: 'Propose version 1' })).toBeHidden()
  await expectAccessible(page)
}

/** The purchaser approves it. */
export async function approveScope(page: Page, engagement: string): Promise<void> {
  await page.goto(engagement)
  await page.getByRole('button', { name: 'Approve version 1' }).click()
  await expect(page.getByRole('button', { name: 'Approve version 1' })).toBeHidden()
  await expectAccessible(page)
}
