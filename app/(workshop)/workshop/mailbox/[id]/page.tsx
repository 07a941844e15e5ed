import type { Metadata } from 'next'
import { Message } from '@/components/mail/message'
import { PlaceLink } from '@/components/shell/place-link'
import { getMailboxMessage } from '@/lib/mail/mailbox-queries'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'

export const metadata: Metadata = { title: 'A mail', referrer: 'no-referrer' }

export default async function MessagePage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params
  const context = await ownContext(`/workshop/mailbox/${id}`)
  const message = await orNotFound(() => getMailboxMessage(context, id))
  return (
    <main id="main" className="w pg post">
      <p className="crumb">
        <PlaceLink href="/workshop/mailbox">Mailbox</PlaceLink>
      </p>
      <Message message={message} />
    </main>
  )
}
