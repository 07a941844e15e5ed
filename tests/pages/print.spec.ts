import { expect, test, type Page } from '@playwright/test'
import { CHECKS, makeSheet } from '../support/sheets'

/** Pages of a PDF: each is an object of that type (ISO 32000-1, 7.7.3.3). */
const pagesIn = (pdf: Buffer) => [...pdf.toString('latin1').matchAll(/\/Type\s*\/Page\b(?!s)/g)].length

const print = (page: Page) => page.pdf({ preferCSSPageSize: true, printBackground: true })

for (const [form, answers] of Object.entries(CHECKS)) {
  test(`a sheet prints on one page of A4: ${form}`, async ({ page, request }) => {
    await page.goto((await makeSheet(request, answers)).path)
    const pdf = await print(page)
    expect(pagesIn(pdf)).toBe(1)
    // 210 by 297 mm in points.
    expect(pdf.toString('latin1')).toMatch(/\/MediaBox\s*\[0 0 59[45](\.\d+)? 84[12](\.\d+)?\]/)
  })
}

test('on paper: the caution whole, both banks, the code and a square to point a phone at, and nothing to press', async ({ page, request }) => {
  const { path, code, number } = await makeSheet(request, CHECKS.changes)
  await page.goto(path)
  await page.emulateMedia({ media: 'print' })
  await expect(page.getByRole('note').filter({ hasText: 'Caution: amplifier off before you move a switch' })).toContainText(
    'A switch moved while it is on can be very loud.',
  )
  await expect(page.getByText('Switch 7 to OFF')).toBeVisible()
  await expect(page.locator('svg.panel:visible')).toHaveCount(1)
  await expect(page.getByText(`Sheet ${number}, revision A`)).toBeVisible()
  await expect(page.getByText(`Code ${code}`)).toBeVisible()
  await expect(page.locator('.pfoot svg.qr')).toBeVisible()
  await expect(page.locator('button:visible, a.b:visible, nav:visible')).toHaveCount(0)
})
