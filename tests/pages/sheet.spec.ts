import { expect, test, type Page } from '@playwright/test'
import { expectNoAxeViolations } from '../support/axe'
import { CHECKS, makeSheet } from '../support/sheets'

/** Goes to a sheet and waits until its drawings took the width they have: from then on they can be pressed. */
async function open(page: Page, path: string) {
  await page.goto(path)
  await expect(page.locator('.fit[data-measured]').first()).toBeAttached()
}

const caution = (page: Page, title: string) => page.getByRole('note').filter({ hasText: title })
const SWITCH_CAUTION = 'Caution: amplifier off before you move a switch'

test('a sheet says what to move, with the whole caution before it', async ({ page, request }) => {
  const { path, number, code } = await makeSheet(request, CHECKS.changes)
  await page.goto(path)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('It suits, once you move two switches.')
  await expect(page.getByText('Switch 1 to OFF')).toBeVisible()
  await expect(page.getByText('Switch 7 to OFF')).toBeVisible()
  await expect(caution(page, SWITCH_CAUTION)).toContainText('Preamp on and settled, amplifier on last, volume up slowly.')
  await expect(page.getByRole('heading', { name: `To say on the phone: ${number}` })).toBeVisible()
  await expect(page.getByText(code, { exact: true })).toBeVisible()
  await expect(page.getByText(/Reckoned from printed data: an electrical match, not a promise\. Rules, version \d/).first()).toBeAttached()
})

test('the caution stays in view while its switches are', async ({ page, request }) => {
  await open(page, (await makeSheet(request, CHECKS.changes)).path)
  const box = caution(page, SWITCH_CAUTION)
  const panel = page.getByRole('group', { name: /panel of the Tarn 2/ })
  await panel.evaluate((drawing) => window.scrollTo(0, drawing.getBoundingClientRect().top + window.scrollY - 320))
  await expect(box).toBeInViewport({ ratio: 0.99 })
})

test('flipping a drawn switch moves every figure, and a button brings the advice back', async ({ page, request }) => {
  await open(page, (await makeSheet(request, CHECKS.changes)).path)
  const level = page.locator('section', { has: page.getByText('Figure 2. Level') })
  const before = await level.getByRole('heading').textContent()
  const gain = page.getByRole('switch', { name: /^Switch 1\b/ })
  await gain.focus()
  await page.keyboard.press('Space')
  await expect(gain).toHaveAttribute('aria-checked', 'true')
  await expect(page.getByText('Trying out. Nothing is saved.').first()).toBeVisible()
  await expect(level.getByRole('heading')).not.toHaveText(before ?? '')
  await expect(level).toContainText('over its limit')
  // Nothing is being asked for any more, so nothing is mustard.
  await expect(page.locator('.slot.chg:visible')).toHaveCount(0)
  await expect(page.getByRole('status').filter({ hasText: 'Suits, with a limit' })).toContainText('At worst over by')
  await page.getByRole('button', { name: 'Back to the advice' }).first().click()
  await expect(page.getByText('Trying out. Nothing is saved.')).toHaveCount(0)
  await expect(level.getByRole('heading')).toHaveText(before ?? '')
  await expect(page.locator('.slot.chg:visible').first()).toBeVisible()
})

test('two switches that exclude each other say which to turn first', async ({ page, request }) => {
  await open(page, (await makeSheet(request, CHECKS.changes)).path)
  for (const number of [3, 4]) {
    await page.getByRole('switch', { name: new RegExp(`^Switch ${number}\\b`) }).focus()
    await page.keyboard.press('Enter')
  }
  await expect(page.getByText('Switches 3 and 4 cannot both be ON. Turn 3 off first.').first()).toBeVisible()
  await expect(page.getByRole('switch', { name: /^Switch 4\b/ })).toHaveAttribute('aria-checked', 'false')
})

