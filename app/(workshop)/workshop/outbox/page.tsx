import type { Metadata } from 'next'
import { PressForm } from '@/components/forms/press-form'
import { OutboxTable } from '@/components/mail/outbox-table'
import { Pager } from '@/components/mail/pager'
import { StatusLinks } from '@/components/mail/status-links'
import { PlaceLink } from '@/components/shell/place-link'
import { can } from '@/lib/access/permit'
import { NONE_WORDS } from '@/lib/mail/format'
import { listOutbox } from '@/lib/mail/queries'
import { OUTBOX_STATUSES } from '@/lib/mail/terms'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import { oneParam, type SearchParams } from '@/lib/server/search-params'
import { sendAgainAction, sendAllAgainAction } from './actions'

export const metadata: Metadata = { title: 'Outbox' }

export default async function OutboxPage({ searchParams }: { searchParams: SearchParams }) {
  const context = await ownContext('/workshop/outbox')
  const asked = await oneParam(searchParams, 'status')
  const status = OUTBOX_STATUSES.find((each) => each === asked) ?? 'queued'
  const page = Number(await oneParam(searchParams, 'page'))
  const { rows, pages, counts, server, ...view } = await orNotFound(() => listOutbox(context, { status, page }))
  const mayPress = can(context.actor, 'outbox:send-again')
  const waiting = status === 'queued' || status === 'given_up'
  return (
    <main id="main" className="w pg post">
      <h1>Outbox</h1>
      {server ? (
        <p>Mail goes out through {server}. What it does not take is tried again, for four days or until its link runs out.</p>
      ) : (
        <p>
          No mail server is set, so nothing goes out: every mail is kept{' '}
          {can(context.actor, 'mailbox:read') ? <PlaceLink href="/workshop/mailbox">in the mailbox here</PlaceLink> : 'in the mailbox here'}.
        </p>
      )}
      <StatusLinks chosen={status} counts={counts} />
      {mayPress && waiting && rows.length > 1 && (
        <PressForm action={sendAllAgainAction} values={{ status }}>
          Try all of them now
        </PressForm>
      )}
      {rows.length > 0 ? (
        <OutboxTable rows={rows} status={status} sendAgain={mayPress ? sendAgainAction : undefined} />
      ) : (
        <p className="note">{NONE_WORDS[status]}</p>
      )}
      <Pager page={view.page} pages={pages} pathOf={(to) => `/workshop/outbox?status=${status}&page=${to}`} />
    </main>
  )
}
