import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { inWords } from './words'

type Props = TemplateProps['invitation']

const WORK: Record<Props['role'], string> = {
  staff: 'You would be staff: the people who look at owners’ sheets and answer them.',
  admin: 'You would be an admin: staff who also let people in and look after the service. An admin signs in with a second factor.',
}

const LINK = 'https://setup.oskerby.example/invitation?token=7t4kq9zmw2'

export const invitation: MailKind<Props> = {
  subject: ({ invitedBy }) => `${invitedBy} invites you to the workshop`,
  samples: [
    { link: LINK, minutes: 10_080, invitedBy: 'Davi', role: 'staff' },
    { link: LINK, minutes: 10_080, invitedBy: 'Davi', role: 'admin' },
  ],
  Body: ({ link, minutes, invitedBy, role, site }) => (
    <Layout
      preview={`Join within ${inWords(minutes)}.`}
      about="The workshop"
      because={`You get this because ${invitedBy} invited this address.`}
      site={site}
    >
      <Head1>{invitedBy} invites you to the workshop</Head1>
      <Words>{WORK[role]}</Words>
      <Action href={link}>Join the workshop</Action>
      <CopyLink href={link} />
      <Note>
        The link works once, for {inWords(minutes)}. It is meant for you alone, so do not pass it on. If you expected
        nothing like this, do nothing.
      </Note>
    </Layout>
  ),
}
