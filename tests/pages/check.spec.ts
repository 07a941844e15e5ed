import { expect, test, type Page } from '@playwright/test'
import { expectNoAxeViolations } from '../support/axe'

const box = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true })
const choice = (page: Page, group: string, name: string) =>
  page.getByRole('radiogroup', { name: group, exact: true }).getByRole('radio', { name, exact: true })
const how = (page: Page, field: string, name: string) => choice(page, `How well is it known: ${field}`, name)
const next = (page: Page, name: string | RegExp) => page.getByRole('button', { name }).last()
const query = (page: Page) => Object.fromEntries(new URL(page.url()).searchParams)
const heading = (page: Page, name: string) => expect(page.getByRole('heading', { level: 1, name })).toBeVisible()

const MAGNET = 'preamp=tarn-2&board=second&type=moving-magnet'
const WHOLE = `${MAGNET}&output=5.4&velocity=5&meaning=peak-lateral&coil=700&inductance=450&load=47&armMass=11&lead=120&next=line`

test('from the preamp to the sheet', async ({ page }) => {
  await page.goto('/check')
  await choice(page, 'Model', 'Tarn 2').check()
  await choice(page, 'How it is set now', 'As it came').check()
  await next(page, 'Next: cartridge').click()

  await heading(page, 'Which cartridge is it?')
  await choice(page, 'Type', 'Moving magnet').check()
  await box(page, 'Output').fill('5,4')
  await choice(page, 'Groove speed beside the output', '5 cm/s').check()
  await box(page, 'Coil resistance').fill('700')
  await how(page, 'Inductance', "Don't know").check()
  await expect(page.getByText('We will use 400 to 550 mH, which is usual for a moving magnet of this output.')).toBeVisible()
  await next(page, 'Next: arm and cable').click()

  await heading(page, 'Which arm and lead?')
  await box(page, 'Effective mass').fill('11')
  await how(page, 'Arm lead', 'By length').check()
  await box(page, 'Arm lead, length').fill('1.2 m')
  await expect(page.getByText('1.2 m of it come to 79 to 120 pF, at what is usual for a metre.')).toBeVisible()
  await next(page, 'Next: plays into').click()

  await heading(page, 'What does it play into?')
  await choice(page, 'What is it?', 'Amplifier').check()
  await next(page, 'Make the sheet').click()
  await expect(page).toHaveURL(/\/sheets\/[^/]+$/)
  await expect(page.getByRole('heading', { level: 1 })).toContainText(/suit|cannot say/)
})

