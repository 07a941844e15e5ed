import { timeWords } from '@/lib/accounts/format'
import type { MailboxMessageView } from '@/lib/mail/views'
import { LinkedText } from './linked-text'

/** A mail as words, as its reader's program would draw it, and as it would have travelled. */
export function Message({ message }: { message: MailboxMessageView }) {
  const { id, subject, recipient, receivedAt, plain, raw } = message
  return (
    <>
      <h1>{subject}</h1>
      <p className="note">
        To {recipient}, {timeWords(receivedAt)}
      </p>
      <div className="msgs">
        <section aria-labelledby="as-words">
          <h2 id="as-words">As words</h2>
          <LinkedText text={plain} />
        </section>
        <section aria-labelledby="as-drawn">
          <h2 id="as-drawn">As drawn</h2>
          {/* The answer of this address shuts itself in as well; here it is shut in once more. */}
          <iframe
            title={`The mail "${subject}" as drawn`}
            src={`/workshop/mailbox/${id}/html`}
            sandbox="allow-popups allow-popups-to-escape-sandbox"
          />
        </section>
      </div>
      <details className="raw">
        <summary>As it would have travelled</summary>
        <pre tabIndex={0}>{raw}</pre>
      </details>
    </>
  )
}
