import 'server-only'
import { render, toPlainText } from '@react-email/render'
import { MAIL_KINDS } from '@/emails/all'
import type { MailKind } from '@/emails/kind'
import { TEMPLATE_PROPS, type TemplateProps } from './templates'
import type { TemplateName } from './terms'

/** A mail as it goes out: one heading, two bodies that say the same. */
export interface RenderedMail {
  subject: string
  html: string
  plain: string
}

/** Headings keep their small letters: words in capitals are spelt out by some screen readers. */
const PLAIN = [
  ...['h1', 'h2', 'h3'].map((selector) => ({ selector, options: { uppercase: false } })),
  { selector: '[data-text-format="dataTable"]', format: 'dataTable', options: { uppercaseHeaderCells: false } },
]

/**
 * Writes a mail.
 * @param props JSON as it stands in the outbox
 * @param site scheme, host and port that the mail's own links lead to
 * @throws ZodError when the props are not those of the template, such as after an update that changed them
 */
export async function renderMail<Name extends TemplateName>(template: Name, props: string, site: string): Promise<RenderedMail> {
  const known = TEMPLATE_PROPS[template].parse(JSON.parse(props)) as TemplateProps[Name]
  return renderKind(MAIL_KINDS[template], known, site)
}

export async function renderKind<Props>({ subject, Body }: MailKind<Props>, props: Props, site: string): Promise<RenderedMail> {
  const html = await render(Body({ ...props, site }))
  return { subject: subject(props), html, plain: toPlainText(html, { selectors: PLAIN }).trim() }
}