test('with the keyboard alone', async ({ page }) => {
  await page.goto('/check')
  const press = async (...keys: string[]) => {
    for (const key of keys) await page.keyboard.press(key)
  }
  const reach = async (name: RegExp, role: 'radio' | 'textbox' | 'combobox' | 'button') => {
    for (let i = 0; i < 60; i++) {
      const found = page.getByRole(role, { name }).and(page.locator(':focus'))
      if ((await found.count()) > 0) return
      await press('Tab')
    }
    throw new Error(`Tab never reached ${name}`)
  }
  await reach(/Sedge 1/, 'radio')
  await press('ArrowRight')
  await expect(choice(page, 'Model', 'Tarn 2')).toBeChecked()
  await reach(/Next: cartridge/, 'button')
  await press('Enter')

  await heading(page, 'Which cartridge is it?')
  await reach(/^Name$/, 'combobox')
  await page.keyboard.type('calloway wr')
  await expect(page.getByRole('option', { name: /Calloway Wren/ })).toBeVisible()
  await press('ArrowDown')
  await expect(page.getByRole('option', { name: /Calloway Wren/ })).toHaveAttribute('aria-selected', 'true')
  await press('Enter')
  await expect(box(page, 'Output')).toHaveValue('5.4')
  // Enter in a box goes on, whatever fixes stand before it.
  await reach(/^Output$/, 'textbox')
  await press('Enter')
  await heading(page, 'Which arm and lead?')
  await reach(/Next: plays into/, 'button')
  await press('Enter')
  await heading(page, 'What does it play into?')
  await reach(/Make the sheet/, 'button')
  await press('Enter')
  await expect(page).toHaveURL(/\/sheets\//)
})

test.describe('nothing typed is lost', () => {
  test('over a reload, finished or not, right or wrong', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Output').fill('5,')
    await box(page, 'Coil resistance').fill('seven hundred')
    await expect.poll(() => query(page).coil).toBe('seven hundred')
    await page.reload()
    await expect(box(page, 'Output')).toHaveValue('5,')
    await expect(box(page, 'Coil resistance')).toHaveValue('seven hundred')
  })

  test('going back and forward, later steps included', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Output').fill('5.4')
    await next(page, 'Next: arm and cable').click()
    await heading(page, 'Which arm and lead?')
    await box(page, 'Effective mass').fill('11.5')
    await expect.poll(() => query(page).armMass).toBe('11.5')

    await page.goBack()
    await heading(page, 'Which cartridge is it?')
    await expect(box(page, 'Output')).toHaveValue('5.4')
    await box(page, 'Coil resistance').fill('700')
    await next(page, 'Next: arm and cable').click()
    await heading(page, 'Which arm and lead?')
    await expect(box(page, 'Effective mass')).toHaveValue('11.5')
    expect(query(page)).toMatchObject({ output: '5.4', coil: '700', armMass: '11.5' })
  })

  test('in a copied link, on another device', async ({ page, browser, baseURL }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Output').fill('4.5 V')
    await expect.poll(() => query(page).output).toBe('4.5 V')
    const other = await browser.newContext({ baseURL })
    const copied = await other.newPage()
    await copied.goto(page.url())
    await expect(box(copied, 'Output')).toHaveValue('4.5 V')
    await expect(choice(copied, 'Type', 'Moving magnet')).toBeChecked()
    await other.close()
  })

  test('when the connection breaks', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Output').fill('5.4')
    await page.route('**/api/health', (route) => route.abort('internetdisconnected'))
    await next(page, 'Next: arm and cable').click()
    await expect(page.getByText(/^We lost the connection\. Your answers are kept on this/)).toBeVisible()
    await expect(box(page, 'Output')).toHaveValue('5.4')
    await page.unroute('**/api/health')
    await page.getByRole('button', { name: 'Send again' }).click()
    await heading(page, 'Which arm and lead?')
    expect(query(page).output).toBe('5.4')
  })

  test('when the connection breaks just as the sheet is made', async ({ page }) => {
    await page.goto(`/check/plays-into?${WHOLE}`)
    await page.route('**/check/plays-into?**', (route) =>
      route.request().method() === 'POST' ? route.abort('internetdisconnected') : route.continue(),
    )
    await next(page, 'Make the sheet').click()
    await expect(page.getByText(/^We lost the connection\./)).toBeVisible()
    await page.unroute('**/check/plays-into?**')
    await page.getByRole('button', { name: 'Send again' }).click()
    await expect(page).toHaveURL(/\/sheets\//)
  })

  test('when a check is begun anew on the same device', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Output').fill('5.4')
    await expect.poll(() => query(page).output).toBe('5.4')
    await page.goto('/check')
    await page.getByRole('link', { name: 'Carry on with them' }).click()
    await expect(box(page, 'Output')).toHaveValue('5.4')
  })
})

