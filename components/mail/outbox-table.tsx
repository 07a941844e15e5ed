import { PressForm } from '@/components/forms/press-form'
import { timeWords } from '@/lib/accounts/format'
import type { FormAction } from '@/lib/forms/terms'
import { TEMPLATE_WORDS } from '@/lib/mail/format'
import type { OutboxStatus } from '@/lib/mail/terms'
import type { OutboxMailView } from '@/lib/mail/views'

interface Props {
  rows: OutboxMailView[]
  status: OutboxStatus
  /** Left out for those who may look and not touch. */
  sendAgain?: FormAction
}

const WHEN: Record<OutboxStatus, string> = { queued: 'Next try', sending: 'Since', sent: 'Sent', given_up: 'Given up' }

/** The mails of one status. Their words are not here: a link in them can sign someone in. */
export function OutboxTable({ rows, status, sendAgain }: Props) {
  const mayPress = sendAgain !== undefined && (status === 'queued' || status === 'given_up')
  return (
    <table className="lst obx" aria-label="Mail">
      <thead>
        <tr>
          <th scope="col">Mail</th>
          <th scope="col">Asked for</th>
          <th scope="col">Tries</th>
          <th scope="col">{WHEN[status]}</th>
          <th scope="col">Last answer</th>
          {mayPress && (
            <th scope="col">
              <span className="vh">Try again</span>
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {rows.map(({ id, template, recipient, createdAt, attempts, at, lastAnswer, canSendAgain }) => (
          <tr key={id}>
            <td>
              <b>{TEMPLATE_WORDS[template]}</b>
              <span className="sub">{recipient}</span>
            </td>
            <td data-label="Asked for">{timeWords(createdAt)}</td>
            <td data-label="Tries">{attempts}</td>
            <td data-label={WHEN[status]}>{timeWords(at)}</td>
            <td data-label="Last answer">{lastAnswer ?? 'None yet'}</td>
            {mayPress && (
              <td>
                {canSendAgain ? (
                  <PressForm action={sendAgain} values={{ mailId: id }} label={`Try again now: ${TEMPLATE_WORDS[template]}, to ${recipient}`}>
                    Try again now
                  </PressForm>
                ) : (
                  <span className="sub">Run out</span>
                )}
              </td>
            )}
          </tr>
        ))}
      </tbody>
    </table>
  )
}
