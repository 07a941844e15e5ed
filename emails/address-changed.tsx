import { MAKER } from '@/lib/maker/terms'
import type { TemplateProps } from '@/lib/mail/templates'
import type { MailKind } from './kind'
import { Layout } from './layout'
import { Head1, Note, Words } from './parts'

const SAMPLE = { oldAddress: 'ann@oskerby.example', newAddress: 'ann.new@oskerby.example' }

export const addressChanged: MailKind<TemplateProps['address-changed']> = {
  subject: () => 'Your account has a new address',
  samples: [
    { ...SAMPLE, end: 'old' },
    { ...SAMPLE, end: 'new' },
  ],
  Body: ({ end, oldAddress, newAddress, site }) => (
    <Layout
      preview="Both addresses said yes."
      about="Your account"
      because={
        end === 'old'
          ? 'You get this because your account was under this address.'
          : 'You get this because your account is under this address.'
      }
      site={site}
    >
      <Head1>Your account has moved</Head1>
      <Words>
        It was under {oldAddress} and is now under {newAddress}. Sign in with the new one. Our mail goes there from now
        on.
      </Words>
      <Note>If it was not you, write to {MAKER.address} at once, and say when you last signed in yourself.</Note>
    </Layout>
  ),
}
