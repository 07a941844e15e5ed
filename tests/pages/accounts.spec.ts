import { randomUUID } from 'node:crypto'
import { eq } from 'drizzle-orm'
import { expect, test, type Page } from '@playwright/test'
import { Secret, TOTP } from 'otpauth'
import { people } from '@/db/schema/accounts'
import { expectNoAxeViolations } from '../support/axe'
import { linkInMailTo } from '../support/mailbox'
import { pagesDatabase } from '../support/pages'
import { newAccount, signIn } from '../support/sign-in'

const PASSWORD = 'a wren on a tarn'
const newAddress = (name: string) => `${name}-${randomUUID().slice(0, 8)}@brandreth.example`

/** Each test comes from a place of its own: tries are counted by place, and all of these would be one. Addresses of RFC 3849. */
test.use({
  extraHTTPHeaders: async ({}, give) => {
    await give({ 'x-forwarded-for': `2001:db8::${randomUUID().slice(0, 4)}:${randomUUID().slice(0, 4)}` })
  },
})

const press = (page: Page, name: string) => page.getByRole('main').getByRole('button', { name, exact: true }).click()
const masthead = (page: Page) => page.getByRole('banner')

async function join(page: Page, email: string) {
  await page.goto('/join')
  await page.getByLabel('What may we call you?').fill('Hettie')
  await page.getByLabel('Mail address').fill(email)
  await page.getByLabel('Password').fill(PASSWORD)
  await press(page, 'Join')
  await expect(page.getByRole('heading', { level: 1, name: 'Look in your mail' })).toBeFocused()
}

async function signInWithPassword(page: Page, email: string, password: string) {
  await page.goto('/sign-in')
  await page.getByLabel('Mail address').fill(email)
  await page.getByLabel('Password').fill(password)
  await press(page, 'Sign in')
}

/** What an authenticator app would show. A code is taken once, so a later one is asked for by the minute. */
const codeNow = (secret: string, later = 0) => new TOTP({ secret: Secret.fromBase32(secret) }).generate({ timestamp: Date.now() + later })

async function setUpAuthenticator(page: Page): Promise<{ secret: string; codes: string[] }> {
  await press(page, 'Set it up')
  const secret = (await page.locator('b.codes').innerText()).replaceAll(' ', '')
  await page.getByLabel('Six figures that the app shows now').fill(codeNow(secret))
  await press(page, 'Go on')
  await expect(page.getByRole('heading', { name: 'Keep these ten codes' })).toBeVisible()
  return { secret, codes: await page.locator('ol.codes li').allInnerTexts() }
}

test('joining: the mail’s link, the password once more, and one is in; then out, and in again', async ({ page }) => {
  const email = newAddress('hettie')
  await join(page, email)
  await page.goto(await linkInMailTo(email, '/confirm-email'))
  await expect(page.getByText(email)).toBeVisible()
  await page.getByLabel('Password').fill('not the one I chose')
  await press(page, 'Confirm')
  await expect(page.getByText('That is not the password you chose when you joined.')).toBeVisible()
  await page.getByLabel('Password').fill(PASSWORD)
  await press(page, 'Confirm')
  await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()
  await expect(masthead(page).getByRole('link', { name: 'Hettie' })).toBeVisible()

  await page.getByRole('button', { name: 'Sign out', exact: true }).first().click()
  await expect(masthead(page).getByRole('link', { name: 'Sign in' })).toBeVisible()
  await signInWithPassword(page, email, 'not the one I chose')
  await expect(page.getByText('This address and this password do not belong together.')).toBeVisible()
  await expect(page.getByLabel('Mail address')).toHaveValue(email)
  await page.getByLabel('Password').fill(PASSWORD)
  await press(page, 'Sign in')
  await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()
})

test('the form says what is wrong beside the field, before and after it is sent', async ({ page }) => {
  await page.goto('/join')
  await press(page, 'Join')
  await expect(page.getByText('Say what we may call you.')).toBeVisible()
  await expect(page.getByLabel('What may we call you?')).toBeFocused()
  await page.getByLabel('What may we call you?').fill('Hettie')
  await page.getByLabel('Mail address').fill('hettie')
  await page.getByLabel('Password').fill('password1234')
  await press(page, 'Join')
  await expect(page.getByText('Write the whole address')).toBeVisible()
  const email = newAddress('hettie')
  await page.getByLabel('Mail address').fill(email)
  await press(page, 'Join')
  await expect(page.getByText('Many people use this one')).toBeVisible()
  await expect(page.getByLabel('Mail address')).toHaveValue(email)
  await expect(page.getByLabel('Password')).toBeFocused()
})

