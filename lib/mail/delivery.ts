import 'server-only'
import { currentTime } from '@/lib/kernel/clock'
import { database } from '@/lib/server/database'
import { env } from '@/lib/server/env'
import type { Delivery } from './deliver'
import { mailboxTransport } from './mailbox-transport'
import { smtpTransport } from './smtp-transport'

/** Delivering as this process is set up to: over SMTP when a server is set, otherwise into the local mailbox. */
export function configuredDelivery(): Delivery {
  const { mail, publicAddress } = env()
  const db = database()
  return {
    db,
    transport: mail.smtp
      ? smtpTransport(mail.smtp, { helloName: new URL(publicAddress).hostname })
      : mailboxTransport(db, currentTime),
    from: mail.from,
    site: publicAddress,
    clock: currentTime,
    random: Math.random,
  }
}
