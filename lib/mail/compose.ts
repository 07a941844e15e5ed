import type { SendMailOptions } from 'nodemailer/lib/mailer'
import type { OutgoingMail } from './transport'

/**
 * A mail as the message builder takes it. Addresses are given in parts, so that nothing in them is read as a list or
 * as a header.
 */
export function compose({ messageId, from, to, subject, html, plain, date }: OutgoingMail): SendMailOptions {
  return {
    messageId: `<${messageId}>`,
    from,
    to: { name: '', address: to },
    subject,
    html,
    text: plain,
    date: new Date(date),
    // RFC 3834: no holiday reply to this.
    headers: { 'Auto-Submitted': 'auto-generated' },
    // A mail is words: it fetches no file and no page, whatever its text says.
    disableFileAccess: true,
    disableUrlAccess: true,
  }
}