test.describe('wrong input', () => {
  const wrong: [string, string, string, string, string][] = [
    ['Output', '4.5 V', '4.5 V would be a thousand times too strong for a cartridge. Did you mean 4.5 mV?', 'Use 4.5 mV', '4.5 mV'],
    ['Inductance', '0.5', '0.5 mH is a thousand times too little for a moving magnet. Did you mean 0.5 H?', 'Use 0.5 H', '0.5 H'],
    ['Coil resistance', '550-400', 'The second value is lower than the first. Swap them?', 'Swap', '400 to 550'],
    ["Maker's load", '47 ohm', '47 Ω is a thousand times too little for a moving magnet. Did you mean 47 kΩ?', 'Use 47 kΩ', '47 kΩ'],
  ]
  for (const [field, typed, sentence, fix, after] of wrong) {
    test(`${typed} for ${field}`, async ({ page }) => {
      await page.goto(`/check/cartridge?${MAGNET}`)
      await box(page, field).fill(typed)
      await next(page, 'Next: arm and cable').click()
      await expect(page.getByText(sentence)).toBeVisible()
      await heading(page, 'Which cartridge is it?')
      await expect(box(page, field)).toHaveValue(typed)
      await expect(box(page, field)).toHaveAttribute('aria-invalid', 'true')
      await page.getByRole('button', { name: fix, exact: true }).click()
      await expect(box(page, field)).toHaveValue(after)
      await expect(box(page, field)).toBeFocused()
      await expect(page.getByText(sentence)).toBeHidden()
    })
  }

  test('20 g of tracking force, folded away and still found', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}&force=20`)
    await next(page, 'Next: arm and cable').click()
    await expect(page.getByText('20 g would press ten times too hard on the record. Did you mean 20 mN?')).toBeVisible()
    await page.getByRole('button', { name: 'Use 20 mN' }).click()
    await expect(box(page, 'Tracking force')).toHaveValue('20 mN')
  })

  test('two values the wrong way round', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await how(page, "Maker's capacitance", 'Between').check()
    await box(page, "Maker's capacitance").fill('300')
    await box(page, "Maker's capacitance, second value").fill('150')
    await next(page, 'Next: arm and cable').click()
    await page.getByRole('button', { name: 'Swap', exact: true }).click()
    await expect(box(page, "Maker's capacitance")).toHaveValue('150')
    await expect(box(page, "Maker's capacitance, second value")).toHaveValue('300')
  })

  test('no sentence while one is still typing', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}`)
    await box(page, 'Inductance').pressSequentially('0.5')
    await expect(box(page, 'Inductance')).not.toHaveAttribute('aria-invalid', 'true')
    await box(page, 'Inductance').pressSequentially(' H')
    await box(page, 'Inductance').blur()
    await expect(page.getByText('Understood: 500 mH.')).toBeVisible()
  })

  test('a slip on an earlier step is led back to before the sheet is made', async ({ page }) => {
    await page.goto(`/check/plays-into?${MAGNET}&output=4.5+V&next=line`)
    await next(page, 'Make the sheet').click()
    await heading(page, 'Which cartridge is it?')
    await expect(page.getByText(/^4\.5 V would be a thousand times too strong/)).toBeVisible()
  })

  test('without a preamp there is nothing to hold against', async ({ page }) => {
    await page.goto('/check')
    await next(page, 'Next: cartridge').click()
    await expect(page.getByText(/^Choose your preamp first/)).toBeVisible()
    await page.goto('/check/plays-into?type=moving-magnet')
    await next(page, 'Make the sheet').click()
    await heading(page, 'Which preamp is it?')
  })
})

