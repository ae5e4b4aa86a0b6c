import { expect, type Page } from '@playwright/test'

import { expectAccessible } from '../support/accessibility'
import { captureNames } from './engage'

/** Measures the ring of a capture. @returns the address of its run. */
async function measure(page: Page, engagement: string, name: string): Promise<string> {
  await page.goto(`${engagement}/bench`)
  const form = page.getByRole('form', { name: 'Measure the ring of a capture' })
  await form.getByLabel('Capture').selectOption({ label: await optionWith(page, name) })
  await form.getByRole('button', { name: 'Measure' }).click()
  await expect(page).toHaveURL(/\/bench\/runs\//, { timeout: 60_000 })
  await expect(page.getByRole('heading', { level: 2, name: new RegExp(name) })).toBeVisible()
  await expectAccessible(page)
  return page.url()
}

async function optionWith(page: Page, name: string): Promise<string> {
  const options = await page.getByLabel('Capture').locator('option').allTextContents()
  return options.find((option) => option.includes(name)) ?? name
}

/** Takes an input from a stored run: the option whose text matches. */
async function take(page: Page, input: string, words: RegExp): Promise<void> {
  const select = page.getByLabel(`Take ${input} from`)
  const options = await select.locator('option').allTextContents()
  const option = options.find((text) => words.test(text))
  if (!option) throw new Error(`Nothing to take ${input} from in: ${options.join(' | ')}`)
  await select.selectOption({ label: option })
}

const entry = (page: Page, input: string) =>
  page.getByRole('group', { name: input, exact: true }).getByRole('textbox').first()

async function run(page: Page, title: string): Promise<void> {
  await page.getByRole('button', { name: 'Run the method' }).click()
  await expect(page).toHaveURL(/\/bench\/runs\//, { timeout: 60_000 })
  await expect(page.getByRole('heading', { level: 2, name: title })).toBeVisible()
  await expectAccessible(page)
}

/** A result as the page shows it, in the unit that it shows it in. */
async function shown(page: Page, label: string, unit: string): Promise<number> {
  const text = await page.locator('main').innerText()
  const found = new RegExp(`${label}[^\\n]*\\n?[^\\d\\n]*[\\s\\S]{0,40}?(\\d+(?:\\.\\d+)?)\\s*${unit}`).exec(
    text,
  )?.[1]
  if (!found) throw new Error(`The page shows no ${label} in ${unit}`)
  return Number(found)
}

/** From two captures to the parasitics and a snubber; every input but the added part is picked, not typed. */
export async function analyse(page: Page, engagement: string): Promise<void> {
  await page.goto(`${engagement}/bench`)
  await expectAccessible(page)
  await measure(page, engagement, captureNames.bare)
  await expect(page.getByText(/102\.7/).first()).toBeVisible()
  await measure(page, engagement, captureNames.loaded)
  await expect(page.getByText(/64\.1/).first()).toBeVisible()

  await page.goto(`${engagement}/bench/ring-parasitics`)
  await expectAccessible(page)
  await take(page, 'Ring frequency, bare', /o01_bare.*102\.7/)
  await take(page, 'Ring frequency, loaded', /o02_with.*64\.1/)
  await entry(page, 'Added capacitance').fill('470p')
  await run(page, 'Parasitics from two ring frequencies')
  // The truth of the simulated captures is 300 pF and 8 nH; one percent of frequency is about three of capacitance.
  expect(Math.abs((await shown(page, 'Parasitic capacitance', 'pF')) / 300 - 1)).toBeLessThan(0.03)
  expect(Math.abs((await shown(page, 'Parasitic inductance', 'nH')) / 8 - 1)).toBeLessThan(0.03)

  await page.goto(`${engagement}/bench/rc-snubber`)
  await take(page, 'Parasitic inductance', /Parasitic inductance|L/)
  await take(page, 'Parasitic capacitance', /Parasitic capacitance|C/)
  await entry(page, 'Voltage step').fill('12')
  await entry(page, 'Edge of the source').fill('1.5n')
  await entry(page, 'Switching frequency').fill('500k')
  await run(page, 'RC snubber by the exact network')
  await page.getByRole('button', { name: 'Recompute' }).click()
  await expect(page.getByText(/same/i).first()).toBeVisible()
}

/** Attaches what was computed as a finding and publishes it. @returns its address. */
export async function publishFinding(page: Page, engagement: string): Promise<string> {
  await page.goto(`${engagement}/findings/new`)
  await expectAccessible(page)
  await page.getByLabel('Claim').fill('The hot loop of 8 nH rings with 300 pF; 5.1 Ω and 820 pF calm it')
  await page.getByLabel('How much it matters').selectOption({ index: 1 })
  await page
    .getByLabel('What it means')
    .fill('The ring is the resonance of the loop; a snubber across the low-side switch damps it.')
  await page.getByLabel('Confidence').selectOption({ index: 1 })
  await page
    .getByLabel('Other causes it could have')
    .fill('The ground lead of the probe; excluded by a spring.')
  await page
    .getByLabel('The one experiment that would disprove it')
    .fill('A differential probe shows another frequency.')
  for (let position = 0; position < 4; position += 1) {
    await page.locator('#add-run').selectOption({ index: 1 })
  }
  await page.getByLabel('What to do').first().fill('Fit the snubber across the low-side switch')
  await page.getByLabel('Parts and values').first().fill('5.1 Ω 1206 0.25 W; 820 pF C0G 50 V')
  await page.getByLabel('Side effects').first().fill('About 80 mW of heat')
  await page.getByRole('button', { name: 'Save the draft' }).click()
  await expect(page).toHaveURL(/\/findings\/[0-9a-z]{26}$/)
  await page.getByRole('button', { name: 'Publish' }).click()
  await expect(page.getByRole('button', { name: 'Publish' })).toBeHidden()
  await expectAccessible(page)
  return new URL(page.url()).pathname
}

/** The timer runs for a moment; what it measured is posted and debits the client's block. */
export async function postTime(page: Page, engagement: string): Promise<void> {
  await page.goto(`${engagement}/time`)
  await expectAccessible(page)
  const form = page.getByRole('form', { name: 'Timer' })
  await form.getByLabel('Kind of work').selectOption({ label: 'Analysis' })
  await form.getByLabel('What is being done').fill('Measured both captures and sized a snubber')
  await form.getByRole('button', { name: 'Start the timer' }).click()
  const timer = page.getByRole('group', { name: 'Running timer' }).first()
  await expect(timer).toBeVisible()
  await page.reload()
  await expect(timer).toBeVisible()
  await timer.getByRole('button', { name: 'Stop' }).click()
  await expect(timer).toBeHidden()
  await page.getByRole('button', { name: /^Post 6/ }).click()
  await expect(
    page.getByRole('rowheader', { name: 'Measured both captures and sized a snubber' }),
  ).toBeVisible()
  await expectAccessible(page)
}
