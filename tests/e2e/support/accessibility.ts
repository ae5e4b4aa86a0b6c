import AxeBuilder from '@axe-core/playwright'
import { expect, type Page } from '@playwright/test'

/** axe over the page as it stands, in light and in dark. */
export async function expectAccessible(page: Page): Promise<void> {
  // After a client-side navigation the title arrives a moment after the content.
  await expect(page).toHaveTitle(/\S/)
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' })
    const { violations } = await new AxeBuilder({ page }).analyze()
    const found = violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' | ')}`)
    expect(found, `${page.url()} in ${colorScheme}`).toEqual([])
  }
  await page.emulateMedia({ colorScheme: 'light' })
}
