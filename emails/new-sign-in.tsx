import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { dayAndTime } from './words'

const WAYS = { password: 'with your password', link: 'with a link sent by mail' } as const

const SAMPLE = { link: 'https://setup.oskerby.example/account', at: Date.UTC(2026, 2, 6, 10, 30), browser: 'Firefox on Linux' }

export const newSignIn: MailKind<TemplateProps['new-sign-in']> = {
  subject: () => 'A new sign-in to your account',
  samples: [
    { ...SAMPLE, way: 'password' },
    { ...SAMPLE, way: 'link' },
  ],
  Body: ({ link, at, browser, way, site }) => (
    <Layout
      preview="If it was you, there is nothing to do."
      about="Your account"
      because="You get this because your account is under this address."
      site={site}
    >
      <Head1>Someone signed in from a new browser</Head1>
      <Words>
        {dayAndTime(at)}, {WAYS[way]}, from {browser}. If it was you, there is nothing to do.
      </Words>
      <Action href={link}>See who is signed in</Action>
      <CopyLink href={link} />
      <Note>If it was not you, sign out everywhere there, and choose a new password.</Note>
    </Layout>
  ),
}