test('a link by mail signs in and makes the account; looking at it uses nothing up, pressing it does', async ({ page, context }) => {
  const email = newAddress('olan')
  await page.goto('/sign-in')
  await page.getByLabel('Mail address').fill(email)
  await press(page, 'Send me a link')
  await expect(page.getByText(`We have sent a link to ${email}`)).toBeVisible()
  const link = await linkInMailTo(email, '/link')
  for (let k = 0; k < 3; k++) expect((await context.request.get(link)).ok()).toBe(true)
  await page.goto(link)
  await press(page, 'Sign in')
  await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()
  await page.goto(link)
  await expect(page.getByRole('heading', { level: 1, name: 'This link was used already' })).toBeVisible()
  await expect(page.getByRole('link', { name: 'Send a new one' })).toHaveAttribute('href', '/sign-in')
})

test('whoever has to sign in first lands where they wanted to go', async ({ page }) => {
  const email = newAddress('hettie')
  await page.goto('/account')
  await expect(page).toHaveURL(/\/sign-in$/)
  await page.goto('/workshop/people')
  await expect(page).toHaveURL(/\/sign-in\?next=%2Fworkshop%2Fpeople$/)
  await page.goto('/sign-in?next=https://example.org/')
  await page.getByLabel('Mail address').fill(email)
  await expect(page.locator('input[name=next]')).toHaveValue('/account')
})

