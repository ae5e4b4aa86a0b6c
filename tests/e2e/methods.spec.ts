import { expect, test } from '@playwright/test'

import { expectAccessible } from './support/accessibility'
import { browserOf, practice, signIn } from './support/people'
import { Watch } from './support/watch'

test('the methods of the practice can be read, each with an example computed live', async ({ browser }) => {
  test.setTimeout(300_000)
  const watch = new Watch()
  const page = await (await browserOf(browser, watch)).newPage()
  await signIn(page, practice.consultant)
  await page.getByRole('link', { name: 'Methods', exact: true }).first().click()
  await expect(page.getByRole('heading', { level: 1, name: 'Methods' })).toBeVisible()
  await expectAccessible(page)

  await page.getByRole('link', { name: 'RCD clamp of a flyback' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'RCD clamp of a flyback' })).toBeVisible()
  // 0.5 · 3 µH · (1.8 A)² · 100 kHz · 180 V/(180 V − 100 V) = 1.0935 W.
  await expect(page.getByRole('row', { name: /Heat in the clamp/ })).toContainText('1.09')
  await expect(page.getByText('npm run --silent compute -- rcd-clamp -')).toBeVisible()
  await expectAccessible(page)
  watch.expectNothing()
})
