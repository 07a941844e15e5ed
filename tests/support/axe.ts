import AxeBuilder from '@axe-core/playwright'
import { expect, type Page } from '@playwright/test'

/** Fails with what axe finds on the page as it stands, in the light and in the dark. */
export async function expectNoAxeViolations(page: Page) {
  for (const colorScheme of ['light', 'dark'] as const) {
    await page.emulateMedia({ colorScheme })
    const { violations } = await new AxeBuilder({ page }).analyze()
    const found = violations.map(({ id, nodes }) => ({ id, at: nodes.map(({ target }) => target.join(' ')) }))
    expect(found, `axe, ${colorScheme}`).toEqual([])
  }
  await page.emulateMedia({ colorScheme: null })
}