test('a forgotten password: a new one by link, and the old session is over', async ({ page, context, browser, baseURL }) => {
  const person = await signIn(context)
  await page.goto('/account')
  await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()

  const elsewhere = await (await browser.newContext({ baseURL })).newPage()
  await elsewhere.goto('/reset-password')
  await elsewhere.getByLabel('Mail address').fill(person.email)
  await press(elsewhere, 'Send me a link')
  await expect(elsewhere.getByText('a mail with a link is on its way')).toBeVisible()
  await elsewhere.goto(await linkInMailTo(person.email, '/reset-password/new'))
  await elsewhere.getByLabel('New password').fill(PASSWORD)
  await press(elsewhere, 'Set the new password')
  await expect(elsewhere.getByText('Your new password is set. Sign in with it.')).toBeVisible()
  await elsewhere.getByLabel('Mail address').fill(person.email)
  await elsewhere.getByLabel('Password').fill(PASSWORD)
  await press(elsewhere, 'Sign in')
  await expect(elsewhere.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()

  await page.reload()
  await expect(page).toHaveURL(/\/sign-in$/)
  await elsewhere.context().close()
})

test('another address counts once both ends have said yes', async ({ page, context }) => {
  const person = await signIn(context)
  const email = newAddress('hettie')
  await page.goto('/account')
  await page.getByLabel('New mail address').fill(email)
  await press(page, 'Send both mails')
  await expect(page.getByText('Two mails are on their way')).toBeVisible()
  await page.goto(await linkInMailTo(person.email, '/change-address/old'))
  await press(page, 'Yes, change it')
  await expect(page.getByText('Now follow the link in the other mail as well.')).toBeVisible()
  await page.goto('/account')
  await expect(page.getByText(`Your mail address is ${person.email}.`)).toBeVisible()
  await page.goto(await linkInMailTo(email, '/change-address/new'))
  await press(page, 'Yes, change it')
  await expect(page.getByText(`The address of your account is ${email} now.`)).toBeVisible()
  await page.goto('/account')
  await expect(page.getByText(`Your mail address is ${email}.`)).toBeVisible()
})

test('a name is kept, and the masthead follows', async ({ page, context }) => {
  await signIn(context)
  await page.goto('/account')
  await page.getByLabel('What may we call you?').fill('Hettie B.')
  await press(page, 'Keep this name')
  await expect(page.getByText('Kept.')).toBeVisible()
  await expect(masthead(page).getByRole('link', { name: 'Hettie B.' })).toBeVisible()
})

test('sessions end one by one, and all at once', async ({ page, context, browser, baseURL }) => {
  const person = await signIn(context)
  const other = await browser.newContext({ baseURL })
  await signIn(other, person)
  const elsewhere = await other.newPage()
  await elsewhere.goto('/account')
  await page.goto('/account')
  const rows = page.getByRole('table', { name: 'Where you are signed in' }).getByRole('row')
  await expect(rows.filter({ hasText: 'Firefox on Linux' })).toHaveCount(2)
  await page.getByRole('button', { name: /^Sign out Firefox on Linux/ }).click()
  await expect(rows.filter({ hasText: 'Firefox on Linux' })).toHaveCount(1)
  await elsewhere.reload()
  await expect(elsewhere).toHaveURL(/\/sign-in$/)

  await signIn(other, person)
  await elsewhere.goto('/account')
  await press(page, 'Sign out everywhere')
  await expect(masthead(page).getByRole('link', { name: 'Sign in' })).toBeVisible()
  await elsewhere.reload()
  await expect(elsewhere).toHaveURL(/\/sign-in$/)
  await other.close()
})

test('staff set up an authenticator, sign in with its code, and with a recovery code', async ({ page, context }) => {
  const person = await signIn(context, newAccount({ role: 'staff', name: 'Ruth' }))
  await page.goto('/account')
  await page.getByLabel('New password').fill(PASSWORD)
  await press(page, 'Set the new password')
  await expect(page.getByText('Your new password is set.')).toBeVisible()
  await page.getByRole('link', { name: 'Set it up' }).click()
  const { secret, codes } = await setUpAuthenticator(page)
  expect(codes).toHaveLength(10)
  await page.getByRole('link', { name: 'I have kept them' }).click()
  await expect(page.getByText('10 of 10 recovery codes are left.')).toBeVisible()

  await page.getByRole('button', { name: 'Sign out', exact: true }).first().click()
  await expect(masthead(page).getByRole('link', { name: 'Sign in' })).toBeVisible()
  await signInWithPassword(page, person.email, PASSWORD)
  await expect(page.getByRole('heading', { level: 1, name: 'Code from your authenticator' })).toBeVisible()
  // The password alone opens nothing.
  await page.goto('/account')
  await expect(page.getByRole('heading', { level: 1, name: 'Code from your authenticator' })).toBeVisible()
  await page.getByLabel('Six figures').fill('000000')
  await press(page, 'Go on')
  await expect(page.getByText('That code does not fit, or was used already.')).toBeVisible()
  await page.getByLabel('Six figures').fill(codeNow(secret, 30_000))
  await press(page, 'Go on')
  await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()

  await page.getByRole('button', { name: 'Sign out', exact: true }).first().click()
  await expect(masthead(page).getByRole('link', { name: 'Sign in' })).toBeVisible()
  await signInWithPassword(page, person.email, PASSWORD)
  await page.getByRole('link', { name: 'Use a recovery code' }).click()
  await page.getByLabel('One of the ten').fill(codes[3])
  await press(page, 'Go on')
  await expect(page.getByText('9 of 10 recovery codes are left.')).toBeVisible()
})

test('an admin invites another, who sets up an authenticator before anything else; then closes an account at once', async ({
  page,
  context,
  browser,
  baseURL,
}) => {
  await signIn(context, newAccount({ role: 'admin', name: 'Iris' }))
  await page.goto('/')
  await masthead(page).getByRole('link', { name: 'Workshop' }).click()
  await page.getByRole('link', { name: 'People' }).click()
  const email = newAddress('davi')
  await page.getByLabel('Mail address', { exact: true }).fill(email)
  await page.getByText('Admin', { exact: true }).first().click()
  await press(page, 'Send the invitation')
  await expect(page.getByText(`An invitation is on its way to ${email}.`)).toBeVisible()

  const other = await browser.newContext({ baseURL })
  const theirs = await other.newPage()
  await theirs.goto(await linkInMailTo(email, '/invitation'))
  await theirs.getByLabel('What may we call you?').fill('Davi')
  await theirs.getByLabel('Password').fill(PASSWORD)
  await press(theirs, 'Join the workshop')
  await expect(theirs.getByText('Admins let other people in')).toBeVisible()
  await theirs.goto('/workshop/people')
  await expect(theirs.getByText('Admins let other people in')).toBeVisible()
  await setUpAuthenticator(theirs)
  await theirs.goto('/workshop/people')
  await expect(theirs.getByRole('heading', { level: 1, name: 'People' })).toBeVisible()

  await page.goto(`/workshop/people?text=${encodeURIComponent(email)}`)
  await page.getByRole('combobox', { name: 'Role of Davi' }).selectOption('Staff')
  await page.getByRole('button', { name: 'Change the role of Davi' }).click()
  await expect(page.getByRole('combobox', { name: 'Role of Davi' })).toHaveValue('staff')
  await theirs.reload()
  await expect(theirs).toHaveURL(/\/sign-in/)

  await page.goto(`/workshop/people?text=${encodeURIComponent(email)}`)
  await page.getByRole('button', { name: 'Close the account of Davi' }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'People' })).toBeVisible()
  await signInWithPassword(theirs, email, PASSWORD)
  await expect(theirs.getByText('This account is closed.')).toBeVisible()
  await other.close()
})

