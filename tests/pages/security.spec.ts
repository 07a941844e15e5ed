import { expect, test } from '@playwright/test'

test('every page comes with its policies, and a nonce that is used once', async ({ request }) => {
  const nonces = new Set<string>()
  for (const path of ['/', '/', '/stop']) {
    const response = await request.get(path)
    const headers = response.headers()
    const policy = headers['content-security-policy']
    const scripts = policy.split('; ').find((part) => part.startsWith('script-src')) ?? ''
    expect(scripts).not.toContain('unsafe-inline')
    expect(scripts).not.toContain('unsafe-eval')
    expect(policy).not.toContain('unsafe-inline')
    expect(policy).toContain("object-src 'none'")
    expect(policy).toContain("base-uri 'none'")
    expect(policy).toContain("form-action 'self'")
    expect(policy).toContain("frame-ancestors 'none'")
    const nonce = /'nonce-([^']+)'/.exec(scripts)?.[1] ?? ''
    expect(nonce.length).toBeGreaterThan(20)
    nonces.add(nonce)

    const html = await response.text()
    const scriptTags = html.match(/<script\b[^>]*>/g) ?? []
    expect(scriptTags.length).toBeGreaterThan(0)
    for (const tag of scriptTags) expect(tag).toContain(`nonce="${nonce}"`)
    expect(html).not.toMatch(/<style\b|\sstyle="/)

    expect(headers['x-content-type-options']).toBe('nosniff')
    expect(headers['x-frame-options']).toBe('DENY')
    expect(headers['referrer-policy']).toBe('same-origin')
    expect(headers['permissions-policy']).toContain('camera=()')
    expect(headers['cross-origin-opener-policy']).toBe('same-origin')
    expect(headers['x-powered-by']).toBeUndefined()
  }
  expect(nonces.size).toBe(3)
})

test('the address of a sheet travels nowhere', async ({ request }) => {
  for (const path of ['/sheets/no-such-code', '/api/sheets/no-such-code']) {
    expect((await request.get(path)).headers()['referrer-policy']).toBe('no-referrer')
  }
})

test('markup that slipped into a page runs no script', async ({ page }) => {
  const mark = "document.documentElement.dataset.intruder = 'yes'"
  await page.route('/stop', async (route) => {
    const response = await route.fetch()
    const html = await response.text()
    const slipped = `<script>${mark}</script><img src="/none.png" onerror="${mark}"></main>`
    await route.fulfill({ response, body: html.replace('</main>', slipped) })
  })
  const failed = page.waitForResponse('/none.png')
  await page.goto('/stop', { waitUntil: 'load' })
  await failed
  expect(await page.evaluate(() => document.documentElement.dataset.intruder ?? 'nothing ran')).toBe('nothing ran')
})

test('choosing a look sends nobody to another site', async ({ request }) => {
  for (const back of ['https://example.org/', '//example.org/', '/\\example.org', 'javascript:alert(1)']) {
    const response = await request.post('/theme', { form: { theme: 'dark', back }, maxRedirects: 0 })
    expect(response.status()).toBe(303)
    expect(response.headers().location).toBe('/')
  }
})
