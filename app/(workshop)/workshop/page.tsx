import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { PlaceLink } from '@/components/shell/place-link'
import { can } from '@/lib/access/permit'
import { ownContext } from '@/lib/server/enter'

export const metadata: Metadata = { title: 'Workshop' }

const PLACES = [
  { path: '/workshop/people', words: 'People', what: 'Who has an account, who may do what, and invitations.', permission: 'people:read' },
  { path: '/workshop/outbox', words: 'Outbox', what: 'Mail on its way out, and what became of it.', permission: 'outbox:read' },
  { path: '/workshop/mailbox', words: 'Mailbox', what: 'Mail that is kept here, since no mail server is set.', permission: 'mailbox:read' },
] as const

/** What there is for whoever enters. */
export default async function WorkshopPage() {
  const { actor } = await ownContext('/workshop')
  if (!can(actor, 'workshop:enter')) notFound()
  return (
    <main id="main" className="w pg ppl">
      <h1>Workshop</h1>
      <dl className="what">
        {PLACES.filter(({ permission }) => can(actor, permission)).map(({ path, words, what }) => (
          <div key={path}>
            <dt>
              <PlaceLink href={path}>{words}</PlaceLink>
            </dt>
            <dd>{what}</dd>
          </div>
        ))}
      </dl>
    </main>
  )
}
