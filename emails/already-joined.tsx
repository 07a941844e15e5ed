import { Link } from '@react-email/components'
import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { link as linkStyle } from './styles'

export const alreadyJoined: MailKind<TemplateProps['already-joined']> = {
  subject: () => 'You have an account already',
  samples: [{ link: 'https://setup.oskerby.example/sign-in', resetLink: 'https://setup.oskerby.example/reset-password' }],
  Body: ({ link, resetLink, site }) => (
    <Layout
      preview="Nothing was changed. Sign in as you did before."
      about="Your account"
      because="You get this because someone joined with this address."
      site={site}
    >
      <Head1>You have an account already</Head1>
      <Words>
        Someone, most likely you, joined with this address, and it has an account. Nothing was changed. Sign in with
        your password, or with a link that we send you by mail.
      </Words>
      <Action href={link}>Sign in</Action>
      <CopyLink href={link} />
      <Note>
        If it was not you, do nothing. Password forgotten?{' '}
        <Link className="act" href={resetLink} style={linkStyle}>
          Choose a new password
        </Link>
      </Note>
    </Layout>
  ),
}
