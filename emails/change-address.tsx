import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Action, CopyLink, Head1, Note, Words } from './parts'
import { inWords } from './words'

const SAMPLE = {
  oldAddress: 'ann@oskerby.example',
  newAddress: 'ann.new@oskerby.example',
  link: 'https://setup.oskerby.example/change-address/old?token=7t4kq9zmw2',
  minutes: 2880,
}

/** The new address may be a stranger's, mistyped: it is not told what the old one is. */
export const changeAddress: MailKind<TemplateProps['change-address']> = {
  subject: ({ end }) => (end === 'old' ? 'Is your account to move to another address?' : 'Confirm your new address'),
  samples: [
    { ...SAMPLE, end: 'old' },
    { ...SAMPLE, end: 'new' },
  ],
  Body: ({ end, newAddress, link, minutes, site }) => (
    <Layout
      preview="Nothing changes until both addresses have said yes."
      about="Your account"
      because={
        end === 'old'
          ? 'You get this because your account is under this address.'
          : 'You get this because someone wants to move an account to this address.'
      }
      site={site}
    >
      <Head1>{end === 'old' ? 'Is your account to move?' : 'Confirm your new address'}</Head1>
      <Words>
        {end === 'old'
          ? `Someone, most likely you, asked to move your account to ${newAddress}. Nothing changes until this address and the new one have both said yes.`
          : 'Someone, most likely you, asked to move an account to this address. Nothing changes until the old address and this one have both said yes.'}
      </Words>
      <Action href={link}>{end === 'old' ? 'Yes, move it' : 'Confirm this address'}</Action>
      <CopyLink href={link} />
      <Note>
        The link works once, for {inWords(minutes)}.{' '}
        {end === 'old'
          ? 'If it was not you, do not press it: sign in and choose a new password.'
          : 'If it was not you, do nothing, and nothing comes of it.'}
      </Note>
    </Layout>
  ),
}
