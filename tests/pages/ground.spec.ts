import { expect, test, type Page } from '@playwright/test'
import { expectNoAxeViolations } from '../support/axe'

const MISSING = '/nothing-here'
const pages = ['/', '/check', '/stop', MISSING]

/** Every address the page asks for that is not ours. */
function strayRequests(page: Page, origin: string): string[] {
  const strays: string[] = []
  page.on('request', (request) => {
    const url = request.url()
    if (!url.startsWith('data:') && new URL(url).origin !== origin) strays.push(url)
  })
  return strays
}

/** What the browser refused or complained of. */
function complaints(page: Page): string[] {
  const lines: string[] = []
  page.on('console', (message) => {
    // One page is missing on purpose, and the browser says so.
    const missing = message.location().url.endsWith(MISSING)
    if (message.type() === 'error' && !missing) lines.push(`${message.text()} ${message.location().url}`)
  })
  page.on('pageerror', (error) => lines.push(error.message))
  return lines
}

for (const path of pages) {
  test(`${path} asks nobody else for anything, and the browser refuses none of it`, async ({ page, baseURL }) => {
    const strays = strayRequests(page, baseURL ?? '')
    const said = complaints(page)
    await page.goto(path, { waitUntil: 'load' })
    await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1)
    const fonts = await page.evaluate(async () => {
      await document.fonts.ready
      return [...document.fonts].filter((face) => face.status === 'loaded').map((face) => face.family.replaceAll('"', ''))
    })
    expect(fonts).toContain('Sofia Sans Extra Condensed')
    expect(strays).toEqual([])
    expect(said).toEqual([])
  })

  test(`axe finds nothing on ${path}`, async ({ page }) => {
    await page.goto(path)
    await expectNoAxeViolations(page)
  })

  test(`${path} does not scroll sideways at 320`, async ({ page }) => {
    await page.setViewportSize({ width: 320, height: 640 })
    await page.goto(path)
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320)
  })
}

test('health writes to the database and is never cached', async ({ request }) => {
  const response = await request.get('/api/health')
  expect(response.status()).toBe(200)
  expect(response.headers()['cache-control']).toBe('no-store')
  expect(await response.json()).toEqual({ status: 'ok', database: 'ok' })
})

test('an address with nothing behind it says so, with a way on', async ({ page }) => {
  const response = await page.goto(MISSING)
  expect(response?.status()).toBe(404)
  await expect(page.getByRole('heading', { name: 'There is nothing at this address' })).toBeVisible()
  await page.getByRole('link', { name: 'Go to the front page' }).click()
  await expect(page.getByRole('heading', { name: 'Will this cartridge suit your preamp?' })).toBeVisible()
})

test('the hazard line leads to the three stop cards', async ({ page }) => {
  await page.goto('/')
  await page.getByRole('link', { name: /Stop here/ }).click()
  await expect(page.getByRole('heading', { level: 2 })).toHaveText([
    'Stop. Do not test anything.',
    'Stop. Touch no metal on it.',
    'Stop. It may be the house wiring.',
  ])
})

test('the first Tab offers the way to the content, and takes it', async ({ page }) => {
  await page.goto('/stop')
  await page.keyboard.press('Tab')
  const skip = page.getByRole('link', { name: 'Skip to content' })
  await expect(skip).toBeFocused()
  await expect(skip).toBeInViewport()
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/#main$/)
  await page.keyboard.press('Tab')
  expect(await page.evaluate(() => document.activeElement?.closest('header'))).toBeNull()
})
