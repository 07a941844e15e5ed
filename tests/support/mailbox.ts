import { expect } from '@playwright/test'
import { and, desc, eq, like } from 'drizzle-orm'
import { mailboxMessages } from '@/db/schema/mail'
import { pagesDatabase } from './pages'

/** Waits until a mail with a link to a page has come to someone in the local mailbox, and gives back that link. */
export async function linkInMailTo(recipient: string, path: string): Promise<string> {
  let link: string | undefined
  await expect
    .poll(() => (link = findLink(recipient, path)), { message: `a mail to ${recipient} with a link to ${path}`, timeout: 30_000 })
    .toBeTruthy()
  return link ?? ''
}

/** The newest link to a page, as it stands in the plain part. */
function findLink(recipient: string, path: string): string | undefined {
  const message = pagesDatabase()
    .select()
    .from(mailboxMessages)
    .where(and(eq(mailboxMessages.recipient, recipient), like(mailboxMessages.plain, `%${path}?token=%`)))
    .orderBy(desc(mailboxMessages.receivedAt))
    .get()
  return message?.plain.split(/\s/).find((word) => word.includes(`${path}?token=`))
}
