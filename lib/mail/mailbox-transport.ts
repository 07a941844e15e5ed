import 'server-only'
import MailComposer from 'nodemailer/lib/mail-composer'
import type { Database } from '@/db/client'
import { mailboxMessages } from '@/db/schema/mail'
import type { Milliseconds } from '@/lib/kernel/clock'
import { newId } from '@/lib/kernel/ids'
import { compose } from './compose'
import type { Transport } from './transport'

/** Keeps every mail here and sends none: what there is while no mail server is set. */
export function mailboxTransport(db: Database, clock: () => Milliseconds): Transport {
  return {
    async deliver(mail) {
      const { messageId, to, subject, html, plain } = mail
      const raw = await new MailComposer(compose(mail)).compile().build()
      db.insert(mailboxMessages)
        .values({ id: newId('msg'), messageId, recipient: to, subject, html, plain, raw: raw.toString('utf8'), receivedAt: clock() })
        // It came already, and the attempt died before it could say so.
        .onConflictDoNothing({ target: mailboxMessages.messageId })
        .run()
      return 'Kept in the local mailbox.'
    },
  }
}
