import { readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'
import { MAIL_KINDS } from '@/emails/all'
import { DARK, LIGHT, ON_SPOT } from '@/emails/inks'
import { ticketFrame } from '@/emails/ticket-frame'
import { inWords } from '@/emails/words'
import { ACT_CAUTIONS, type Act } from '@/lib/cautions/texts'
import { renderKind, renderMail } from '@/lib/mail/render'
import { TEMPLATE_NAMES, type TemplateName } from '@/lib/mail/terms'
import { darkInks, lightInks, ON_SPOT as ON_SPOT_OF_PAGES } from '@/tailwind.config'

const SITE = 'https://setup.oskerby.example'

const samples = TEMPLATE_NAMES.flatMap((name) =>
  MAIL_KINDS[name].samples.map((props, index) => [`${name} ${index + 1}`, name, props] as const),
)

const renderSample = (name: TemplateName, props: object) => renderMail(name, JSON.stringify(props), SITE)

describe.each(samples)('%s', (_title, name, props) => {
  test('both bodies have every link, and nothing that is missing', async () => {
    const { subject, html, plain } = await renderSample(name, props)
    const links = Object.values(props).filter((value): value is string => typeof value === 'string' && value.startsWith('https:'))
    for (const link of [...links, `${SITE}/privacy`]) {
      expect(html).toContain(`href="${link}"`)
      expect(plain).toMatch(new RegExp(`${link.replaceAll(/[.?]/g, '\\$&')}(\\s|$)`))
    }
    expect(subject).toMatch(/^\P{Cc}{5,78}$/u)
    for (const words of [subject, html, plain]) expect(words).not.toMatch(/undefined|null|NaN|Invalid Date|\[object/)
  })

  test('nothing is fetched: no picture, no font, no script, no stylesheet', async () => {
    const { html } = await renderSample(name, props)
    expect(html).not.toMatch(/<(img|script|link|iframe|object|video|audio|form|input)\b/i)
    expect(html).not.toMatch(/url\(|@import|@font-face|srcset|\bsrc=|background=/i)
    const addresses = [...html.matchAll(/https?:\/\/[^"'\s<)]+/g)].map(([address]) => new URL(address).host)
    expect(new Set(addresses.filter((host) => host !== 'www.w3.org'))).toEqual(new Set([new URL(SITE).host]))
  })

  test('light is written out, dark stands in a media query', async () => {
    const { html } = await renderSample(name, props)
    expect(html).toContain('<meta name="color-scheme" content="light dark"')
    expect(html).toContain('@media (prefers-color-scheme: dark)')
    expect(html).toContain(`background-color:${LIGHT.paper}`)
    expect(html).toContain(`.paper { background-color: ${DARK.paper} !important }`)
  })

  test('plain text is words, with no markup and no letters from the preview’s padding', async () => {
    const { plain } = await renderSample(name, props)
    expect(plain).not.toMatch(/<\/?\w|&\w+;|[\u200b-\u200f\ufeff]/)
    expect(plain.startsWith('Oskerby\n')).toBe(true)
  })
})

test('the inks are those of the pages', () => {
  for (const [name, ink] of Object.entries(LIGHT)) expect(ink).toBe(lightInks[`--${name}`])
  for (const [name, ink] of Object.entries(DARK)) expect(ink).toBe(darkInks[`--${name}`])
  expect(ON_SPOT).toBe(ON_SPOT_OF_PAGES)
})

test('what someone typed stays text', async () => {
  const props = { ...MAIL_KINDS.invitation.samples[0], invitedBy: '<b onclick="x()">Davi</b> & Co' }
  const { html, plain, subject } = await renderSample('invitation', props)
  expect(html).not.toContain('<b onclick')
  expect(html).toContain('&lt;b onclick')
  expect(plain).toContain('<b onclick="x()">Davi</b> & Co invites you')
  expect(subject).toContain('<b onclick="x()">Davi</b> & Co')
})

test('props that do not fit, such as those of an older version, are refused', async () => {
  await expect(renderMail('link', '{}', SITE)).rejects.toThrow()
})

test.each([
  [1, '1 minute'],
  [20, '20 minutes'],
  [60, '1 hour'],
  [90, '90 minutes'],
  [1440, '1 day'],
  [2880, '2 days'],
  [10_080, '7 days'],
])('%i minutes are "%s"', (minutes, words) => {
  expect(inWords(minutes)).toBe(words)
})

test('a mail about a ticket carries the caution of each act, whole, before what it is for', async () => {
  const [sample] = ticketFrame.samples
  const acts: Act[] = ['switch', 'plug']
  const { html, plain } = await renderKind(ticketFrame, { ...sample, acts }, SITE)
  for (const act of acts) {
    for (const words of Object.values(ACT_CAUTIONS[act])) {
      expect(plain).toContain(words)
      expect(html).toContain(words)
    }
    expect(plain.indexOf(ACT_CAUTIONS[act].title)).toBeLessThan(plain.indexOf(sample.action.href))
  }
  expect(plain).toContain(sample.heading)
  expect(plain).toMatch(/Loud records +over by 2\.9 dB +3\.1 dB of room/)
})

test('a caution is not retyped in a mail', () => {
  for (const file of ['caution.tsx', 'ticket-frame.tsx', 'layout.tsx']) {
    expect(readFileSync(`emails/${file}`, 'utf8')).not.toMatch(/amplifier off|volume right down/i)
  }
})
