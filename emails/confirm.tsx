import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { inWords } from './words'

export const confirm: MailKind<TemplateProps['confirm']> = {
  subject: () => 'Confirm your address',
  samples: [{ link: 'https://setup.oskerby.example/confirm-email?token=7t4kq9zmw2', minutes: 2880 }],
  Body: ({ link, minutes, site }) => (
    <Layout
      preview="One press, and your sheets are kept under this address."
      about="Your account"
      because="You get this because someone joined with this address."
      site={site}
    >
      <Head1>Confirm that this address is yours</Head1>
      <Words>
        Someone, most likely you, joined the set-up service with this address. Confirm it, and your preamps, cartridges
        and sheets are kept under it.
      </Words>
      <Action href={link}>Confirm this address</Action>
      <CopyLink href={link} />
      <Note>The link works once, for {inWords(minutes)}. If it was not you, do nothing, and nothing comes of it.</Note>
    </Layout>
  ),
}
