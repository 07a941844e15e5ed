import { PlaceLink } from '@/components/shell/place-link'
import { STATUS_WORDS } from '@/lib/mail/format'
import { OUTBOX_STATUSES, type OutboxStatus } from '@/lib/mail/terms'

interface Props {
  chosen: OutboxStatus
  counts: Record<OutboxStatus, number>
}

/** The four places a mail can be in, each with how many are there. */
export function StatusLinks({ chosen, counts }: Props) {
  return (
    <nav className="sts" aria-label="Outbox">
      {OUTBOX_STATUSES.map((status) => (
        <PlaceLink key={status} href={`/workshop/outbox?status=${status}`} aria-current={status === chosen ? 'page' : undefined}>
          {STATUS_WORDS[status]} <span>{counts[status]}</span>
        </PlaceLink>
      ))}
    </nav>
  )
}
