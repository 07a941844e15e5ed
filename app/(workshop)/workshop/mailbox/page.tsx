import type { Metadata } from 'next'
import { MailboxTable } from '@/components/mail/mailbox-table'
import { Pager } from '@/components/mail/pager'
import { listMailbox } from '@/lib/mail/mailbox-queries'
import { ownContext } from '@/lib/server/enter'
import { orNotFound } from '@/lib/server/or-not-found'
import { oneParam, type SearchParams } from '@/lib/server/search-params'

export const metadata: Metadata = { title: 'Mailbox' }

export default async function MailboxPage({ searchParams }: { searchParams: SearchParams }) {
  const context = await ownContext('/workshop/mailbox')
  const to = (await oneParam(searchParams, 'to')).trim() || null
  const asked = Number(await oneParam(searchParams, 'page'))
  const { rows, page, pages } = await orNotFound(() => listMailbox(context, { to, page: asked }))
  return (
    <main id="main" className="w pg post">
      <h1>Mailbox</h1>
      <p>No mail server is set, so every mail is kept here, whoever it is for. Its links can be followed.</p>
      <form className="row" role="search">
        <input className="tx-in" type="search" name="to" defaultValue={to ?? ''} aria-label="To this address" placeholder="To this address" />
        <button className="b" type="submit">
          Find
        </button>
      </form>
      {rows.length > 0 ? <MailboxTable rows={rows} /> : <p className="note">{to ? `Nothing came for ${to}.` : 'Nothing came yet.'}</p>}
      <Pager page={page} pages={pages} pathOf={(next) => `/workshop/mailbox?${new URLSearchParams({ ...(to ? { to } : {}), page: String(next) })}`} />
    </main>
  )
}
