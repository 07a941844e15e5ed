import { Fault } from '@/lib/kernel/errors'
import { getMailboxHtml } from '@/lib/mail/mailbox-queries'
import { answerFault } from '@/lib/server/answer-fault'
import { requestContext } from '@/lib/server/request-context'

/** A mail may do nothing but be looked at: its own styles and links, no script, no form, nothing fetched. */
const POLICY = [
  "default-src 'none'",
  "style-src 'unsafe-inline'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'self'",
  'sandbox allow-popups allow-popups-to-escape-sandbox',
].join('; ')

/** The HTML of a mail in the local mailbox, for a frame of its own. */
export async function GET(_request: Request, { params }: { params: Promise<{ id: string }> }): Promise<Response> {
  try {
    return new Response(getMailboxHtml(await requestContext(), (await params).id), {
      headers: {
        'Content-Type': 'text/html; charset=utf-8',
        'Content-Security-Policy': POLICY,
        'Referrer-Policy': 'no-referrer',
        'Cache-Control': 'no-store',
      },
    })
  } catch (trouble) {
    if (trouble instanceof Fault) return answerFault(trouble)
    throw trouble
  }
}
