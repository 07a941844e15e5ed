import { PlaceLink } from '@/components/shell/place-link'
import { timeWords } from '@/lib/accounts/format'
import type { MailboxRowView } from '@/lib/mail/views'

export function MailboxTable({ rows }: { rows: MailboxRowView[] }) {
  return (
    <table className="lst" aria-label="Mail">
      <thead>
        <tr>
          <th scope="col">Mail</th>
          <th scope="col">To</th>
          <th scope="col">Came</th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ id, subject, recipient, receivedAt }) => (
          <tr key={id}>
            <td>
              <PlaceLink href={`/workshop/mailbox/${id}`}>{subject}</PlaceLink>
            </td>
            <td data-label="To">{recipient}</td>
            <td data-label="Came">{timeWords(receivedAt)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  )
}