test.describe('the cartridge', () => {
  test('taken from the list fills the leaflet in, and what is changed is the owner’s', async ({ page }) => {
    await page.goto('/check/cartridge?preamp=tarn-2&board=second')
    await page.getByRole('combobox', { name: 'Name', exact: true }).fill('wren')
    await page.getByRole('option', { name: /Calloway Wren/ }).click()
    await expect(page.getByText('Found in our list.')).toBeVisible()
    await expect(box(page, 'Output')).toHaveValue('5.4')
    await expect(box(page, 'Coil resistance')).toHaveValue('700')
    await expect(box(page, "Maker's capacitance, second value")).toHaveValue('300')
    await expect(how(page, 'Inductance', "Don't know")).toBeChecked()
    await expect(page.getByRole('group', { name: 'Coil resistance' }).getByText('As printed, from our list.')).toBeVisible()
    await box(page, 'Coil resistance').fill('710')
    await expect(page.getByRole('group', { name: 'Coil resistance' }).getByText('As printed, from our list.')).toBeHidden()
    await expect(page.getByRole('group', { name: 'Output', exact: true }).getByText('As printed, from our list.')).toBeVisible()
  })

  test('an older answer of the list never takes the place of a newer one', async ({ page }) => {
    await page.route('**/api/catalogue/cartridges?q=w&**', async (route) => {
      const response = await route.fetch().catch(() => null)
      if (response) await route.fulfill({ response }).catch(() => undefined)
    })
    await page.goto('/check/cartridge')
    const name = page.getByRole('combobox', { name: 'Name', exact: true })
    await name.fill('w')
    await name.fill('furrow club')
    await expect(page.getByRole('option')).toHaveCount(1)
    await expect(page.getByRole('option')).toContainText('Furrow Club')
    await name.press('Escape')
    await expect(page.getByRole('listbox')).toBeHidden()
    await expect(name).toHaveValue('furrow club')
  })

  test('is asked what 5 cm/s means where that matters', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}&output=5.4&velocity=5`)
    const asked = page.getByRole('radiogroup', { name: 'What does the leaflet mean by 5 cm/s?' })
    await expect(asked).toBeVisible()
    await expect(page.getByText('If it does not say, we work with 3.8 to 5.4 mV.')).toBeVisible()
    await asked.getByRole('radio', { name: 'RMS, sideways' }).check()
    await expect(page.getByText('Understood: 5.4 mV RMS at 5 cm/s RMS, sideways.')).toBeVisible()
    await expect(page.getByText('That is 3.8 mV at 5 cm/s peak, sideways, where we compare.')).toBeVisible()
  })

  test('of another kind is asked nothing that does not belong to it', async ({ page }) => {
    await page.goto('/check/cartridge?preamp=sedge-1')
    await choice(page, 'Type', 'Something else').check()
    await expect(box(page, 'Output')).toBeHidden()
    await choice(page, 'Which of the three', 'Optical').check()
    await expect(page.getByRole('heading', { name: /optical cartridge is another kind/ })).toBeVisible()
    await choice(page, 'Type', 'Moving coil').check()
    await expect(box(page, 'Output')).toBeVisible()
    await expect(box(page, "Maker's capacitance")).toBeHidden()
  })
})

test('the serial number settles the board and stays nowhere', async ({ page }) => {
  await page.goto('/check?preamp=tarn-2')
  await box(page, 'Serial number').fill('18 205')
  await expect(choice(page, 'Board', 'First board, to serial 18999')).toBeChecked()
  await expect.poll(() => query(page).board).toBe('first')
  await box(page, 'Serial number').fill('19123')
  await expect.poll(() => query(page).board).toBe('second')
  await next(page, 'Next: cartridge').click()
  await heading(page, 'Which cartridge is it?')
  const kept = await page.evaluate(() => JSON.stringify({ ...localStorage, ...sessionStorage }))
  for (const place of [page.url(), kept, await page.content()]) expect(place).not.toMatch(/19123|18205|18 205/)
})

test('the switches as they stand go along', async ({ page }) => {
  await page.goto('/check?preamp=tarn-2&board=second')
  await choice(page, 'How it is set now', 'I can see them').check()
  await page.getByRole('checkbox', { name: /switch 1\b/i }).first().check()
  await expect.poll(() => query(page).left).toBe('bank.10000000')
  expect(query(page)).toMatchObject({ present: 'known', right: 'bank.10000000' })
})

test('what we can say so far narrows with each answer', async ({ page, isMobile }) => {
  await page.goto(`/check/cartridge?${MAGNET}`)
  const soFar = page.getByRole('complementary')
  await expect(soFar.getByRole('heading')).toHaveText('Its output decides the most')
  await box(page, 'Output').fill('5.4')
  await choice(page, 'Groove speed beside the output', '5 cm/s').check()
  await expect(soFar.getByRole('heading')).toHaveText('It will be loud enough')
  await expect(soFar.getByRole('listitem').filter({ hasText: 'Settled:' })).toContainText('5.4 mV')
  await expect(soFar.getByRole('listitem').filter({ hasText: 'Still open:' })).toContainText('inductance')
  await expect(soFar.getByRole('img', { name: /^Treble/ })).toBeVisible()
  if (isMobile) {
    const strip = page.getByRole('link', { name: 'Show', exact: true })
    await expect(strip).toBeInViewport()
    await strip.click()
    await expect(soFar.getByRole('heading')).toBeInViewport()
  }
})

test('a changed answer becomes the next revision of the sheet it came from', async ({ page }) => {
  await page.goto(`/check/plays-into?${WHOLE}`)
  await next(page, 'Make the sheet').click()
  await expect(page).toHaveURL(/\/sheets\//)
  const sheet = page.url()
  await page.getByRole('link', { name: 'Change an answer' }).first().click()
  await heading(page, 'Which preamp is it?')
  await page.getByRole('link', { name: /Plays into/ }).click()
  await heading(page, 'What does it play into?')
  await choice(page, 'What is it?', 'Recorder').check()
  await next(page, 'Make the sheet').click()
  await expect(page).toHaveURL(sheet)
  await expect(page.getByText(/revision B/).first()).toBeVisible()
})

test.describe('without script', () => {
  test.use({ javaScriptEnabled: false })

  test('from the preamp to the sheet', async ({ page }) => {
    await page.goto('/check')
    await choice(page, 'Model', 'Tarn 2').check()
    await page.getByRole('button', { name: 'Show what this model asks' }).click()
    await box(page, 'Serial number').fill('19123')
    await choice(page, 'How it is set now', 'I can see them').check()
    await next(page, 'Next: cartridge').click()
    await heading(page, 'Which cartridge is it?')
    expect(page.url()).not.toContain('19123')
    expect(query(page)).toMatchObject({ board: 'second', present: 'known', left: 'bank.00000000' })

    await page.getByRole('combobox', { name: 'Name', exact: true }).fill('calloway wren')
    await page.getByRole('button', { name: 'Look it up in our list' }).click()
    await expect(box(page, 'Output')).toHaveValue('5.4')
    await box(page, 'Output').fill('4.5 V')
    await how(page, 'Inductance', 'Between').check()
    await box(page, 'Inductance').fill('400')
    await box(page, 'Inductance, second value').fill('550')
    await next(page, 'Next: arm and cable').click()

    await heading(page, 'Which cartridge is it?')
    await expect(page.getByText(/^4\.5 V would be a thousand times too strong/)).toBeVisible()
    await expect(box(page, 'Inductance, second value')).toHaveValue('550')
    await page.getByRole('button', { name: 'Use 4.5 mV' }).click()
    await expect(box(page, 'Output')).toHaveValue('4.5 mV')
    await next(page, 'Next: arm and cable').click()

    await heading(page, 'Which arm and lead?')
    await box(page, 'Effective mass').fill('11')
    await next(page, 'Next: plays into').click()
    await heading(page, 'What does it play into?')
    await choice(page, 'What is it?', 'Amplifier').check()
    await next(page, 'Make the sheet').click()
    await expect(page).toHaveURL(/\/sheets\//)
    await expect(page.getByRole('heading', { level: 1 })).toContainText(/suit|cannot say/)
  })

  test('what can be said so far is there as well', async ({ page }) => {
    await page.goto(`/check/cartridge?${MAGNET}&output=5.4&velocity=5`)
    await expect(page.getByRole('complementary').getByRole('heading')).toHaveText('It will be loud enough')
  })
})

test.describe('every step', () => {
  const steps = [
    '/check?preamp=tarn-2&present=known',
    `/check/cartridge?${MAGNET}&output=4.5+V&force=20&capacitanceHow=between&capacitance=300&capacitanceTo=150&show=all`,
    `/check/arm?${WHOLE}&stepUp=yes&ratio=500&leadAs=metres&show=all`,
    `/check/plays-into?${WHOLE}&wish=0.5&alsoRecorder=10&show=all`,
  ]
  for (const path of steps) {
    const name = path.split('?')[0]
    test(`${name}: axe finds nothing, light or dark`, async ({ page }) => {
      await page.goto(path)
      await expectNoAxeViolations(page)
    })

    test(`${name}: no sideways scroll at 320, one h1, nothing refused by the browser`, async ({ page }) => {
      const said: string[] = []
      page.on('console', (message) => message.type() === 'error' && said.push(message.text()))
      page.on('pageerror', (error) => said.push(error.message))
      await page.setViewportSize({ width: 320, height: 640 })
      await page.goto(path, { waitUntil: 'load' })
      await expect(page.getByRole('heading', { level: 1 })).toHaveCount(1)
      expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320)
      expect(said).toEqual([])
    })
  }
})
