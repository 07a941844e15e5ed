import 'server-only'
import { createHash } from 'node:crypto'
import { and, eq, gt, inArray, isNull, lt } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { oneTimeTokens } from '@/db/schema/accounts'
import type { Milliseconds } from '@/lib/kernel/clock'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import { env } from '@/lib/server/env'
import { addressKey } from './people'
import { TOKEN_LASTS_MS, TOKEN_PATHS, type TokenPurpose } from './terms'
import type { LinkState } from './views'

export type TokenRow = typeof oneTimeTokens.$inferSelect

type NewToken = Pick<TokenRow, 'purpose' | 'email'> & Partial<Pick<TokenRow, 'personId' | 'name' | 'passwordHash' | 'role' | 'pair'>>

export interface IssuedLink {
  /** The whole address, for a mail. */
  link: string
  /** How long it opens. */
  minutes: number
  /** When it stops opening: after that a mail with it is not worth sending. */
  goodUntil: Milliseconds
}

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex')

/** Makes a link that opens once. The token is in the link alone; what is kept is its hash. */
export function issueLink(tx: Pick<Database, 'insert'>, { purpose, email, ...rest }: NewToken, now: Milliseconds): IssuedLink {
  const token = newId('t')
  const lasts = TOKEN_LASTS_MS[purpose]
  tx.insert(oneTimeTokens)
    .values({ hash: hashOf(token), purpose, email: email.trim(), emailKey: addressKey(email), expiresAt: now + lasts, createdAt: now, ...rest })
    .run()
  return { link: `${env().publicAddress}${TOKEN_PATHS[purpose]}?token=${token}`, minutes: lasts / 60_000, goodUntil: now + lasts }
}

type ReadLink = { state: 'open' | 'used' | 'expired'; row: TokenRow } | { state: 'unknown'; row?: undefined }

/** What a link would open, without using it up: for the page that a link leads to. */
export function readLink(db: Pick<Database, 'select'>, purpose: TokenPurpose, token: string, now: Milliseconds): ReadLink {
  const row = db
    .select()
    .from(oneTimeTokens)
    .where(and(eq(oneTimeTokens.hash, hashOf(token)), eq(oneTimeTokens.purpose, purpose)))
    .get()
  if (!row) return { state: 'unknown' }
  if (row.usedAt !== null) return { state: 'used', row }
  return { state: row.expiresAt > now ? 'open' : 'expired', row }
}

/**
 * Uses a link up. Of two that come at once, one gets it.
 * @throws Fault conflict when it was used or has run out, not_found when there never was one
 */
export function takeLink(tx: Pick<Database, 'update' | 'select'>, purpose: TokenPurpose, token: string, now: Milliseconds): TokenRow {
  const taken = tx
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(
      and(eq(oneTimeTokens.hash, hashOf(token)), eq(oneTimeTokens.purpose, purpose), isNull(oneTimeTokens.usedAt), gt(oneTimeTokens.expiresAt, now)),
    )
    .returning()
    .get()
  return taken ?? refuse(readLink(tx, purpose, token, now).state)
}

function refuse(state: LinkState): never {
  if (state === 'used') throw new Fault('conflict', 'This link was used already.', { detail: { state } })
  if (state === 'expired') throw new Fault('conflict', 'This link has run out.', { detail: { state } })
  throw new Fault('not_found', 'This link opens nothing. A part of it may be missing.', { detail: { state } })
}

/** Closes the links of these kinds that an address still has open: what they led to has happened, or must not any more. */
export function voidLinks(tx: Pick<Database, 'update'>, purposes: TokenPurpose[], email: string, now: Milliseconds) {
  tx.update(oneTimeTokens)
    .set({ usedAt: now })
    .where(and(eq(oneTimeTokens.emailKey, addressKey(email)), inArray(oneTimeTokens.purpose, purposes), isNull(oneTimeTokens.usedAt)))
    .run()
}

/** Closes every open link that belongs to a person: their resets and changes, and the invitations they sent. */
export function voidLinksOf(tx: Pick<Database, 'update'>, personId: string, now: Milliseconds) {
  tx.update(oneTimeTokens)
    .set({ usedAt: now })
    .where(and(eq(oneTimeTokens.personId, personId), isNull(oneTimeTokens.usedAt)))
    .run()
}

/** Throws out links that ran out before a time. */
export function sweepLinks(db: Pick<Database, 'delete'>, before: Milliseconds) {
  db.delete(oneTimeTokens).where(lt(oneTimeTokens.expiresAt, before)).run()
}
