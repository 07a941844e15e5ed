import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { day, dayAndTime } from './words'

export const deletionAsked: MailKind<TemplateProps['deletion-asked']> = {
  subject: ({ deletesAt }) => `Your account goes on ${day(deletesAt)}`,
  samples: [{ link: 'https://setup.oskerby.example/account', deletesAt: Date.UTC(2026, 2, 13, 10, 30) }],
  Body: ({ link, deletesAt, site }) => (
    <Layout
      preview="Until then everything is kept, and you can change your mind."
      about="Your account"
      because="You get this because your account is under this address."
      site={site}
    >
      <Head1>Your account goes on {day(deletesAt)}</Head1>
      <Words>
        You asked us to delete your account. It goes on {dayAndTime(deletesAt)}. Until then everything is kept, and you
        can change your mind.
      </Words>
      <Action href={link}>Keep my account</Action>
      <CopyLink href={link} />
      <Note>If you did not ask for this, keep your account, sign out everywhere, and choose a new password.</Note>
    </Layout>
  ),
}
