import { expect, test, type Page } from '@playwright/test'

const paper = (page: Page) => page.evaluate(() => getComputedStyle(document.body).backgroundColor)
// The two papers of tailwind.config.ts.
const LIGHT = 'rgb(233, 236, 230)'
const DARK = 'rgb(27, 21, 30)'

test('the look follows the device until one is chosen, then stays as chosen', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'dark' })
  await page.goto('/stop')
  expect(await paper(page)).toBe(DARK)

  const kept = page.waitForResponse((response) => new URL(response.url()).pathname === '/theme')
  await page.getByRole('button', { name: 'Light' }).click()
  await kept
  expect(await paper(page)).toBe(LIGHT)
  await page.reload()
  expect(await paper(page)).toBe(LIGHT)
  await expect(page.getByRole('button', { name: 'Light' })).toHaveAttribute('aria-pressed', 'true')

  const undone = page.waitForResponse((response) => new URL(response.url()).pathname === '/theme')
  await page.getByRole('button', { name: 'As the system' }).click()
  await undone
  await page.reload()
  expect(await paper(page)).toBe(DARK)
})

test('paper is white and the words dark, whatever the screen shows', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'dark', media: 'print' })
  await page.goto('/stop')
  expect(await paper(page)).toBe('rgb(255, 255, 255)')
})

test.describe('without script', () => {
  test.use({ javaScriptEnabled: false })

  test('the pages are there, and the look can be chosen from where one is', async ({ page }) => {
    await page.goto('/stop?from=here')
    await expect(page.getByText('Call an electrician.')).toBeVisible()
    await page.getByRole('button', { name: 'Dark' }).click()
    await expect(page).toHaveURL(/\/stop\?from=here$/)
    await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark')
  })
})
