import { expect, type Browser, type BrowserContext, type Page } from '@playwright/test'

import type { Watch } from './watch'

export type Person = { readonly name: string; readonly email: string; readonly password: string }

const demoPassword = 'quiet loop small area'

/** The people of the practice that the demo scenario brings. */
export const practice = {
  administrator: { name: 'Maren Holt', email: 'maren.holt@tarnhollow.example', password: demoPassword },
  consultant: { name: 'Edda Quist', email: 'edda.quist@tarnhollow.example', password: demoPassword },
  reviewer: { name: 'Tobias Rehn', email: 'tobias.rehn@tarnhollow.example', password: demoPassword },
} as const satisfies Record<string, Person>

/** Opens a browser of its own for a person, watched for errors. */
export async function browserOf(browser: Browser, watch: Watch): Promise<BrowserContext> {
  const context = await browser.newContext({ viewport: { width: 1280, height: 900 } })
  await watch.over(context)
  return context
}

export async function signIn(page: Page, person: Person): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail address').fill(person.email)
  await page.getByLabel('Password').fill(person.password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).not.toHaveURL(/sign-in/)
}
