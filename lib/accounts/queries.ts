import 'server-only'
import { and, desc, eq, gt, isNotNull, isNull, max } from 'drizzle-orm'
import { oneTimeTokens, people, sessions } from '@/db/schema/accounts'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { fold } from '@/lib/kernel/text'
import { recoveryCodesLeft } from './recovery-codes'
import { confirmedFactor, generatorOf, hasSecondFactor, openSecret, pendingFactor } from './second-factor'
import { mustBeSelf } from './self'
import { DELETION_WAITS_MS, type TokenPurpose } from './terms'
import { readLink } from './tokens'
import type { AccountView, InvitationView, LinkView, PendingSecondFactorView, PersonView, SessionView } from './views'

const deletesAt = (askedAt: number | null) => (askedAt === null ? null : askedAt + DELETION_WAITS_MS)

/** One's own account. @throws Fault sign_in */
export function getAccount({ db, actor }: Context): AccountView {
  const person = mustBeSelf(db, actor, 'account:read')
  const factor = confirmedFactor(db, person.id)
  return {
    name: person.name,
    email: person.email,
    role: person.role,
    hasPassword: person.passwordHash !== null,
    secondFactor: factor?.confirmedAt ? { since: factor.confirmedAt, codesLeft: recoveryCodesLeft(db, person.id) } : null,
    deletesAt: deletesAt(person.deletionAskedAt),
  }
}

/** One's own sessions that count now, the latest seen first. @throws Fault sign_in */
export function listSessions({ db, actor, now }: Context): SessionView[] {
  const person = mustBeSelf(db, actor, 'account:read')
  return db
    .select()
    .from(sessions)
    .where(and(eq(sessions.personId, person.id), isNull(sessions.endedAt), isNotNull(sessions.completedAt), gt(sessions.expiresAt, now)))
    .orderBy(desc(sessions.lastSeenAt), desc(sessions.createdAt))
    .all()
    .map(({ id, device, origin, way, createdAt, lastSeenAt }) => ({
      id,
      device,
      origin,
      way,
      since: createdAt,
      lastSeenAt,
      present: actor.kind === 'person' && actor.sessionId === id,
    }))
}

/** The authenticator app that is being set up, with its secret; null when none is. @throws Fault sign_in, not_allowed */
export function getPendingSecondFactor({ db, actor }: Context): PendingSecondFactorView | null {
  const person = mustBeSelf(db, actor, 'account:set-up-second-factor')
  const pending = pendingFactor(db, person.id)
  if (!pending) return null
  const totp = generatorOf(openSecret(pending.sealedSecret, person.id), person.email)
  return { secret: totp.secret.base32, address: totp.toString() }
}

/** What a link from a mail would open. Reading it uses nothing up. */
export function getLink({ db, now }: Context, purpose: TokenPurpose, token: string): LinkView {
  const { state, row } = readLink(db, purpose, token, now)
  if (state !== 'open') return { state }
  return { state, email: row.email, role: row.role }
}

/** More than this in one list is looked for by name. */
const MOST_LISTED = 100

/**
 * Everyone with an account, admins and staff first, narrowed to those whose name or address holds a text.
 * @returns a hundred at most, and how many more there are
 * @throws Fault sign_in, not_found
 */
export function listPeople({ db, actor }: Context, { text = '' }: { text?: string } = {}): { people: PersonView[]; more: number } {
  permit(actor, 'people:read')
  const wanted = fold(text.trim())
  const found = db
    .select()
    .from(people)
    .orderBy(people.name, people.id)
    .all()
    .filter(({ name, email }) => fold(`${name} ${email}`).includes(wanted))
    .sort((a, b) => RANK[a.role] - RANK[b.role])
  const listed = found.slice(0, MOST_LISTED).map((person): PersonView => ({
    id: person.id,
    name: person.name,
    email: person.email,
    role: person.role,
    disabled: person.disabledAt !== null,
    hasSecondFactor: hasSecondFactor(db, person.id),
    lastSeenAt: lastSeen(db, person.id),
    deletesAt: deletesAt(person.deletionAskedAt),
    self: actor.kind === 'person' && actor.id === person.id,
  }))
  return { people: listed, more: found.length - listed.length }
}

const RANK = { admin: 0, staff: 1, owner: 2 }

function lastSeen(db: Context['db'], personId: string): number | null {
  return db.select({ at: max(sessions.lastSeenAt) }).from(sessions).where(eq(sessions.personId, personId)).get()?.at ?? null
}

/** Invitations that nobody followed yet. @throws Fault sign_in, not_found */
export function listInvitations({ db, actor, now }: Context): InvitationView[] {
  permit(actor, 'people:read')
  return db
    .select()
    .from(oneTimeTokens)
    .where(and(eq(oneTimeTokens.purpose, 'invite'), isNull(oneTimeTokens.usedAt), gt(oneTimeTokens.expiresAt, now)))
    .orderBy(oneTimeTokens.emailKey)
    .all()
    .flatMap(({ email, role, expiresAt }) => (role ? [{ email, role, expiresAt }] : []))
}