test('after the moves the next revision asks for none, and the one before can still be read', async ({ page, request }) => {
  await open(page, (await makeSheet(request, CHECKS.changes)).path)
  await page.getByRole('button', { name: 'I have moved them' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('It suits. Leave every switch where it is.')
  await expect(page.getByText('revision B').first()).toBeVisible()
  await page.getByRole('link', { name: /^Revision A, of / }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('It suits, once you move two switches.')
  await expect(page.getByText('This is revision A.')).toBeVisible()
  await expect(page.getByRole('button', { name: 'I have moved them' })).toHaveCount(0)
})

test('a new code opens the sheet, the old one no longer', async ({ page, request }) => {
  const { path, number } = await makeSheet(request, CHECKS.limit)
  await open(page, path)
  await page.getByRole('button', { name: 'Make a new code' }).click()
  await expect(page).not.toHaveURL(path)
  await expect(page).toHaveURL(/\/sheets\/[^/]+$/)
  await expect(page.getByRole('heading', { name: `Sheet ${number}` })).toBeVisible()
  const response = await page.goto(path)
  expect(response?.status()).toBe(404)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('There is no sheet under this code')
})

test('the link is copied', async ({ page, request, context, baseURL }) => {
  await context.grantPermissions(['clipboard-read', 'clipboard-write'])
  const { path } = await makeSheet(request, CHECKS.limit)
  await open(page, path)
  await page.getByRole('button', { name: 'Copy the link' }).click()
  await expect(page.getByRole('status').filter({ hasText: 'Copied' })).toBeVisible()
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(`${baseURL}${path}`)
})

test('an open verdict asks for its number first, and takes it', async ({ page, request }) => {
  await open(page, (await makeSheet(request, CHECKS.open)).path)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('We cannot say yet.')
  await expect(page.getByRole('heading', { name: 'Output of the Brightwater No. 3' })).toBeVisible()
  await expect(page.getByText('Do not measure the coil: a meter can wreck it.')).toBeVisible()
  await expect(caution(page, 'Caution: amplifier off before you pull a load plug')).toBeVisible()
  const box = page.getByRole('textbox', { name: 'Output, mV' })
  await box.fill('a lot')
  await page.getByRole('button', { name: 'Work it out' }).click()
  await expect(page.getByRole('alert').filter({ hasText: /mV|value/ })).toBeVisible()
  await expect(box).toHaveValue('a lot')
  await box.fill('0,4')
  await page.getByLabel('Measured').selectOption('Peak, sideways')
  await page.getByRole('button', { name: 'Work it out' }).click()
  await expect(page.getByText('revision B').first()).toBeVisible()
  await expect(page.getByRole('heading', { level: 1 })).not.toHaveText('We cannot say yet.')
})

test('what does not suit says why and what would, with no hand at the switches', async ({ page, request }) => {
  await page.goto((await makeSheet(request, CHECKS.no)).path)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('It does not suit.')
  await expect(page.getByText(/It is too quiet/).first()).toBeVisible()
  await expect(caution(page, 'Caution: amplifier off before you move a plug')).toBeVisible()
  await expect(page.getByRole('button', { name: 'I have moved them' })).toHaveCount(0)
})

test('another kind of cartridge gets an answer and no figure', async ({ page, request }) => {
  await page.goto((await makeSheet(request, CHECKS.gate)).path)
  await expect(page.getByRole('heading', { level: 1 })).toContainText('a ceramic cartridge is another kind')
  await expect(page.getByText(/^Figure \d/)).toHaveCount(0)
})

test('an answer is changed where it was given, and the sheet keeps its number', async ({ page, request }) => {
  const { path, number, code } = await makeSheet(request, CHECKS.changes)
  await open(page, path)
  await page.getByRole('link', { name: 'Enter it: Inductance' }).click()
  await expect(page).toHaveURL(/\/check\/cartridge\?/)
  expect(new URL(page.url()).searchParams.get('sheet')).toBe(code)
  await open(page, path)
  await page.getByRole('link', { name: 'Start from this sheet' }).click()
  await expect(page).toHaveURL(/\/check\/cartridge\?/)
  const answers = new URL(page.url()).searchParams
  expect([answers.get('sheet'), answers.get('output'), answers.get('preamp')]).toEqual([null, null, 'tarn-2'])
  expect(number).toBeGreaterThan(1000)
})

test('a code is opened as it was typed; a number is told what it is for', async ({ page, request }) => {
  const { path, code, number } = await makeSheet(request, CHECKS.limit)
  await page.goto('/sheets')
  await page.getByRole('textbox', { name: 'The code on the sheet' }).fill(String(number))
  await page.getByRole('button', { name: 'Open the sheet' }).click()
  await expect(page.getByRole('alert').filter({ hasText: 'It opens nothing' })).toBeVisible()
  await page.getByRole('textbox', { name: 'The code on the sheet' }).fill(code.toUpperCase().replaceAll('-', ' '))
  await page.getByRole('button', { name: 'Open the sheet' }).click()
  await expect(page).toHaveURL(path)
})

test('it is kept out of searches, and its address does not travel with a link', async ({ page, request }) => {
  const response = await page.goto((await makeSheet(request, CHECKS.limit)).path)
  expect(response?.headers()['referrer-policy']).toBe('no-referrer')
  await expect(page.locator('meta[name="robots"]')).toHaveAttribute('content', /noindex/)
})

test.describe('without script', () => {
  test.use({ javaScriptEnabled: false })

  test('the sheet is whole: words, drawings, tables, and its forms work', async ({ page, request }) => {
    const { path } = await makeSheet(request, CHECKS.changes)
    await page.goto(path)
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('It suits, once you move two switches.')
    await expect(page.getByText('Switch 7 to OFF')).toBeVisible()
    for (const figure of ['Figure 2. Level', 'Figure 3. Room at each pitch', 'Figure 4. Treble', 'Figure 5. Arm and rumble', 'Figure 6. Noise']) {
      const section = page.locator('section', { has: page.getByText(figure, { exact: true }) })
      await expect(section.locator('svg.plot:visible')).toHaveCount(1)
      await section.locator('summary').click()
      await expect(section.getByRole('table')).toBeVisible()
    }
    await page.locator('summary', { hasText: 'Show all' }).click()
    expect(await page.getByRole('table', { name: 'All other settings' }).getByRole('row').count()).toBeGreaterThan(20)
    await page.getByRole('button', { name: 'I have moved them' }).click()
    await expect(page.getByRole('heading', { level: 1 })).toHaveText('It suits. Leave every switch where it is.')
  })
})

for (const [form, answers] of Object.entries(CHECKS)) {
  test(`axe finds nothing on a sheet: ${form}`, async ({ page, request }) => {
    await page.goto((await makeSheet(request, answers)).path)
    await expectNoAxeViolations(page)
  })

  test(`a sheet does not scroll sideways at 320: ${form}`, async ({ page, request }) => {
    await page.setViewportSize({ width: 320, height: 640 })
    await page.goto((await makeSheet(request, answers)).path)
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320)
  })

  test(`the browser refuses nothing on a sheet: ${form}`, async ({ page, request }) => {
    const said: string[] = []
    page.on('console', (message) => void (message.type() === 'error' && said.push(message.text())))
    page.on('pageerror', (error) => said.push(error.message))
    await page.goto((await makeSheet(request, answers)).path, { waitUntil: 'load' })
    await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1)
    expect(said).toEqual([])
  })
}