test('closing an account ends a session in the middle of things', async ({ page, context }) => {
  const person = await signIn(context)
  await page.goto('/account')
  pagesDatabase().update(people).set({ disabledAt: Date.now() }).where(eq(people.id, person.id)).run()
  await page.getByLabel('What may we call you?').fill('Someone else')
  await press(page, 'Keep this name')
  await expect(page.getByText('Sign in first.')).toBeVisible()
  await page.reload()
  await expect(page).toHaveURL(/\/sign-in$/)
})

test('owners and strangers find no workshop', async ({ page, context, request }) => {
  expect((await request.get('/workshop/people', { maxRedirects: 0 })).status()).toBe(307)
  await signIn(context)
  await page.goto('/')
  await expect(masthead(page).getByRole('link', { name: 'Workshop' })).toHaveCount(0)
  for (const path of ['/workshop', '/workshop/people']) {
    await page.goto(path)
    await expect(page.getByRole('heading', { level: 1, name: 'There is nothing at this address' })).toBeVisible()
  }
})

test('an account is marked to go in a week, and the mark is taken back', async ({ page, context }) => {
  await signIn(context)
  await page.goto('/account')
  await press(page, 'Delete my account')
  await expect(page.getByText('Tick the box first')).toBeVisible()
  await page.getByLabel('Delete my account in a week').check()
  await press(page, 'Delete my account')
  await expect(page.getByText('Your account goes on')).toBeVisible()
  await press(page, 'Keep my account')
  await expect(page.getByLabel('Delete my account in a week')).toBeVisible()
})

test('nothing here is found by a search engine, scrolls sideways, or stands in anyone’s way', async ({ page, context }) => {
  const look = async (path: string) => {
    await page.goto(path)
    await expect(page.locator('meta[name=robots]')).toHaveAttribute('content', /noindex/)
    await expectNoAxeViolations(page)
    expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBe(0)
  }
  await page.setViewportSize({ width: Math.min(page.viewportSize()?.width ?? 1440, 1440), height: 900 })
  for (const path of ['/sign-in', '/join', '/reset-password', '/link?token=none']) await look(path)
  await signIn(context, newAccount({ role: 'admin', name: 'Iris' }))
  for (const path of ['/account', '/account/second-factor', '/workshop', '/workshop/people']) await look(path)
})

test.describe('without script', () => {
  test.use({ javaScriptEnabled: false })

  test('joining, confirming, signing out and in again work, and what was typed stays', async ({ page }) => {
    const email = newAddress('hettie')
    await page.goto('/join')
    await page.getByLabel('What may we call you?').fill('Hettie')
    await page.getByLabel('Mail address').fill(email)
    await page.getByLabel('Password').fill('short')
    await press(page, 'Join')
    await expect(page.getByText('Use at least 10 characters.')).toBeVisible()
    await expect(page.getByLabel('Mail address')).toHaveValue(email)
    await page.getByLabel('Password').fill(PASSWORD)
    await press(page, 'Join')
    await expect(page.getByRole('heading', { level: 1, name: 'Look in your mail' })).toBeVisible()
    await page.goto(await linkInMailTo(email, '/confirm-email'))
    await page.getByLabel('Password').fill(PASSWORD)
    await press(page, 'Confirm')
    await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()
    await page.getByRole('button', { name: 'Sign out', exact: true }).first().click()
    await page.goto('/sign-in')
    await page.getByLabel('Mail address').fill(email)
    await press(page, 'Send me a link')
    await expect(page.getByText(`We have sent a link to ${email}`)).toBeVisible()
    await page.goto(await linkInMailTo(email, '/link'))
    await press(page, 'Sign in')
    await expect(page.getByRole('heading', { level: 1, name: 'Your account' })).toBeVisible()
  })

  test('an authenticator is set up, and its recovery codes are shown', async ({ page, context }) => {
    await signIn(context, newAccount({ role: 'staff', name: 'Ruth' }))
    await page.goto('/account/second-factor')
    const { codes } = await setUpAuthenticator(page)
    expect(codes).toHaveLength(10)
  })
})
