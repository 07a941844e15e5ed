import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { inWords } from './words'

export const reset: MailKind<TemplateProps['reset']> = {
  subject: () => 'Choose a new password',
  samples: [{ link: 'https://setup.oskerby.example/reset-password/new?token=7t4kq9zmw2', minutes: 60 }],
  Body: ({ link, minutes, site }) => (
    <Layout
      preview="Your password stays as it is until you choose another."
      about="Your account"
      because="You get this because someone asked for a new password with this address."
      site={site}
    >
      <Head1>Choose a new password</Head1>
      <Words>
        Someone, most likely you, asked for a new password. The one you have stays as it is until you choose another.
      </Words>
      <Action href={link}>Choose a new password</Action>
      <CopyLink href={link} />
      <Note>
        The link works once, for {inWords(minutes)}. Do not pass it on. If you did not ask for it, do nothing, and
        nothing changes.
      </Note>
    </Layout>
  ),
}
