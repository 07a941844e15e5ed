import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { inWords } from './words'

export const link: MailKind<TemplateProps['link']> = {
  subject: () => 'Your link to sign in',
  samples: [{ link: 'https://setup.oskerby.example/link?token=7t4kq9zmw2', minutes: 20 }],
  Body: ({ link: href, minutes, site }) => (
    <Layout
      preview={`It works once, for ${inWords(minutes)}.`}
      about="Your account"
      because="You get this because someone asked to sign in with this address."
      site={site}
    >
      <Head1>Sign in with this link</Head1>
      <Words>Someone, most likely you, asked for a link to sign in to the set-up service.</Words>
      <Action href={href}>Sign in</Action>
      <CopyLink href={href} />
      <Note>
        The link works once, for {inWords(minutes)}. Whoever has it can sign in as you, so do not pass it on. If you did
        not ask for it, do nothing: without it nobody is signed in.
      </Note>
    </Layout>
  ),
}
